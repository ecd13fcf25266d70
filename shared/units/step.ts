/** Units of the engine. Everything is computed and stored in these; other systems exist for display only. */
export type Unit = 'mm' | 'mm²' | 'mm³' | 'mm⁴' | 'mm⁶' | 'N' | 'N·mm' | 'N/mm' | 'MPa' | 'kg' | 'kg/m' | '1'

export type UnitSystem = 'SI' | 'US'

export interface Quantity {
  value: number
  unit: Unit
}

/**
 * One line of a calculation. `template` is the expression with numbered places, such as `π² · {0} / ({1} / {2})²`;
 * `terms` fill the places. `substitution` is the template filled in SI; a reader of US units fills it again.
 */
export interface Step {
  symbol: string
  expression: string
  template: string
  terms: Quantity[]
  substitution: string
  value: number
  unit: Unit
}

/** A check is data: the same data feeds the screen, the PDF and the tests. */
export interface Check {
  /** Clause of the standard, such as `E3` or `J8`. */
  clause: string
  title: string
  demand: number
  capacity: number
  unit: Unit
  utilisation: number
  steps: Step[]
  notes: string[]
}
