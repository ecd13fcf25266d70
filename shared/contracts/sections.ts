import { z } from 'zod'
import { FAMILIES } from '../sections/section.ts'

export const sectionsQuery = z.strictObject({
  family: z.enum(FAMILIES).optional(),
  q: z.string().trim().max(40).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
})
export const bySection = z.strictObject({ designation: z.string().min(1).max(80) })
/** Outline as closed rings of points, mm from the centroid; the first ring is the outside. */
export const outline = z.array(z.array(z.tuple([z.number(), z.number()])))
export const sectionSummary = z.object({
  designation: z.string(),
  designationSI: z.string(),
  family: z.enum(FAMILIES),
  mass: z.number(),
  depth: z.number(),
  width: z.number(),
  offered: z.boolean(),
})
export const sectionDetail = sectionSummary.extend({
  properties: z.record(z.string(), z.number()),
  outline,
})

/** What a shape carries against its length. */
export const capacityQuery = z.strictObject({
  standard: z.enum(['AISC 360-22', 'AISC 360-16', 'EN 1993-1-1']).optional(),
  method: z.enum(['LRFD', 'ASD']).default('LRFD'),
  grade: z.string().trim().min(1).max(40).optional(),
  /** Longest effective length, mm. */
  to: z.coerce.number().min(1000).max(30000).default(12000),
})
export const capacityAnswer = z.object({
  section: z.string(),
  standard: z.string(),
  method: z.string(),
  steel: z.string(),
  /** Available compressive strength, N, at each effective length, mm: about each axis by itself, and the least of all. */
  points: z.array(
    z.object({ length: z.number(), strong: z.number(), weak: z.number(), available: z.number() }),
  ),
})
export type CapacityDto = z.infer<typeof capacityAnswer>
