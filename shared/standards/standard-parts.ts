import type { Check } from '../units/step.ts'

export interface Governing {
  check: string
  axis: string
  clause: string
  combination: string
}

/** What a standard adds to a result. */
export interface StandardParts {
  /** Of the compression that governs, without its combination. */
  governing: Omit<Governing, 'combination'>
  tensionClause: string
  values: Record<string, number | string>
  checks: Check[]
}
