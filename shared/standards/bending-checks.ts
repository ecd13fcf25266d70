import { E_AISC } from '../materials/steel.ts'
import type { Section } from '../sections/section.ts'
import { makeStep } from '../units/render.ts'
import type { Check, Quantity, Step } from '../units/step.ts'
import { flexureCheck } from './aisc360/flexure-check.ts'
import type { Axis } from './aisc360/flexure-hss.ts'
import { INTERACTION_TURN } from './aisc360/interaction.ts'
import { equivalentMoment, secondOrderFactor } from './aisc360/second-order.ts'
import type { Method } from './aisc360/resistance.ts'
import type { AiscTerms } from './column-request.ts'
import type { Bending, PreparedColumn } from './prepare-column.ts'
import type { Screening } from './screen-column.ts'
import type { BentScreening } from './screen-bending.ts'

const plain = (value: number): Quantity => ({ value, unit: '1' })
const newtons = (value: number): Quantity => ({ value, unit: 'N' })
const bend = (value: number): Quantity => ({ value, unit: 'N·mm' })

/** Appendix 8, chapter F about each axis that is bent, and H1, under the combination that works the column hardest. */
export function bendingChecks(
  prepared: PreparedColumn,
  aisc: AiscTerms,
  bending: Bending,
  section: Section,
  Fy: number,
  bent: BentScreening,
  { capacity, tension }: Screening,
): Check[] {
  const { method, standard } = aisc
  const terms = { E: E_AISC, Fy, Lb: prepared.solution.torsion.used, edition: standard }
  const { momentStrong, momentWeak } = bent.demand
  const strong = (bent.amplifierStrong ?? 1) * momentStrong
  const weak = (bent.amplifierWeak ?? 1) * momentWeak
  const checks: Check[] = []
  if (momentStrong > 0) {
    const check = flexureCheck(section, 'strong', terms, method, strong)
    checks.push({
      ...check,
      steps: [...amplifiedSteps('strong', prepared, method, bending, bent), ...check.steps],
    })
  }
  if (momentWeak > 0) {
    const check = flexureCheck(section, 'weak', terms, method, weak)
    checks.push({
      ...check,
      steps: [...amplifiedSteps('weak', prepared, method, bending, bent), ...check.steps],
    })
  }
  const { axial } = bent.demand
  const p = axial >= 0 ? axial / capacity : -axial / tension
  checks.push(interactionCheck(p, strong / bent.capacityStrong, weak / bent.capacityWeak, bent))
  return checks
}

function amplifiedSteps(
  axis: Axis,
  { request }: PreparedColumn,
  method: Method,
  { offset, ratio }: Bending,
  bent: BentScreening,
): Step[] {
  const { demand } = bent
  const strong = axis === 'strong'
  const moment = strong ? demand.momentStrong : demand.momentWeak
  const B1 = strong ? bent.amplifierStrong : bent.amplifierWeak
  const Pe1 = strong ? bent.elasticStrong : bent.elasticWeak
  const name = strong ? 'x' : 'y'
  const alpha = secondOrderFactor(method)
  const off = offset[axis]
  const steps: Step[] = [
    makeStep({
      symbol: `M${name}`,
      expression: off > 0 && !request.required ? `P·e, ${demand.combination.name}` : demand.combination.name,
      template: off > 0 && !request.required ? '{0} · {1}' : '{0}',
      terms:
        off > 0 && !request.required
          ? [newtons(Math.abs(demand.combination.value)), { value: off, unit: 'mm' }]
          : [bend(moment)],
      value: moment,
      unit: 'N·mm',
    }),
  ]
  if (demand.axial <= 0) return steps
  if (B1 === undefined) {
    return [
      ...steps,
      makeStep({
        symbol: 'α·Pr/Pe1',
        expression: 'reaches 1: unstable',
        template: `${alpha} · {0} / {1}`,
        terms: [newtons(demand.axial), newtons(Pe1)],
        value: (alpha * demand.axial) / Pe1,
        unit: '1',
      }),
    ]
  }
  const Cm = equivalentMoment(ratio[axis])
  return [
    ...steps,
    makeStep({
      symbol: 'B1',
      expression: 'Cm / (1 − α·Pr/Pe1), at least 1; Cm = 0.6 − 0.4·M1/M2',
      template: `{0} / (1 − ${alpha} · {1} / {2})`,
      terms: [plain(Cm), newtons(demand.axial), newtons(Pe1)],
      value: B1,
      unit: '1',
    }),
    makeStep({
      symbol: `Mr${name}`,
      expression: `B1 · M${name}`,
      template: '{0} · {1}',
      terms: [plain(B1), bend(moment)],
      value: B1 * moment,
      unit: 'N·mm',
    }),
  ]
}

function interactionCheck(p: number, mx: number, my: number, bent: BentScreening): Check {
  const first = p >= INTERACTION_TURN
  const unstable = bent.amplifierStrong === undefined || bent.amplifierWeak === undefined
  return {
    clause: 'H1',
    title: `Axial force and flexure together, ${bent.demand.combination.name}`,
    demand: bent.utilisation,
    capacity: 1,
    unit: '1',
    utilisation: bent.utilisation,
    steps: [
      makeStep({
        symbol: first ? 'H1-1a' : 'H1-1b',
        expression: first
          ? 'Pr/Pc + 8/9·(Mrx/Mcx + Mry/Mcy), as Pr/Pc ≥ 0.2'
          : 'Pr/(2·Pc) + Mrx/Mcx + Mry/Mcy, as Pr/Pc < 0.2',
        template: first ? '{0} + 8/9 · ({1} + {2})' : '{0} / 2 + {1} + {2}',
        terms: [plain(p), plain(mx), plain(my)],
        value: bent.utilisation,
        unit: '1',
      }),
    ],
    notes: unstable ? ['Unstable: α·Pr reaches the elastic critical load in the plane of bending.'] : [],
  }
}
