import { EU_FAMILIES, US_FAMILIES } from '../sections/catalogue.ts'
import type { Family, Section } from '../sections/section.ts'
import { refuse } from '../units/refusal.ts'
import type { Standard } from './column-request.ts'

/** Families that a standard is for: US shapes by AISC 360, European ones by EN 1993-1-1. */
export function familiesOf(standard: Standard): readonly Family[] {
  return standard === 'EN 1993-1-1' ? EU_FAMILIES : US_FAMILIES
}

/** Refuses a shape that the standard is not for: its steels and tolerances are another's. */
export function checkFamily(section: Section, standard: Standard): void {
  if (familiesOf(standard).includes(section.family)) return
  const other = standard === 'EN 1993-1-1' ? 'AISC 360' : 'EN 1993-1-1'
  refuse(
    'section',
    `${section.designation} is checked by ${other}; choose a shape of ${standard}, or that standard`,
  )
}
