import { E_AISC } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { nominalFlexure } from './aisc360/flexure.ts'
import { interaction } from './aisc360/interaction.ts'
import { available, FACTORS } from './aisc360/resistance.ts'
import { amplifier, elasticLoad, equivalentMoment } from './aisc360/second-order.ts'
import type { AiscTerms } from './column-request.ts'
import { demandsOf, type Bending, type Demand, type PreparedColumn } from './prepare-column.ts'

/** A column that is bent as well, under the combination that works it hardest. N, N·mm. */
export interface BentScreening {
  utilisation: number
  demand: Demand
  /** Available flexural strengths. */
  capacityStrong: number
  capacityWeak: number
  elasticStrong: number
  elasticWeak: number
  /** B1; undefined where the column is unstable. */
  amplifierStrong: number | undefined
  amplifierWeak: number | undefined
}

interface Axial {
  compression: number
  tension: number
}

/** Available flexural strength about both axes, N·mm. */
export function flexuralCapacity(
  { solution }: PreparedColumn,
  terms: AiscTerms,
  section: Section,
  Fy: number,
): { strong: number; weak: number } {
  const flexure = { E: E_AISC, Fy, Lb: solution.torsion.used, edition: terms.standard }
  const of = (axis: 'strong' | 'weak') =>
    available(nominalFlexure(section, axis, flexure), FACTORS.flexure, terms.method)
  return { strong: of('strong'), weak: of('weak') }
}

/** Appendix 8 and H1 over every combination. Refuses a shape that the clauses of chapter F do not cover. */
export function screenBending(
  prepared: PreparedColumn,
  terms: AiscTerms,
  bending: Bending,
  section: Section,
  Fy: number,
  axial: Axial,
): BentScreening {
  const { solution } = prepared
  const capacity = flexuralCapacity(prepared, terms, section, Fy)
  const elasticStrong = elasticLoad(E_AISC * section.Ix, solution.strong.used)
  const elasticWeak = elasticLoad(E_AISC * section.Iy, solution.weak.used)
  const Cm = { strong: equivalentMoment(bending.ratio.strong), weak: equivalentMoment(bending.ratio.weak) }
  let worst: BentScreening | undefined
  for (const demand of demandsOf(prepared, bending, section.mass)) {
    const amplifierStrong = amplifier(Cm.strong, demand.axial, elasticStrong, terms.method)
    const amplifierWeak = amplifier(Cm.weak, demand.axial, elasticWeak, terms.method)
    const p = demand.axial >= 0 ? demand.axial / axial.compression : -demand.axial / axial.tension
    const utilisation = interaction(
      p,
      // An unstable column works beyond its axial strength in any case: what it bends by has no end.
      ((amplifierStrong ?? 1) * demand.momentStrong) / capacity.strong,
      ((amplifierWeak ?? 1) * demand.momentWeak) / capacity.weak,
    )
    if (worst && worst.utilisation >= utilisation) continue
    worst = {
      ...{ utilisation, demand, elasticStrong, elasticWeak, amplifierStrong, amplifierWeak },
      ...{ capacityStrong: capacity.strong, capacityWeak: capacity.weak },
    }
  }
  if (!worst) throw new Error('a column without a combination')
  return worst
}
