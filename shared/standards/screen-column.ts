import { E_AISC, G_AISC, type Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { lowestStress, nominalCompression, type CompressionInput } from './aisc360/compression.ts'
import { nominalStress } from './aisc360/flexural-buckling.ts'
import { available, FACTORS } from './aisc360/resistance.ts'
import { slenderness } from './aisc360/slenderness.ts'
import { availableTension } from './aisc360/tension.ts'
import type { AiscTerms } from './column-request.ts'
import { governingModeEn, modesEn, tensionEn, type LengthsEn } from './en1993/compression.ts'
import { demandOf, type PreparedColumn } from './prepare-column.ts'
import { screenBending, type BentScreening } from './screen-bending.ts'

/** What a shape can carry as this column, on numbers alone. N. */
export interface Screening {
  /** Available compressive strength. */
  capacity: number
  tension: number
  compression: number
  uplift: number
  utilisation: number
  /** The larger Lc/r. */
  slenderness: number
  /** Where the column is bent as well. */
  bent: BentScreening | undefined
}

export function compressionInput(prepared: PreparedColumn, Fy: number): CompressionInput {
  const { solution, braceOffsets } = prepared
  return {
    E: E_AISC,
    G: G_AISC,
    Fy,
    strong: solution.strong.used,
    weak: solution.weak.used,
    torsion: solution.torsion.used,
    braceOffsets,
  }
}

/**
 * The clauses of `checkColumn` without their steps. Refuses a round shape beyond the range of AISC 360 E7.2, or of class 4
 * by EN 1993-1-1.
 */
export function screenColumn(
  prepared: PreparedColumn,
  section: Section,
  steel: Pick<Steel, 'Fy' | 'Fu'>,
): Screening {
  const { terms } = prepared
  return terms.standard === 'EN 1993-1-1'
    ? screenEn(prepared, section, steel)
    : screenAisc(prepared, terms, section, steel)
}

function screenAisc(
  prepared: PreparedColumn,
  terms: AiscTerms,
  section: Section,
  steel: Pick<Steel, 'Fy' | 'Fu'>,
): Screening {
  const input = compressionInput(prepared, steel.Fy)
  const Fn = nominalStress(steel.Fy, lowestStress(section, input))
  const nominal = nominalCompression(section, { Fn }, E_AISC, steel.Fy)
  const capacity = available(nominal, FACTORS.compression, terms.method)
  const tension = availableTension(steel.Fy, steel.Fu, section.area, terms.method)
  const { compression, uplift } = demandOf(prepared, section.mass)
  const { bending } = prepared
  const bent =
    bending && screenBending(prepared, terms, bending, section, steel.Fy, { compression: capacity, tension })
  const utilisation = Math.max(compression / capacity, uplift / tension, bent?.utilisation ?? 0)
  const slender = slendernessOf(prepared, section)
  return { capacity, tension, compression, uplift, bent, utilisation, slenderness: slender }
}

function screenEn(prepared: PreparedColumn, section: Section, { Fy }: Pick<Steel, 'Fy'>): Screening {
  const capacity = governingModeEn(modesEn(section, Fy, lengthsOf(prepared))).resistance
  const tension = tensionEn(section.area, Fy)
  const { compression, uplift } = demandOf(prepared, section.mass)
  const utilisation = Math.max(compression / capacity, uplift / tension)
  const slender = slendernessOf(prepared, section)
  return { capacity, tension, compression, uplift, bent: undefined, utilisation, slenderness: slender }
}

/** Effective lengths that count, mm. */
export function lengthsOf({ solution }: PreparedColumn): LengthsEn {
  return { strong: solution.strong.used, weak: solution.weak.used, torsion: solution.torsion.used }
}

function slendernessOf(prepared: PreparedColumn, section: Section): number {
  const { strong, weak } = lengthsOf(prepared)
  return Math.max(slenderness(strong, section.rx), slenderness(weak, section.ry))
}
