import type { Section } from '../sections/section.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import { FACTORS } from '../standards/aisc360/resistance.ts'

export interface Cantilevers {
  /** Beyond the lines of bending along the length and the width of the plate, mm. */
  m: number
  n: number
  /** Of the plate between flanges, or inside a hollow section, mm. */
  nPrime: number
  /** Of the area loaded lightly; 1 for hollow sections. */
  lambda: number
  /** The one that counts. */
  l: number
}

/** How far the lines of bending stand apart, as parts of depth and width. Design Guide 1, 2nd edition, 3.1.2 and 3.1.3. */
function bendingLines({ shape, depth, width }: Section): { along: number; across: number } {
  if (shape === 'I') return { along: 0.95 * depth, across: 0.8 * width }
  const part = shape === 'box' ? 0.95 : 0.8
  return { along: part * depth, across: part * width }
}

/**
 * Cantilevers of a plate under concentric compression: m = (N − 0.95·d)/2, n = (B − 0.8·bf)/2, n' = √(d·bf)/4,
 * X = [4·d·bf/(d + bf)²]·P/Pavail ≤ 1, λ = 2√X/(1 + √(1 − X)) ≤ 1, l = max(m, n, λ·n'). Rectangular HSS 0.95 both ways,
 * round 0.8·D both ways, both without λ. Our guard: l of a hollow section is not less than n', or a plate close to the
 * shaft would come out with no thickness. Lengths mm, ratio P/Pavail. AISC Design Guide 1, 2nd edition, 3.1.
 */
export function cantilevers(
  section: Section,
  plate: { length: number; width: number },
  bearingRatio: number,
): Cantilevers {
  const { depth: d, width: b, shape } = section
  const { along, across } = bendingLines(section)
  const m = (plate.length - along) / 2
  const n = (plate.width - across) / 2
  const nPrime = Math.sqrt(d * b) / 4
  const X = Math.min(1, ((4 * d * b) / (d + b) ** 2) * bearingRatio)
  const lambda = shape === 'I' ? Math.min(1, (2 * Math.sqrt(X)) / (1 + Math.sqrt(1 - X))) : 1
  return { m, n, nPrime, lambda, l: Math.max(m, n, lambda * nPrime) }
}

/**
 * Thickness that carries the bearing pressure over a cantilever: t = l·√(2·P/(0.9·Fy·B·N)) LRFD,
 * l·√(2·1.67·P/(Fy·B·N)) ASD. l, N, B mm; P N; Fy MPa. mm. Design Guide 1, Eq. 3.1.
 */
export function thicknessRequired(
  l: number,
  P: number,
  Fy: number,
  plate: { length: number; width: number },
  method: Method,
): number {
  const { phi, omega } = FACTORS.plateBending
  const factor = method === 'LRFD' ? 1 / phi : omega
  return l * Math.sqrt((2 * factor * P) / (Fy * plate.length * plate.width))
}

/**
 * Thickness that carries one rod's pull to the shaft: M = T·x over a strip 2·x wide (45° each way), so that
 * t = √(4·M/(φ·Fy·2x)) = √(2·T/(φ·Fy)). T N; Fy MPa; mm. Common practice of the trade for rods outside the flanges.
 */
export function upliftThickness(T: number, Fy: number, method: Method): number {
  const { phi, omega } = FACTORS.plateBending
  return Math.sqrt((2 * T * (method === 'LRFD' ? 1 / phi : omega)) / Fy)
}
