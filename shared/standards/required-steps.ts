import { makeStep } from '../units/render.ts'
import type { Quantity, Step } from '../units/step.ts'
import { CASES } from './asce7/combinations.ts'
import { valueWith, type Combination } from './asce7/combine.ts'
import { selfWeight, STANDARD_GRAVITY } from './asce7/self-weight.ts'
import type { PreparedColumn } from './prepare-column.ts'

const newtons = (value: number): Quantity => ({ value, unit: 'N' })

/** A factor as written before its load: `1.2 · `, nothing for 1. */
function factorText(factor: number): string {
  const size = Number(Math.abs(factor).toFixed(4))
  return size === 1 ? '' : `${size} · `
}

/** How a required strength comes about: the column's own weight, then the combination. Compression positive, N. */
export function requiredSteps(
  prepared: PreparedColumn,
  massPerMetre: number,
  combination: Combination,
  symbol: string,
): Step[] {
  const { weighedHeight, request } = prepared
  if (request.required) {
    return [
      makeStep({
        symbol,
        expression: 'as given',
        template: '{0}',
        terms: [newtons(combination.value)],
        value: combination.value,
        unit: 'N',
      }),
    ]
  }
  const weight = selfWeight(massPerMetre, weighedHeight)
  return [
    ...(weighedHeight > 0 ? [weightStep(massPerMetre, weighedHeight, weight)] : []),
    combinationStep(combination, weight, symbol),
  ]
}

function weightStep(massPerMetre: number, height: number, weight: number): Step {
  return makeStep({
    symbol: 'Dc',
    expression: 'w · H, own weight of the column',
    template: '{0} · {1}',
    terms: [
      { value: (massPerMetre * STANDARD_GRAVITY) / 1000, unit: 'N/mm' },
      { value: height, unit: 'mm' },
    ],
    value: weight,
    unit: 'N',
  })
}

function combinationStep(combination: Combination, weight: number, symbol: string): Step {
  const { factors, loads, name } = combination
  const parts: string[] = []
  const terms: Quantity[] = []
  for (const load of CASES) {
    const factor = factors[load]
    const amount = loads[load] ?? 0
    if (factor === undefined || (load !== 'D' && amount === 0)) continue
    const sign = factor < 0 ? '−' : parts.length === 0 ? '' : '+'
    const place = (value: number) => `{${terms.push(newtons(value)) - 1}}`
    const inside = load === 'D' && weight > 0 ? `(${place(amount)} + ${place(weight)})` : place(amount)
    parts.push(`${sign}${parts.length === 0 ? '' : ' '}${factorText(factor)}${inside}`)
  }
  const expression = weight > 0 ? `${name}, D with the column's own weight` : name
  const value = valueWith(combination, weight)
  return makeStep({ symbol, expression, template: parts.join(' '), terms, value, unit: 'N' })
}
