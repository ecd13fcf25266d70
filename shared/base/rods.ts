import { MM_PER_INCH, N_PER_LB } from '../units/convert.ts'
import { available, FACTORS, type Method } from '../standards/aisc360/resistance.ts'

/** Nominal strength of a threaded rod in tension: Rn = 0.75·Fu·Ab, N. Ab gross area. AISC 360-22 J3.7, Table J3.2. */
export function rodNominal(Fu: number, diameter: number): number {
  return 0.75 * Fu * rodArea(diameter)
}

export function rodArea(diameter: number): number {
  return (Math.PI / 4) * diameter ** 2
}

export function rodAvailable(Fu: number, diameter: number, method: Method): number {
  return available(rodNominal(Fu, diameter), FACTORS.rod, method)
}

/** At least this many rods in every column base but a post's: 29 CFR 1926.755(a)(1). */
export const FEWEST_RODS = 4

/** 300 lb at 18 in from the extreme outer face of the column: 29 CFR 1926.755(a)(2). */
const ERECTION_LOAD = 300 * N_PER_LB
const ERECTION_REACH = 18 * MM_PER_INCH
/** A post is a vertical member that weighs no more than this, and is not a column by 29 CFR 1926.751. N. */
export const POST_WEIGHT = 300 * N_PER_LB

/** Not a column, so that neither four rods nor the erection load are asked of it. Of unknown weight: a column. */
export function isPost(weight: number | undefined): boolean {
  return weight !== undefined && weight <= POST_WEIGHT
}

/** Moment of the erection load about the centre of a column of this depth (or width), N·mm. Unfactored. */
export function erectionMoment(depth: number): number {
  return ERECTION_LOAD * (ERECTION_REACH + depth / 2)
}

/** Tension in each rod of the pulled side: T = M/(n·s), n rods on that side, s apart from the other side, mm. N. */
export function erectionTension(moment: number, rodsOnSide: number, spacing: number): number {
  return moment / (rodsOnSide * spacing)
}

/** Hole and least washer of an anchor rod, inches: AISC Manual 14th edition, Table 14-2, from memory. */
const TABLE_14_2 = [
  { rod: 0.75, hole: 21 / 16, washer: 2 },
  { rod: 0.875, hole: 25 / 16, washer: 2.5 },
  { rod: 1, hole: 29 / 16, washer: 3 },
  { rod: 1.25, hole: 33 / 16, washer: 3 },
  { rod: 1.5, hole: 37 / 16, washer: 3.5 },
  { rod: 1.75, hole: 2.75, washer: 4 },
  { rod: 2, hole: 3.25, washer: 5 },
  { rod: 2.5, hole: 3.75, washer: 5.5 },
] as const

export interface RodRoom {
  /** Diameter of the hole in the base plate, and of the washer that covers it, mm. */
  hole: number
  washer: number
}

/** Room that a rod takes: of its size, or of the next larger; above the table in its last proportion. mm. */
export function rodRoom(diameter: number): RodRoom {
  const inches = diameter / MM_PER_INCH
  const row = TABLE_14_2.find(({ rod }) => rod >= inches - 0.01)
  const { hole, washer } = row ?? { hole: inches + 1.25, washer: inches + 3 }
  return { hole: hole * MM_PER_INCH, washer: washer * MM_PER_INCH }
}
