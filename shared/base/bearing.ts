import { available, FACTORS, type Method } from '../standards/aisc360/resistance.ts'

/** √(A2/A1) counts up to this. */
const CONFINEMENT_LIMIT = 2

/**
 * Confinement of the concrete under a plate: √(A2/A1), at most 2. A2 is the largest area similar to the plate and
 * concentric with it that the pier takes; without a pier the footing is wide enough for 2. Lengths in mm.
 * ANSI/AISC 360-22 J8.
 */
export function confinement(
  plate: { length: number; width: number },
  pier: { length: number; width: number } | undefined,
): number {
  if (!pier) return CONFINEMENT_LIMIT
  // Similar areas scale both ways alike, so the root of their ratio is the scale itself.
  const scale = Math.min(pier.length / plate.length, pier.width / plate.width)
  return Math.min(CONFINEMENT_LIMIT, scale)
}

/**
 * Nominal bearing strength of concrete: Pp = 0.85·f'c·A1·min(2, √(A2/A1)), N. f'c MPa, A1 mm².
 * ANSI/AISC 360-22 Eq. J8-1, J8-2.
 */
export function nominalBearing(fc: number, A1: number, confined: number): number {
  return 0.85 * fc * A1 * confined
}

export function availableBearing(fc: number, A1: number, confined: number, method: Method): number {
  return available(nominalBearing(fc, A1, confined), FACTORS.concreteBearing, method)
}
