import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Quantity, Step } from '../../units/step.ts'
import { effectiveArea } from './effective-area.ts'
import { effectiveWidth, elasticLocalStress, fullWidthLimit } from './effective-width.ts'
import { flatElements, type Element } from './local-slenderness.ts'

const mm = (value: number): Quantity => ({ value, unit: 'mm' })
const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })
const area = (value: number): Quantity => ({ value, unit: 'mm²' })
const plain = (value: number): Quantity => ({ value, unit: '1' })

/** The reduction of E7 for what is slender at the stress Fn; nothing where all of the section counts. */
export function effectiveAreaSteps(section: Section, E: number, Fy: number, Fn: number): Step[] {
  const Ae = effectiveArea(section, E, Fy, Fn)
  if (Ae === section.area) return []
  if (section.shape === 'round') {
    return [
      makeStep({
        symbol: 'Ae',
        expression: '[0.038·E / (Fy·D/t) + 2/3] · Ag, at most Ag',
        template: '[0.038 · {0} / ({1} · {2}) + 2/3] · {3}',
        terms: [mpa(E), mpa(Fy), plain(section.diameterRatio), area(section.area)],
        value: Ae,
        unit: 'mm²',
      }),
    ]
  }
  const slender = flatElements(section, E, Fy).filter(
    (element) => element.ratio > fullWidthLimit(element.limit, Fy, Fn),
  )
  return [
    ...slender.flatMap((element) => widthSteps(element, Fy, Fn)),
    areaStep(section, slender, Fy, Fn, Ae),
  ]
}

function widthSteps(element: Element, Fy: number, Fn: number): Step[] {
  const { name, ratio, limit, c1, c2, width } = element
  const Fel = elasticLocalStress(c2, limit, ratio, Fy)
  return [
    makeStep({
      symbol: 'Fel',
      expression: `(c2·λr/λ)² · Fy, ${name}, λ > λr·√(Fy/Fn)`,
      template: `(${c2} · {0} / {1})² · {2}`,
      terms: [plain(limit), plain(ratio), mpa(Fy)],
      value: Fel,
      unit: 'MPa',
    }),
    makeStep({
      symbol: 'be',
      expression: `b · (1 − c1·√(Fel/Fn)) · √(Fel/Fn), at most b`,
      template: `{0} · (1 − ${c1} · √({1} / {2})) · √({1} / {2})`,
      terms: [mm(width), mpa(Fel), mpa(Fn)],
      value: effectiveWidth(element, Fy, Fn),
      unit: 'mm',
    }),
  ]
}

function areaStep(section: Section, slender: readonly Element[], Fy: number, Fn: number, Ae: number): Step {
  const terms: Quantity[] = [area(section.area)]
  const lost = slender.map((element) => {
    const at = terms.length
    terms.push(mm(element.width), mm(effectiveWidth(element, Fy, Fn)), mm(element.thickness))
    return ` − ${element.count} · ({${at}} − {${at + 1}}) · {${at + 2}}`
  })
  return makeStep({
    symbol: 'Ae',
    expression: 'Ag − Σ n·(b − be)·t',
    template: `{0}${lost.join('')}`,
    terms,
    value: Ae,
    unit: 'mm²',
  })
}
