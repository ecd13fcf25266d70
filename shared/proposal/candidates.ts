import { steelOf } from '../materials/shape-steels.ts'
import type { Steel } from '../materials/steel.ts'
import { barPriceOf, type PriceBook } from '../pricing/price-book.ts'
import { OFFERED_FAMILIES, type Catalogue } from '../sections/catalogue.ts'
import type { Family, Section } from '../sections/section.ts'
import type { PreparedColumn } from '../standards/prepare-column.ts'
import { roundRange } from '../standards/aisc360/effective-area.ts'
import { boxLimits } from '../standards/aisc360/flexure-hss.ts'
import { webFlexureLimit } from '../standards/aisc360/flexure-i.ts'
import { screenColumn, type Screening } from '../standards/screen-column.ts'
import { E_AISC } from '../materials/steel.ts'
import { Refusal } from '../units/refusal.ts'
import type { Limits, LineAsked } from './line-asked.ts'

export interface Candidate {
  section: Section
  steel: Steel
  screening: Screening
}

export type LimitName = 'depth' | 'width' | 'utilisation' | 'slenderness'

/** Families that are asked for, checked by a standard that is offered, and bought by the shop. */
export function familiesFor({ limits }: Pick<LineAsked, 'limits'>, book: PriceBook): Family[] {
  const asked = limits.families && limits.families.length > 0 ? limits.families : OFFERED_FAMILIES
  return asked.filter((family) => OFFERED_FAMILIES.includes(family) && barPriceOf(book, family))
}

/** The steel of each family, where what was asked is made of it. Refuses a grade that none of them is made of. */
export function steelsOf(families: readonly Family[], grade: LineAsked['grade']): Map<Family, Steel> {
  const steels = new Map<Family, Steel>()
  let fault: Refusal | undefined
  for (const family of families) {
    try {
      steels.set(family, steelOf(grade, family))
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      fault = error
    }
  }
  if (steels.size === 0 && fault) throw fault
  return steels
}

/** Every shape of these families on numbers alone. Round shapes beyond the range of E7.2 have no strength there. */
export function screenCatalogue(
  prepared: PreparedColumn,
  catalogue: Catalogue,
  steels: ReadonlyMap<Family, Steel>,
): Candidate[] {
  return catalogue.ofFamilies([...steels.keys()]).flatMap((section) => {
    const steel = steels.get(section.family)
    if (!steel || (section.shape === 'round' && section.diameterRatio >= roundRange(E_AISC, steel.Fy))) {
      return []
    }
    if (prepared.bending && !coversFlexure(section, steel.Fy)) return []
    return [{ section, steel, screening: screenColumn(prepared, section, steel) }]
  })
}

/** Chapter F as far as it is here: webs that are compact (I) or not slender (HSS). */
function coversFlexure(section: Section, Fy: number): boolean {
  if (section.shape === 'I') return section.webRatio <= webFlexureLimit(E_AISC, Fy)
  if (section.shape === 'round') return true
  return Math.max(section.widthRatio, section.depthRatio) <= boxLimits(E_AISC, Fy).webSlender
}

/** The limits that a shape does not keep. */
export function limitsBroken({ section, screening }: Candidate, limits: Limits): LimitName[] {
  const broken: LimitName[] = []
  if (section.depth > (limits.maxDepth ?? Infinity)) broken.push('depth')
  if (section.width > (limits.maxWidth ?? Infinity)) broken.push('width')
  if (screening.utilisation > limits.maxUtilisation) broken.push('utilisation')
  if (screening.slenderness > (limits.maxSlenderness ?? Infinity)) broken.push('slenderness')
  return broken
}
