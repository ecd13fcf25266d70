import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Check, Quantity, Step } from '../../units/step.ts'
import { flatElements, roundLimit, type Element } from './local-slenderness.ts'

const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })

/** Every element against its limit of Table B4.1a. A slender one is no failure: E7 takes it into account. */
export function localChecks(section: Section, E: number, Fy: number): Check[] {
  if (section.shape === 'round') {
    const limit = roundLimit(E, Fy)
    const step = makeStep({
      symbol: 'λr',
      expression: '0.11 · E / Fy',
      template: '0.11 · {0} / {1}',
      terms: [mpa(E), mpa(Fy)],
      value: limit,
      unit: '1',
    })
    return [localCheck('wall, D/t', section.diameterRatio, limit, step)]
  }
  return flatElements(section, E, Fy).map((element) =>
    localCheck(`${element.name}, ${element.symbol}`, element.ratio, element.limit, limitStep(element, E, Fy)),
  )
}

function limitStep({ coefficient, kc, limit }: Element, E: number, Fy: number): Step {
  const text = coefficient.toFixed(2)
  return makeStep({
    symbol: 'λr',
    expression: kc === null ? `${text} · √(E / Fy)` : `${text} · √(kc·E / Fy), kc = 4/√(h/tw)`,
    template: kc === null ? `${text} · √({0} / {1})` : `${text} · √({2} · {0} / {1})`,
    terms: [mpa(E), mpa(Fy), ...(kc === null ? [] : [{ value: kc, unit: '1' } as const])],
    value: limit,
    unit: '1',
  })
}

function localCheck(name: string, ratio: number, limit: number, step: Step): Check {
  const slender = ratio > limit
  return {
    clause: 'B4.1a',
    title: `Width to thickness of the ${name}`,
    demand: ratio,
    capacity: limit,
    unit: '1',
    utilisation: Math.min(1, ratio / limit),
    steps: [step],
    notes: slender
      ? ['Slender: the area that counts is reduced by E7 wherever the stress is high enough to matter.']
      : [],
  }
}
