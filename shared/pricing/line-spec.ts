export const FINISHES = ['none', 'prime', 'paint', 'galvanise'] as const
export type Finish = (typeof FINISHES)[number]

/** A plate of a column: length runs along the section's depth. mm. */
export interface PlateSpec {
  length: number
  width: number
  thickness: number
  holes: { count: number; diameter: number }
}

export interface WeldSpec {
  where: 'base' | 'cap'
  /** Fillet leg and total length, mm. */
  leg: number
  length: number
}

export interface ExtraSpec {
  description: string
  quantity: number
  /** Exact decimal in currency units, such as "12.50". */
  unitCost: string
}

/** What the estimator may set by hand; each with a reason. Minutes are for the whole line. */
export const OVERRIDABLE = [
  'minutes.sawing',
  'minutes.plateCutting',
  'minutes.drilling',
  'minutes.welding',
  'minutes.fitting',
  'margin',
  'unitPrice',
] as const
export interface Override {
  item: (typeof OVERRIDABLE)[number]
  /** Exact decimal: minutes, a fraction (margin 0.18) or currency units (unitPrice 1591.84). */
  value: string
  reason: string
}

/** Everything that fixes the work and price of one line: a mark, made `quantity` times. */
export interface LineSpec {
  mark: string
  quantity: number
  section: string
  grade: string
  /** Overall height, underside of base plate to top of cap plate, mm. */
  height: number
  finish: Finish
  base: PlateSpec | null
  cap: PlateSpec | null
  /** Anchor rods for each piece; diameter mm. */
  rods: { count: number; diameter: number; grade: string } | null
  welds: WeldSpec[]
  extras: ExtraSpec[]
  overrides: Override[]
}
