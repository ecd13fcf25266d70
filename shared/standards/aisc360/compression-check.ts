import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Check, Quantity, Step } from '../../units/step.ts'
import { nominalCompression, type CompressionInput, type Mode } from './compression.ts'
import { effectiveArea } from './effective-area.ts'
import { effectiveAreaSteps } from './effective-area-steps.ts'
import { INELASTIC_LIMIT } from './flexural-buckling.ts'
import { available, FACTORS, type Method } from './resistance.ts'
import { slenderness } from './slenderness.ts'
import { polarRadiusSquared } from './torsional-buckling.ts'

const TITLES = {
  strong: 'Flexural buckling about the strong axis',
  weak: 'Flexural buckling about the weak axis',
  torsion: 'Torsional buckling',
  'constrained axis': 'Torsional buckling about braces off the centre',
} as const

const mm = (value: number): Quantity => ({ value, unit: 'mm' })
const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })
const area = (value: number): Quantity => ({ value, unit: 'mm²' })

/** Resistance as written: `0.90 · {0}` or `{0} / 1.67`. */
export function availableStep(
  nominal: number,
  factors: { phi: number; omega: number },
  method: Method,
  symbol: string,
): Step {
  const [name, template] =
    method === 'LRFD'
      ? [`φ · ${symbol}`, `${factors.phi.toFixed(2)} · {0}`]
      : [`${symbol} / Ω`, `{0} / ${factors.omega.toFixed(2)}`]
  return makeStep({
    symbol: method === 'LRFD' ? `φ${symbol}` : `${symbol}/Ω`,
    expression: name,
    template,
    terms: [{ value: nominal, unit: 'N' }],
    value: available(nominal, factors, method),
    unit: 'N',
  })
}

/** One way of buckling in full: Lc/r, Fe, Fn, Ae where an element is slender, Pn and what of it counts. */
export function compressionCheck(
  section: Section,
  mode: Mode,
  input: CompressionInput,
  method: Method,
  demand: number,
): Check {
  const { E, Fy } = input
  const nominal = nominalCompression(section, mode, E, Fy)
  const capacity = available(nominal, FACTORS.compression, method)
  const Ae = effectiveArea(section, E, Fy, mode.Fn)
  return {
    clause: mode.clause,
    title: TITLES[mode.name],
    demand,
    capacity,
    unit: 'N',
    utilisation: demand / capacity,
    steps: [
      ...elasticSteps(section, mode, input),
      nominalStressStep(Fy, mode),
      ...effectiveAreaSteps(section, E, Fy, mode.Fn),
      makeStep({
        symbol: 'Pn',
        expression: Ae < section.area ? 'Fn · Ae' : 'Fn · Ag',
        template: '{0} · {1}',
        terms: [mpa(mode.Fn), area(Ae)],
        value: nominal,
        unit: 'N',
      }),
      availableStep(nominal, FACTORS.compression, method, 'Pn'),
    ],
    notes: [],
  }
}

function elasticSteps(section: Section, mode: Mode, input: CompressionInput): Step[] {
  if (mode.name === 'strong' || mode.name === 'weak') return flexuralSteps(section, mode, input)
  return section.shape === 'I' ? [torsionalStep(section, mode, input)] : []
}

function flexuralSteps(section: Section, { name, Lc, Fe }: Mode, { E }: CompressionInput): Step[] {
  const r = name === 'strong' ? section.rx : section.ry
  const axis = name === 'strong' ? 'x' : 'y'
  const ratio = slenderness(Lc, r)
  return [
    makeStep({
      symbol: `Lc/r${axis}`,
      expression: `Lc${axis} / r${axis}`,
      template: '{0} / {1}',
      terms: [mm(Lc), mm(r)],
      value: ratio,
      unit: '1',
    }),
    makeStep({
      symbol: 'Fe',
      expression: `π²·E / (Lc/r${axis})²`,
      template: 'π² · {0} / {1}²',
      terms: [mpa(E), { value: ratio, unit: '1' }],
      value: Fe,
      unit: 'MPa',
    }),
  ]
}

function torsionalStep(
  section: Extract<Section, { shape: 'I' }>,
  { Lc, Fe, ya }: Mode,
  { E, G }: CompressionInput,
): Step {
  const { Cw, J, Ix, Iy, ho } = section
  const fourth = (value: number): Quantity => ({ value, unit: 'mm⁴' })
  if (ya === undefined) {
    return makeStep({
      symbol: 'Fe',
      expression: '[π²·E·Cw / Lcz² + G·J] / (Ix + Iy)',
      template: '[π² · {0} · {1} / ({2})² + {3} · {4}] / ({5} + {6})',
      terms: [mpa(E), { value: Cw, unit: 'mm⁶' }, mm(Lc), mpa(G), fourth(J), fourth(Ix), fourth(Iy)],
      value: Fe,
      unit: 'MPa',
    })
  }
  return makeStep({
    symbol: 'Fe',
    expression: '[π²·E·Iy / Lcz² · (ho²/4 + ya²) + G·J] / (A·ro²), ro² = rx² + ry² + ya²',
    template: '[π² · {0} · {1} / ({2})² · (({3})²/4 + ({4})²) + {5} · {6}] / ({7} · {8})',
    terms: [
      ...[mpa(E), fourth(Iy), mm(Lc), mm(ho), mm(ya), mpa(G), fourth(J)],
      ...[area(section.area), area(polarRadiusSquared(section, ya))],
    ],
    value: Fe,
    unit: 'MPa',
  })
}

function nominalStressStep(Fy: number, { Fe, Fn }: Mode): Step {
  const inelastic = Fy / Fe <= INELASTIC_LIMIT
  return makeStep({
    symbol: 'Fn',
    expression: inelastic ? '0.658^(Fy/Fe) · Fy, as Fy/Fe ≤ 2.25' : '0.877 · Fe, as Fy/Fe > 2.25',
    template: inelastic ? '0.658^({0} / {1}) · {0}' : '0.877 · {1}',
    terms: [mpa(Fy), mpa(Fe)],
    value: Fn,
    unit: 'MPa',
  })
}
