import type { Section } from '../sections/section.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import type { Standard } from '../standards/column-request.ts'
import type { Check } from '../units/step.ts'

export interface PlateSize {
  length: number
  width: number
}
export interface Plate extends PlateSize {
  thickness: number
  /** MPa. */
  yield: number
}
export interface Rods {
  count: number
  diameter: number
  grade: string
}

/** What a base must do. N, mm, MPa; the plate's length runs along the section's depth. */
export interface BaseInput {
  standard?: Standard | undefined
  method?: Method | undefined
  section: Section
  required: { compression: number; uplift: number }
  concrete: { strength: number; pier?: PlateSize | undefined }
  /** What is given is checked as given; what is left out is found. */
  plate?: { [K in keyof Plate]?: Plate[K] | undefined } | undefined
  rods?: { [K in keyof Rods]?: Rods[K] | undefined } | undefined
  /** What is in stock, mm, ascending. */
  stock: { thicknesses: readonly number[]; rodDiameters: readonly number[] }
  /** Weight of the column, N: one of 300 lb or less is a post. Left out: a column. */
  weight?: number | undefined
}

/** What was found or given, before it is checked. */
export interface BaseParts {
  plate: Plate
  rods: Rods & { positions: [number, number][] }
  hole: number
  leg: number
}

export interface BaseDesign {
  verdict: 'holds' | 'fails'
  plate: Plate
  rods: Rods & { positions: [number, number][] }
  holes: { count: number; diameter: number }
  welds: { leg: number; length: number }
  values: Record<string, number>
  checks: Check[]
  notes: string[]
}
