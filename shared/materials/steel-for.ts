import { EU_FAMILIES } from '../sections/catalogue.ts'
import type { Section } from '../sections/section.ts'
import { europeanSteelOf } from './european-steels.ts'
import { steelOf } from './shape-steels.ts'
import type { Steel } from './steel.ts'

/** The steel of a shape from what was asked: by its family's standard. Refuses as those do. */
export function steelFor(
  asked: string | { yield: number; ultimate: number } | undefined,
  section: Section,
): Steel {
  return EU_FAMILIES.includes(section.family)
    ? europeanSteelOf(asked, section)
    : steelOf(asked, section.family)
}
