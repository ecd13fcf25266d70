import { refuse } from '../units/refusal.ts'
import type { EffectiveLength, EndFixity, Ends } from './column.ts'
import { criticalLoad } from './critical-load.ts'
import { strutEnds } from './end-fixity.ts'
import { isMechanism } from './restraint.ts'
import { segmentLength, segmentsOf } from './segments.ts'

export interface AxisInput {
  /** mm. */
  height: number
  ends: Ends
  /** Heights of the braces that hold this axis, mm. */
  braceHeights: readonly number[]
  endFixity: EndFixity
}

/** An effective length before a shape is known: neither method needs EI. */
export type LengthSolution = Omit<EffectiveLength, 'criticalLoad'>

/** Methods that differ by less than this agree, and the simpler one is named. */
const AGREE = 1e-6

/**
 * Effective length about one axis: Lc = max(segment method, eigenvalue method), mm.
 * Segment: largest K·L between braces (AISC 360-22 Commentary, Table C-A-7.1). Eigenvalue: π√(EI/Pcr) of the whole column,
 * with fixed ends softened where recommended K are used. Refuses a column that can move without bending.
 */
export function solveLength(input: AxisInput): LengthSolution {
  const { height, ends, endFixity } = input
  const braceHeights = [...input.braceHeights].sort((a, b) => a - b)
  if (isMechanism(height, ends, braceHeights)) {
    refuse('ends', 'the column can move without bending; hold it at two points, or at one with a fixed end')
  }
  const segments = segmentsOf(height, ends, braceHeights, endFixity)
  const segment = segmentLength(segments)
  const { length: eigenvalue, shape } = criticalLoad({
    height,
    ...strutEnds(height, ends, braceHeights, endFixity),
    braceHeights,
  })
  return {
    segment,
    eigenvalue,
    used: Math.max(segment, eigenvalue),
    governedBy: eigenvalue > segment * (1 + AGREE) ? 'eigenvalue' : 'segment',
    segments,
    shape,
  }
}

/** Euler: Pcr = π²·EI/L², N, by the eigenvalue length and referred to the force at the base. EI in N·mm². */
export function withStiffness(solution: LengthSolution, EI: number): EffectiveLength {
  return { ...solution, criticalLoad: (Math.PI ** 2 * EI) / solution.eigenvalue ** 2 }
}

/** Both methods about one axis, for a column of bending stiffness EI, N·mm². */
export function effectiveLength(input: AxisInput & { EI: number }): EffectiveLength {
  return withStiffness(solveLength(input), input.EI)
}
