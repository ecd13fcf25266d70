/** Effective width imperfection factors: ANSI/AISC 360-22 Table E7.1 (a) stiffened elements, (b) HSS walls, (c) all others. */
export const C1_C2 = {
  web: { c1: 0.18, c2: 1.31 },
  hssWall: { c1: 0.2, c2: 1.38 },
  flange: { c1: 0.22, c2: 1.49 },
} as const

/** c2 = (1 − √(1 − 4·c1))/(2·c1), from which the table is rounded. Eq. E7-4. 0 < c1 ≤ 0.25. */
export function c2Of(c1: number): number {
  return (1 - Math.sqrt(1 - 4 * c1)) / (2 * c1)
}

/**
 * Elastic local buckling stress: Fel = (c2·λr/λ)²·Fy, MPa. λ ratio of the element, λr its limit.
 * ANSI/AISC 360-22 Eq. E7-5 (360-16 alike).
 */
export function elasticLocalStress(c2: number, limit: number, ratio: number, Fy: number): number {
  return ((c2 * limit) / ratio) ** 2 * Fy
}

/** λ up to which an element is fully effective under the stress Fn: λr·√(Fy/Fn). Eq. E7-2, E7-3. */
export function fullWidthLimit(limit: number, Fy: number, Fn: number): number {
  return limit * Math.sqrt(Fy / Fn)
}

/**
 * Effective width: b for λ ≤ λr·√(Fy/Fn), else be = b·(1 − c1·√(Fel/Fn))·√(Fel/Fn), at most b. mm.
 * ANSI/AISC 360-22 Eq. E7-2, E7-3 (360-16 alike).
 */
export function effectiveWidth(
  element: { width: number; ratio: number; limit: number; c1: number; c2: number },
  Fy: number,
  Fn: number,
): number {
  const { width, ratio, limit, c1, c2 } = element
  if (ratio <= fullWidthLimit(limit, Fy, Fn)) return width
  const root = Math.sqrt(elasticLocalStress(c2, limit, ratio, Fy) / Fn)
  return Math.min(width, width * (1 - c1 * root) * root)
}
