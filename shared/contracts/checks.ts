import { z } from 'zod'
import { columnRequirement, concrete } from './requirement.ts'

export const unit = z.enum(['mm', 'mm²', 'mm³', 'mm⁴', 'mm⁶', 'N', 'N·mm', 'N/mm', 'MPa', 'kg', 'kg/m', '1'])
const quantity = z.object({ value: z.number(), unit })

export const step = z.object({
  symbol: z.string(),
  expression: z.string(),
  template: z.string(),
  terms: z.array(quantity),
  substitution: z.string(),
  value: z.number(),
  unit,
})
export const check = z.object({
  clause: z.string(),
  title: z.string(),
  demand: z.number(),
  capacity: z.number(),
  unit,
  utilisation: z.number(),
  steps: z.array(step),
  notes: z.array(z.string()),
})
export type CheckDto = z.infer<typeof check>

export const effectiveLength = z.object({
  segment: z.number(),
  eigenvalue: z.number(),
  used: z.number(),
  governedBy: z.enum(['segment', 'eigenvalue']),
  segments: z.array(
    z.object({ from: z.number(), to: z.number(), k: z.number().nullable(), kl: z.number().nullable() }),
  ),
  criticalLoad: z.number(),
  shape: z.array(z.tuple([z.number(), z.number()])),
})

export const columnCheck = z.object({
  verdict: z.enum(['holds', 'fails']),
  utilisation: z.number(),
  governing: z.object({ check: z.string(), axis: z.string(), clause: z.string(), combination: z.string() }),
  lengths: z.object({
    strong: effectiveLength,
    weak: effectiveLength,
    torsion: z.object({ used: z.number() }),
  }),
  /** What each brace must give: AISC 360 Appendix 6.2. */
  braces: z
    .array(
      z.object({
        height: z.number(),
        axis: z.enum(['strong', 'weak']),
        length: z.number(),
        strength: z.number(),
        stiffness: z.number(),
      }),
    )
    .default([]),
  values: z.record(z.string(), z.union([z.number(), z.string()])),
  checks: z.array(check),
  assumptions: z.array(z.string()),
  warnings: z.array(z.string()),
  notCovered: z.array(z.string()),
})
export type ColumnCheckDto = z.infer<typeof columnCheck>

export const checkBody = columnRequirement.extend({ section: z.string().trim().min(1).max(60) })

export const plate = z.strictObject({
  length: z.number().positive().max(3000),
  width: z.number().positive().max(3000),
  thickness: z.number().positive().max(200),
  yield: z.number().min(150).max(700).default(248.2),
})
export const basePlateBody = z.strictObject({
  standard: z.enum(['AISC 360-22', 'AISC 360-16', 'EN 1993-1-1']).default('AISC 360-22'),
  method: z.enum(['LRFD', 'ASD']).default('LRFD'),
  section: z.string().trim().min(1).max(60),
  required: z.strictObject({
    compression: z.number().min(0).max(1e9),
    uplift: z.number().min(0).max(1e9).default(0),
  }),
  concrete,
  plate: plate.partial().optional(),
  rods: z
    .strictObject({
      count: z.int().min(1).max(24),
      diameter: z.number().positive().max(100),
      grade: z.enum(['F1554-36', 'F1554-55', 'F1554-105']).default('F1554-36'),
    })
    .partial()
    .optional(),
})
export type BasePlateBody = z.infer<typeof basePlateBody>

export const basePlateAnswer = z.object({
  verdict: z.enum(['holds', 'fails']),
  plate: z.object({ length: z.number(), width: z.number(), thickness: z.number(), yield: z.number() }),
  rods: z.object({
    count: z.number(),
    diameter: z.number(),
    grade: z.string(),
    /** Rod centres from the plate centre, mm: along the length, along the width. */
    positions: z.array(z.tuple([z.number(), z.number()])),
  }),
  holes: z.object({ count: z.number(), diameter: z.number() }),
  welds: z.object({ leg: z.number(), length: z.number() }),
  values: z.record(z.string(), z.number()),
  checks: z.array(check),
  notes: z.array(z.string()),
})
