import type { Brace, EndFixity, Ends } from '../stability/column.ts'
import type { Method } from './aisc360/resistance.ts'
import type { LoadsAsked } from './asce7/loads.ts'
import type { EnRule, ImposedCategory } from './en1990/combinations.ts'

export type Standard = 'AISC 360-22' | 'AISC 360-16' | 'EN 1993-1-1'
export type CombinationRule = 'ASCE 7-22' | 'ASCE 7-16' | EnRule

/** Strengths already combined: N (compression positive) and N·mm. */
export interface RequiredStrength {
  axial: number
  momentStrong?: number | undefined
  momentWeak?: number | undefined
  momentRatioStrong?: number | undefined
  momentRatioWeak?: number | undefined
}

/** Effective lengths given outright, mm. */
export interface LengthsGiven {
  strong: number
  weak: number
  torsion: number
  /** Offset of weak-axis braces that do not stop twist, mm. */
  braceOffset?: number | undefined
}

export type GradeAsked = string | { yield: number; ultimate: number }

/** What a column must do, without naming a shape. N, mm, MPa; what is left out has the default of the trade. */
export interface ColumnRequest {
  standard?: Standard | undefined
  method?: Method | undefined
  height?: number | undefined
  ends?: { strong: Ends; weak: Ends } | undefined
  braces?: readonly Brace[] | undefined
  endFixity?: EndFixity | undefined
  /** In place of height, ends and braces; with a height beside them the column's weight is known too. */
  lengths?: LengthsGiven | undefined
  loads?: LoadsAsked | undefined
  /** In place of loads. */
  required?: RequiredStrength | undefined
  combinations?: CombinationRule | undefined
  /** f1 of ASCE 7. */
  liveFactor?: number | undefined
  /** Category of imposed load, EN 1990 only. */
  liveCategory?: ImposedCategory | undefined
  /** Offset of the load from the axis of the column, mm. */
  offset?: { strong?: number | undefined; weak?: number | undefined } | undefined
  selfWeight?: boolean | undefined
  grade?: GradeAsked | undefined
}

/** A request with its defaults filled in, for the checks of AISC 360. */
export interface AiscTerms {
  standard: 'AISC 360-22' | 'AISC 360-16'
  method: Method
  combinations: 'ASCE 7-22' | 'ASCE 7-16'
  liveFactor: number
}

/** For those of EN 1993-1-1. */
export interface EnTerms {
  standard: 'EN 1993-1-1'
  combinations: EnRule
  liveCategory: ImposedCategory
}

export type Terms = AiscTerms | EnTerms
