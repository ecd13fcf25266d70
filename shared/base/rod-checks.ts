import { rodSteel } from '../materials/plate-steels.ts'
import type { Method } from '../standards/aisc360/resistance.ts'
import { availableStep } from '../standards/aisc360/compression-check.ts'
import { FACTORS } from '../standards/aisc360/resistance.ts'
import { makeStep } from '../units/render.ts'
import type { Check, Quantity, Step } from '../units/step.ts'
import type { BaseInput, BaseParts } from './base-design.ts'
import { upliftThickness } from './cantilever.ts'
import { erectionChecks, worstErection } from './erection.ts'
import { erectionMoment, isPost, rodArea, rodAvailable, rodNominal } from './rods.ts'

const mm = (value: number): Quantity => ({ value, unit: 'mm' })
const newtons = (value: number): Quantity => ({ value, unit: 'N' })
const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })

interface Found {
  checks: Check[]
  values: Record<string, number>
}

/** Rods: how many, whether there is room, the erection load, and net uplift where there is any. */
export function rodChecks(input: BaseInput, parts: BaseParts, method: Method): Found {
  const { section, required, weight } = input
  const { rods, plate } = parts
  const Fu = rodSteel(rods.grade)?.Fu ?? 0
  const capacity = rodAvailable(Fu, rods.diameter, method)
  const worst = worstErection(section, parts)
  const steps = rodSteps(Fu, rods.diameter, method)
  const checks: Check[] = []
  if (rods.positions.length === 0) checks.push(noRoom(section.designation))
  if (!isPost(weight)) checks.push(...erectionChecks(rods, worst, capacity, steps))
  const share = required.uplift / rods.count
  if (required.uplift > 0) checks.push(upliftCheck(required.uplift, rods.count, capacity, steps))
  const pulled = upliftThickness(share, plate.yield, method)
  if (required.uplift > 0) checks.push(pullCheck(share, pulled, plate, method))
  return {
    checks,
    values: {
      rodAvailable: capacity,
      erectionMoment: erectionMoment(Math.max(section.depth, section.width)),
      ...(worst ? { erectionRodTension: worst.tension } : {}),
      ...(required.uplift > 0 ? { upliftPerRod: share, upliftThickness: pulled } : {}),
    },
  }
}

function noRoom(designation: string): Check {
  return {
    clause: 'shop practice',
    title: 'Room for the anchor rods',
    demand: 1,
    capacity: 0,
    unit: '1',
    utilisation: 2,
    steps: [],
    notes: [`Washers and wrench have no room beside ${designation}: a larger plate or smaller rods.`],
  }
}

function upliftCheck(uplift: number, count: number, capacity: number, rod: Step[]): Check {
  const share = uplift / count
  return {
    clause: 'J3.7',
    title: 'Uplift on each anchor rod',
    demand: share,
    capacity,
    unit: 'N',
    utilisation: share / capacity,
    steps: [
      makeStep({
        symbol: 'T',
        expression: 'uplift / number of rods',
        template: `{0} / ${count}`,
        terms: [newtons(uplift)],
        value: share,
        unit: 'N',
      }),
      ...rod,
    ],
    notes: [],
  }
}

function pullCheck(
  share: number,
  needed: number,
  { thickness, yield: Fy }: BaseParts['plate'],
  method: Method,
): Check {
  const { phi, omega } = FACTORS.plateBending
  const lrfd = method === 'LRFD'
  return {
    clause: 'Design Guide 1',
    title: 'Thickness of the base plate under the pull of a rod',
    demand: needed,
    capacity: thickness,
    unit: 'mm',
    utilisation: needed / thickness,
    steps: [
      makeStep({
        symbol: 't',
        expression: lrfd ? '√(2·T / (φ·Fy))' : '√(2·Ω·T / Fy)',
        template: lrfd ? `√(2 · {0} / (${phi.toFixed(2)} · {1}))` : `√(2 · ${omega.toFixed(2)} · {0} / {1})`,
        terms: [newtons(share), mpa(Fy)],
        value: needed,
        unit: 'mm',
      }),
    ],
    notes: ['A strip that widens at 45° from the rod to the shaft carries it: common practice of the trade.'],
  }
}

function rodSteps(Fu: number, diameter: number, method: Method): Step[] {
  const nominal = rodNominal(Fu, diameter)
  return [
    makeStep({
      symbol: 'Ab',
      expression: 'π/4 · d²',
      template: 'π/4 · ({0})²',
      terms: [mm(diameter)],
      value: rodArea(diameter),
      unit: 'mm²',
    }),
    makeStep({
      symbol: 'Rn',
      expression: '0.75 · Fu · Ab',
      template: '0.75 · {0} · {1}',
      terms: [mpa(Fu), { value: rodArea(diameter), unit: 'mm²' }],
      value: nominal,
      unit: 'N',
    }),
    availableStep(nominal, FACTORS.rod, method, 'Rn'),
  ]
}
