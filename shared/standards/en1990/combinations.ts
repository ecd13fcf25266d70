import type { Combination } from '../asce7/combine.ts'
import type { FactorSet, LoadCase } from '../asce7/combinations.ts'
import type { LoadCases } from '../asce7/loads.ts'

export type EnRule = 'EN 1990 6.10' | 'EN 1990 6.10ab'
export type ImposedCategory = 'A' | 'B' | 'C' | 'D' | 'E' | 'H'

/** ψ0 of imposed loads by category, snow (at most 1000 m above the sea) and wind: EN 1990 Table A1.1. */
export const PSI_IMPOSED: Record<ImposedCategory, number> = { A: 0.7, B: 0.7, C: 0.7, D: 0.7, E: 1, H: 0 }
const PSI_ROOF = 0
const PSI_SNOW = 0.5
const PSI_WIND = 0.6

/** γG and γQ, unfavourable; ξ of 6.10b. EN 1990 Table A1.2(B). */
const GAMMA_G = 1.35
const GAMMA_Q = 1.5
const XI = 0.85

interface Action {
  load: LoadCase
  name: string
  amount: number
  psi: number
}

function actionsOf({ live, roofLive, snow, wind }: LoadCases, category: ImposedCategory): Action[] {
  const all: Action[] = [
    { load: 'L', name: 'Q', amount: live, psi: PSI_IMPOSED[category] },
    { load: 'Lr', name: 'Qr', amount: roofLive, psi: PSI_ROOF },
    { load: 'S', name: 'S', amount: snow, psi: PSI_SNOW },
    { load: 'W', name: 'W', amount: wind.pushes, psi: PSI_WIND },
  ]
  return all.filter(({ amount }) => amount > 0)
}

function factorText(factor: number): string {
  const text = String(Number(Math.abs(factor).toFixed(4)))
  return text === '1' ? '' : text
}

function combination(
  dead: number,
  deadFactor: number,
  parts: readonly { action: Action; factor: number }[],
): Combination {
  const factors: FactorSet = { D: deadFactor }
  const loads: Combination['loads'] = { D: dead }
  let value = deadFactor * dead
  let name = `${factorText(deadFactor)}G`
  for (const { action, factor } of parts) {
    if (factor === 0) continue
    factors[action.load] = factor
    loads[action.load] = action.amount
    value += factor * action.amount
    name += `${factor < 0 ? '−' : '+'}${factorText(factor)}${action.name}`
  }
  return { name, factors, loads, value }
}

/**
 * Combinations for strength, EN 1990 Eq. 6.10 or 6.10a and 6.10b: every variable action leading in turn, the others with
 * ψ0; and wind that lifts, with what presses left out and the permanent load favourable (γG = 1.0). Values N.
 */
export function combineEn(cases: LoadCases, rule: EnRule, category: ImposedCategory): Combination[] {
  const { dead, wind } = cases
  const actions = actionsOf(cases, category)
  const led = (deadFactor: number, lead: Action | undefined) =>
    combination(
      dead,
      deadFactor,
      actions.map((action) => ({ action, factor: GAMMA_Q * (action === lead ? 1 : action.psi) })),
    )
  const leading = actions.map((lead) => led(rule === 'EN 1990 6.10' ? GAMMA_G : XI * GAMMA_G, lead))
  const lifts: Action = { load: 'W', name: 'W', amount: wind.lifts, psi: PSI_WIND }
  return [
    combination(dead, GAMMA_G, []),
    // 6.10a: permanent load in full, every variable one accompanying.
    ...(rule === 'EN 1990 6.10ab' ? [led(GAMMA_G, undefined)] : []),
    ...leading,
    ...(wind.lifts > 0 ? [combination(dead, 1, [{ action: lifts, factor: -GAMMA_Q }])] : []),
  ]
}
