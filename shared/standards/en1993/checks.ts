import { E_EN, G_EN } from '../../materials/european-steels.ts'
import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Check, Quantity, Step } from '../../units/step.ts'
import { halfPhi, IMPERFECTION } from './buckling.ts'
import { classThreeLimit, epsilonOf, partClass, partsOf, roundClass, type Part } from './classification.ts'
import { GAMMA_M0, GAMMA_M1, tensionEn, type ModeEn } from './compression.ts'
import { effectiveAreaEn, plateSlenderness, reductionOf } from './effective-area.ts'

const mm = (value: number): Quantity => ({ value, unit: 'mm' })
const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })
const area = (value: number): Quantity => ({ value, unit: 'mm²' })
const fourth = (value: number): Quantity => ({ value, unit: 'mm⁴' })
const newtons = (value: number): Quantity => ({ value, unit: 'N' })
const plain = (value: number): Quantity => ({ value, unit: '1' })

const TITLES = {
  strong: 'Flexural buckling about the strong axis (y–y)',
  weak: 'Flexural buckling about the weak axis (z–z)',
  torsion: 'Torsional buckling',
} as const

/** One way of buckling in full: Ncr, λ̄, Φ, χ, Nb,Rd. */
export function bucklingCheckEn(section: Section, fy: number, mode: ModeEn, demand: number): Check {
  const { name, curve, Ncr, lambda, chi, resistance } = mode
  const Aeff = effectiveAreaEn(section, fy)
  const whole = Aeff === section.area
  return {
    clause: '6.3.1',
    title: `${TITLES[name]}, curve ${curve}`,
    ...{ demand, capacity: resistance, unit: 'N', utilisation: demand / resistance },
    steps: [
      criticalStep(section, mode),
      makeStep({
        symbol: 'λ̄',
        expression: whole ? '√(A·fy / Ncr)' : '√(Aeff·fy / Ncr)',
        template: '√({0} · {1} / {2})',
        terms: [area(Aeff), mpa(fy), newtons(Ncr)],
        value: lambda,
        unit: '1',
      }),
      makeStep({
        symbol: 'Φ',
        expression: '0.5·[1 + α·(λ̄ − 0.2) + λ̄²]',
        template: `0.5 · [1 + ${IMPERFECTION[curve]} · ({0} − 0.2) + {0}²]`,
        terms: [plain(lambda)],
        value: halfPhi(lambda, curve),
        unit: '1',
      }),
      makeStep({
        symbol: 'χ',
        expression: '1 / (Φ + √(Φ² − λ̄²)), at most 1',
        template: '1 / ({0} + √({0}² − {1}²))',
        terms: [plain(halfPhi(lambda, curve)), plain(lambda)],
        value: chi,
        unit: '1',
      }),
      makeStep({
        symbol: 'Nb,Rd',
        expression: whole ? 'χ·A·fy / γM1' : 'χ·Aeff·fy / γM1',
        template: `{0} · {1} · {2} / ${GAMMA_M1.toFixed(2)}`,
        terms: [plain(chi), area(Aeff), mpa(fy)],
        value: resistance,
        unit: 'N',
      }),
    ],
    notes: [],
  }
}

function criticalStep(section: Section, { name, length, Ncr }: ModeEn): Step {
  if (name === 'torsion' && section.shape === 'I') {
    const { J, Cw, Ix, Iy } = section
    return makeStep({
      symbol: 'Ncr,T',
      expression: '(G·It + π²·E·Iw / LT²) / i0², i0² = (Iy + Iz) / A',
      template: '({0} · {1} + π² · {2} · {3} / ({4})²) · {5} / ({6} + {7})',
      terms: [
        ...[mpa(G_EN), fourth(J), mpa(E_EN), { value: Cw, unit: 'mm⁶' } as const, mm(length)],
        ...[area(section.area), fourth(Ix), fourth(Iy)],
      ],
      value: Ncr,
      unit: 'N',
    })
  }
  return makeStep({
    symbol: 'Ncr',
    expression: 'π²·E·I / Lcr²',
    template: 'π² · {0} · {1} / ({2})²',
    terms: [mpa(E_EN), fourth(name === 'strong' ? section.Ix : section.Iy), mm(length)],
    value: Ncr,
    unit: 'N',
  })
}

/** Class of every part; of a part of class 4 what of its width counts (EN 1993-1-5). */
export function classChecks(section: Section, fy: number): Check[] {
  if (section.shape === 'round') {
    const limit = 90 * epsilonOf(fy) ** 2
    const step = limitStep('90·ε², ε = √(235/fy)', '90 · 235 / {0}', fy, limit)
    return [
      ratioCheck('wall, D/t', roundClass(section.diameterRatio, fy), section.diameterRatio, limit, step),
    ]
  }
  return partsOf(section).map((part) => partCheck(part, fy))
}

function partCheck(part: Part, fy: number): Check {
  const { name, kind, c, t } = part
  const limit = classThreeLimit(kind, fy)
  const multiple = kind === 'internal' ? 42 : 14
  const step = limitStep(`${multiple}·ε, ε = √(235/fy)`, `${multiple} · √(235 / {0})`, fy, limit)
  const grade = partClass(part, fy)
  if (grade < 4) return ratioCheck(`${name}, c/t`, grade, c / t, limit, step)
  const rho = reductionOf(part, fy)
  const k = kind === 'internal' ? '4' : '0.43'
  return {
    clause: 'EN 1993-1-5 4.4',
    title: `Width of the ${name} that counts, class 4`,
    ...{ demand: rho * c, capacity: c, unit: 'mm', utilisation: rho },
    steps: [
      step,
      makeStep({
        symbol: 'λ̄p',
        expression: '(c/t) / (28.4·ε·√kσ)',
        template: `({0} / {1}) / (28.4 · √(235 / {2}) · √${k})`,
        terms: [mm(c), mm(t), mpa(fy)],
        value: plateSlenderness(part, fy),
        unit: '1',
      }),
      makeStep({
        symbol: 'ρ',
        expression: kind === 'internal' ? '(λ̄p − 0.22) / λ̄p²' : '(λ̄p − 0.188) / λ̄p²',
        template: kind === 'internal' ? '({0} − 0.22) / {0}²' : '({0} − 0.188) / {0}²',
        terms: [plain(plateSlenderness(part, fy))],
        value: rho,
        unit: '1',
      }),
    ],
    notes: [],
  }
}

function limitStep(expression: string, template: string, fy: number, value: number): Step {
  return makeStep({ symbol: 'class 3', expression, template, terms: [mpa(fy)], value, unit: '1' })
}

function ratioCheck(name: string, grade: number, ratio: number, limit: number, step: Step): Check {
  return {
    clause: '5.5',
    title: `Class ${grade}: ${name}`,
    ...{ demand: ratio, capacity: limit, unit: '1', utilisation: ratio / limit },
    steps: [step],
    notes: [],
  }
}

export function tensionCheckEn(section: Section, fy: number, demand: number): Check {
  const capacity = tensionEn(section.area, fy)
  return {
    clause: '6.2.3',
    title: 'Tension in uplift',
    ...{ demand, capacity, unit: 'N', utilisation: demand / capacity },
    steps: [
      makeStep({
        symbol: 'Npl,Rd',
        expression: 'A·fy / γM0; a shaft without holes',
        template: `{0} · {1} / ${GAMMA_M0.toFixed(2)}`,
        terms: [area(section.area), mpa(fy)],
        value: capacity,
        unit: 'N',
      }),
    ],
    notes: [],
  }
}
