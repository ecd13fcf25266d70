import type { Method } from '../aisc360/resistance.ts'
import { basicCombinations, CASES, type Edition, type FactorSet, type LoadCase } from './combinations.ts'
import type { LoadCases } from './loads.ts'

/** One combination with the signs of wind and earthquake chosen. */
export interface Combination {
  /** Such as `1.2D+1.6L+0.5S` or `0.9D−W`; only loads that are there. */
  name: string
  /** Factor of each load; negative where wind or earthquake lifts. */
  factors: FactorSet
  /** The load that each factor multiplies, N, 0 or more. */
  loads: Partial<Record<LoadCase, number>>
  /** N, compression positive; without the weight of the column itself. */
  value: number
}

export interface Extremes {
  /** The largest compression, or 0. */
  compression: number
  compressionBy: Combination
  /** The largest uplift, 0 or more. */
  uplift: number
  upliftBy: Combination
}

function loadOf(cases: LoadCases, load: LoadCase, lifts: boolean): number {
  const { wind, earthquake } = cases
  switch (load) {
    case 'D':
      return cases.dead
    case 'L':
      return cases.live
    case 'Lr':
      return cases.roofLive
    case 'S':
      return cases.snow
    case 'R':
      return cases.rain
    case 'W':
      return lifts ? wind.lifts : wind.pushes
    case 'E':
      return lifts ? earthquake.lifts : earthquake.pushes
    case 'Ev':
      return earthquake.vertical
  }
}

/** A factor as the standard writes it: none for 1. */
function factorText(factor: number): string {
  const text = String(Number(factor.toFixed(4)))
  return text === '1' ? '' : text
}

/** Terms in the order of ASCE 7; a load of zero is left out, dead load never. */
function nameOf(factors: FactorSet, loads: Partial<Record<LoadCase, number>>): string {
  return CASES.filter((load) => factors[load] !== undefined && (load === 'D' || (loads[load] ?? 0) > 0))
    .map((load, index) => {
      const factor = factors[load] ?? 0
      const sign = factor < 0 ? '−' : index === 0 ? '' : '+'
      return `${sign}${factorText(Math.abs(factor))}${load}`
    })
    .join('')
}

function withSign(factors: FactorSet, cases: LoadCases, lifts: boolean): Combination {
  const signed: FactorSet = {}
  const loads: Partial<Record<LoadCase, number>> = {}
  let value = 0
  for (const load of CASES) {
    const factor = factors[load]
    if (factor === undefined) continue
    const sign = lifts && (load === 'W' || load === 'E') ? -1 : 1
    const amount = loadOf(cases, load, lifts)
    signed[load] = sign * factor
    loads[load] = amount
    value += sign * factor * amount
  }
  return { name: nameOf(signed, loads), factors: signed, loads, value }
}

/** Every basic combination with every sign of wind and earthquake, in the order of ASCE 7. */
export function combine(cases: LoadCases, edition: Edition, method: Method, f1: number): Combination[] {
  return basicCombinations(edition, method, f1).flatMap((factors) =>
    factors.W === undefined && factors.E === undefined
      ? [withSign(factors, cases, false)]
      : [withSign(factors, cases, false), withSign(factors, cases, true)],
  )
}

/** Value of a combination when the column itself weighs `selfWeight`, N: its weight is dead load. */
export function valueWith(combination: Combination, selfWeight: number): number {
  return combination.value + (combination.factors.D ?? 0) * selfWeight
}

/** The governing compression and the worst uplift. */
export function extremes(combinations: readonly [Combination, ...Combination[]], selfWeight = 0): Extremes {
  let [most] = combinations
  let [least] = combinations
  for (const one of combinations) {
    if (valueWith(one, selfWeight) > valueWith(most, selfWeight)) most = one
    if (valueWith(one, selfWeight) < valueWith(least, selfWeight)) least = one
  }
  return {
    compression: Math.max(0, valueWith(most, selfWeight)),
    compressionBy: most,
    uplift: Math.max(0, -valueWith(least, selfWeight)),
    upliftBy: least,
  }
}
