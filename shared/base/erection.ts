import { makeStep } from '../units/render.ts'
import type { Check, Step } from '../units/step.ts'
import type { BaseInput, BaseParts } from './base-design.ts'
import { erectionMoment, erectionTension, FEWEST_RODS } from './rods.ts'

export interface Erection {
  moment: number
  spacing: number
  onSide: number
  tension: number
}

/** The erection load each way; the way that pulls a rod the most. Undefined where rods stand in one line or not at all. */
export function worstErection(
  { depth, width }: BaseInput['section'],
  { rods }: BaseParts,
): Erection | undefined {
  if (rods.positions.length === 0) return undefined
  const about = (axis: 0 | 1, size: number): Erection => {
    const at = rods.positions.map((position) => position[axis])
    const [low, high] = [Math.min(...at), Math.max(...at)]
    const onSide = Math.min(
      at.filter((one) => one < low + 1).length,
      at.filter((one) => one > high - 1).length,
    )
    const moment = erectionMoment(size)
    const spacing = high - low
    return { moment, spacing, onSide, tension: erectionTension(moment, onSide, spacing) }
  }
  const [along, across] = [about(0, depth), about(1, width)]
  if (along.spacing === 0 || across.spacing === 0) return undefined
  return along.tension >= across.tension ? along : across
}

/** What 29 CFR 1926.755(a) asks of the rods of a column, which a post is not. */
export function erectionChecks(
  { count, positions }: BaseParts['rods'],
  worst: Erection | undefined,
  capacity: number,
  rod: Step[],
): Check[] {
  const checks: Check[] = []
  if (count < FEWEST_RODS) checks.push(countCheck(count))
  if (worst) checks.push(erectionCheck(worst, capacity, rod))
  else if (positions.length > 0) checks.push(inOneLine())
  return checks
}

function countCheck(count: number): Check {
  return {
    clause: '1926.755(a)',
    title: 'Number of anchor rods',
    demand: FEWEST_RODS,
    capacity: count,
    unit: '1',
    utilisation: FEWEST_RODS / count,
    steps: [],
    notes: ['At least four in every column: OSHA 29 CFR 1926.755(a)(1).'],
  }
}

function inOneLine(): Check {
  return {
    clause: '1926.755(a)',
    title: 'Lines of anchor rods each way',
    demand: 2,
    capacity: 1,
    unit: '1',
    utilisation: 2,
    steps: [],
    notes: ['Rods in one line hold nothing across it: OSHA 29 CFR 1926.755(a)(2).'],
  }
}

function erectionCheck({ moment, spacing, onSide, tension }: Erection, capacity: number, rod: Step[]): Check {
  return {
    clause: '1926.755(a)',
    title: 'Erection load on the anchor rods',
    demand: tension,
    capacity,
    unit: 'N',
    utilisation: tension / capacity,
    steps: [
      makeStep({
        symbol: 'T',
        expression: 'M / (n · s), M of 300 lb at 18 in from the face',
        template: `{0} / (${onSide} · {1})`,
        terms: [
          { value: moment, unit: 'N·mm' },
          { value: spacing, unit: 'mm' },
        ],
        value: tension,
        unit: 'N',
      }),
      ...rod,
    ],
    notes: ['Unfactored, without help from the weight of the column: OSHA 29 CFR 1926.755(a)(2).'],
  }
}
