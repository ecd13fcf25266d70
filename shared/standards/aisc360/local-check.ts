import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Check, Quantity, Step } from '../../units/step.ts'
import { effectiveArea } from './effective-area.ts'
import { effectiveWidth, fullWidthLimit } from './effective-width.ts'
import { flatElements, roundLimit, type Element } from './local-slenderness.ts'

const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })
const plain = (value: number): Quantity => ({ value, unit: '1' })

/**
 * Every element of a section against its limit of Table B4.1a. A slender one is no failure: where it is not fully
 * effective under the governing stress Fn, what of it counts is shown instead (E7).
 */
export function localChecks(section: Section, E: number, Fy: number, Fn: number): Check[] {
  if (section.shape === 'round') return [roundCheck(section, E, Fy)]
  return flatElements(section, E, Fy).map((element) => elementCheck(element, E, Fy, Fn))
}

function roundCheck(section: Extract<Section, { shape: 'round' }>, E: number, Fy: number): Check {
  const { diameterRatio, area } = section
  const limit = roundLimit(E, Fy)
  const step = makeStep({
    symbol: 'λr',
    expression: '0.11 · E / Fy',
    template: '0.11 · {0} / {1}',
    terms: [mpa(E), mpa(Fy)],
    value: limit,
    unit: '1',
  })
  if (diameterRatio <= limit) return ratioCheck('B4.1a', 'wall, D/t', diameterRatio, limit, [step])
  const counts = effectiveArea(section, E, Fy, Fy)
  return {
    clause: 'E7',
    title: 'Area of the slender wall that counts',
    demand: counts,
    capacity: area,
    unit: 'mm²',
    utilisation: counts / area,
    steps: [step],
    notes: [`Slender: D/t is ${diameterRatio.toFixed(1)}, over λr.`],
  }
}

function elementCheck(element: Element, E: number, Fy: number, Fn: number): Check {
  const { name, symbol, ratio, limit, width } = element
  const step = limitStep(element, E, Fy)
  if (ratio <= limit) return ratioCheck('B4.1a', `${name}, ${symbol}`, ratio, limit, [step])
  const full = fullWidthLimit(limit, Fy, Fn)
  const fullStep = makeStep({
    symbol: 'λ',
    expression: 'λr · √(Fy/Fn), to which all of it counts',
    template: '{0} · √({1} / {2})',
    terms: [plain(limit), mpa(Fy), mpa(Fn)],
    value: full,
    unit: '1',
  })
  if (ratio <= full) {
    const slender = ratioCheck('E7', `${name}, ${symbol}, at its stress`, ratio, full, [step, fullStep])
    return { ...slender, notes: ['Slender by λr, and fully effective at the stress that governs.'] }
  }
  const counts = effectiveWidth(element, Fy, Fn)
  return {
    clause: 'E7',
    title: `Width of the slender ${name} that counts`,
    demand: counts,
    capacity: width,
    unit: 'mm',
    utilisation: counts / width,
    steps: [step, fullStep],
    notes: [`Slender: ${symbol} is ${ratio.toFixed(1)}; the rest of its width carries nothing.`],
  }
}

function limitStep({ coefficient, kc, limit }: Element, E: number, Fy: number): Step {
  const text = coefficient.toFixed(2)
  return makeStep({
    symbol: 'λr',
    expression: kc === null ? `${text} · √(E / Fy)` : `${text} · √(kc·E / Fy), kc = 4/√(h/tw)`,
    template: kc === null ? `${text} · √({0} / {1})` : `${text} · √({2} · {0} / {1})`,
    terms: [mpa(E), mpa(Fy), ...(kc === null ? [] : [plain(kc)])],
    value: limit,
    unit: '1',
  })
}

function ratioCheck(clause: string, name: string, ratio: number, limit: number, steps: Step[]): Check {
  return {
    ...{ clause, title: `Width to thickness of the ${name}`, unit: '1', steps, notes: [] },
    ...{ demand: ratio, capacity: limit, utilisation: ratio / limit },
  }
}
