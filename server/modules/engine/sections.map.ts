import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import { OFFERED_FAMILIES } from '../../../shared/sections/catalogue.ts'
import { outlineOf } from '../../../shared/sections/outline.ts'
import type { Section } from '../../../shared/sections/section.ts'

export function toSectionSummary(section: Section): AnswerOf<'listSections'>['items'][number] {
  const { designation, designationSI, family, mass, depth, width } = section
  const offered = OFFERED_FAMILIES.includes(family)
  return { designation, designationSI, family, mass, depth, width, offered }
}

/** With every number of the table that it comes from. */
export function toSectionDetail(section: Section): AnswerOf<'readSection'> {
  const numbers = Object.entries(section).filter(([, value]) => typeof value === 'number')
  return {
    ...toSectionSummary(section),
    properties: Object.fromEntries(numbers) as Record<string, number>,
    outline: outlineOf(section),
  }
}
