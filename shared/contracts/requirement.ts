import { z } from 'zod'
import { FAMILIES } from '../sections/section.ts'
import { FINISHES } from '../pricing/line-spec.ts'

/* Quantities on the wire: mm, N, N·mm, MPa, kg. */

const amount = z.number().min(-1e9).max(1e9)
const magnitude = z.number().min(0).max(1e9)

export const endCondition = z.enum(['pinned', 'fixed', 'guided', 'free'])
export const ends = z.strictObject({ bottom: endCondition, top: endCondition })
export const brace = z.strictObject({
  height: z.number(),
  holds: z.enum(['strong', 'weak', 'both']),
  stopsTwist: z.boolean(),
  offset: z.number().min(-2000).max(2000).optional(),
})
export const loads = z.strictObject({
  dead: amount.default(0),
  live: amount.default(0),
  roofLive: amount.default(0),
  snow: amount.default(0),
  rain: amount.default(0),
  wind: z
    .strictObject({ pushes: magnitude.default(0), lifts: magnitude.default(0) })
    .default({ pushes: 0, lifts: 0 }),
  earthquake: z
    .strictObject({
      pushes: magnitude.default(0),
      lifts: magnitude.default(0),
      vertical: magnitude.default(0),
    })
    .default({ pushes: 0, lifts: 0, vertical: 0 }),
})
export const requiredStrength = z.strictObject({
  axial: amount,
  momentStrong: z.number().default(0),
  momentWeak: z.number().default(0),
  momentRatioStrong: z.number().min(-1).max(1).optional(),
  momentRatioWeak: z.number().min(-1).max(1).optional(),
})
export const grade = z.union([
  z.string().trim().min(1).max(40),
  z.strictObject({ yield: z.number().min(150).max(700), ultimate: z.number().min(200).max(1000) }),
])

/** What a column must do, without naming a shape: the common part of checks and proposals. */
export const columnRequirement = z.strictObject({
  standard: z.enum(['AISC 360-22', 'AISC 360-16', 'EN 1993-1-1']).default('AISC 360-22'),
  method: z.enum(['LRFD', 'ASD']).optional(),
  height: z.number().optional(),
  ends: z.strictObject({ strong: ends, weak: ends }).optional(),
  braces: z.array(brace).max(20).default([]),
  endFixity: z.enum(['recommended', 'theoretical']).default('recommended'),
  lengths: z
    .strictObject({
      strong: z.number().positive().max(60000),
      weak: z.number().positive().max(60000),
      torsion: z.number().positive().max(60000),
      braceOffset: z.number().min(-2000).max(2000).optional(),
    })
    .optional(),
  loads: loads.optional(),
  required: requiredStrength.optional(),
  combinations: z.enum(['ASCE 7-22', 'ASCE 7-16', 'EN 1990 6.10', 'EN 1990 6.10ab']).optional(),
  liveFactor: z.number().min(0.5).max(1).default(0.5),
  liveCategory: z.enum(['A', 'B', 'C', 'D', 'E', 'H']).default('B'),
  offset: z.strictObject({ strong: z.number().default(0), weak: z.number().default(0) }).optional(),
  selfWeight: z.boolean().default(true),
  grade: grade.optional(),
})
export type ColumnRequirement = z.infer<typeof columnRequirement>

export const concrete = z.strictObject({
  /** Cylinder strength f'c, MPa. */
  strength: z.number().min(10).max(80),
  pier: z
    .strictObject({ length: z.number().positive().max(10000), width: z.number().positive().max(10000) })
    .optional(),
})

export const limits = z.strictObject({
  families: z.array(z.enum(FAMILIES)).max(FAMILIES.length).optional(),
  maxDepth: z.number().positive().optional(),
  maxWidth: z.number().positive().optional(),
  maxUtilisation: z.number().min(0.1).max(1).default(1),
  maxSlenderness: z.number().min(20).max(300).optional(),
})

/** A line of a request: a mark with its quantity and all that fixes its price. */
export const lineRequirement = columnRequirement.extend({
  mark: z.string().trim().min(1).max(20),
  quantity: z.int().min(1).max(2000),
  limits: limits.default({ maxUtilisation: 1 }),
  finish: z.enum(FINISHES).default('prime'),
  base: z
    .strictObject({
      plate: z.boolean().default(true),
      rods: z.boolean().default(true),
      concrete: concrete.default({ strength: 28 }),
    })
    .default({
      plate: true,
      rods: true,
      concrete: { strength: 28 },
    }),
  cap: z.strictObject({ plate: z.boolean().default(true) }).default({ plate: true }),
})
export type LineRequirement = z.infer<typeof lineRequirement>
/** As typed, before defaults are filled in. */
export type LineRequirementInput = z.input<typeof lineRequirement>
