import type { Steel } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import type { ColumnRequest } from '../standards/column-request.ts'
import { checkFamily } from '../standards/families.ts'
import { prepareColumn } from '../standards/prepare-column.ts'
import { screenColumn } from '../standards/screen-column.ts'

export interface CapacityPoint {
  /** Effective length, mm. */
  length: number
  /** Available compressive strength, N: buckling about one axis alone, and with one length for every way. */
  strong: number
  weak: number
  available: number
}

/** So short that it takes nothing from the strength, mm. */
const NO_LENGTH = 1

/**
 * Available strength against effective length, at `count` lengths to `longest`, mm. Refuses a shape that the standard is
 * not for, or has no strength for.
 */
export function capacityCurve(
  section: Section,
  steel: Steel,
  terms: Pick<ColumnRequest, 'standard' | 'method'>,
  longest: number,
  count: number,
): CapacityPoint[] {
  checkFamily(section, terms.standard ?? 'AISC 360-22')
  const at = (strong: number, weak: number, torsion: number) =>
    screenColumn(
      prepareColumn({ ...terms, lengths: { strong, weak, torsion }, required: { axial: 1 } }),
      section,
      steel,
    ).capacity
  return Array.from({ length: count }, (_, index) => {
    const length = Math.max(NO_LENGTH, (longest * index) / (count - 1))
    return {
      length,
      strong: at(length, NO_LENGTH, NO_LENGTH),
      weak: at(NO_LENGTH, length, NO_LENGTH),
      available: at(length, length, length),
    }
  })
}
