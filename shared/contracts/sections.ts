import { z } from 'zod'
import { FAMILIES } from '../sections/section.ts'

export const sectionsQuery = z.strictObject({
  family: z.enum(FAMILIES).optional(),
  q: z.string().trim().max(40).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
})
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
