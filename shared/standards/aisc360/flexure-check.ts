import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Check, Quantity, Step } from '../../units/step.ts'
import { flexureBox, flexureRound, type Axis } from './flexure-hss.ts'
import { strongFlexureI, weakFlexureI } from './flexure-i.ts'
import { nominalFlexure, type FlexureTerms } from './flexure.ts'
import { available, FACTORS, type Method } from './resistance.ts'

const mm = (value: number): Quantity => ({ value, unit: 'mm' })
const mpa = (value: number): Quantity => ({ value, unit: 'MPa' })
const cubic = (value: number): Quantity => ({ value, unit: 'mm³' })
const bend = (value: number): Quantity => ({ value, unit: 'N·mm' })

function momentStep(
  symbol: string,
  expression: string,
  template: string,
  terms: Quantity[],
  value: number,
): Step {
  return makeStep({ symbol, expression, template, terms, value, unit: 'N·mm' })
}

/** Flexure about one axis in full: every limit state, and what of the least of them counts. */
export function flexureCheck(
  section: Section,
  axis: Axis,
  terms: FlexureTerms,
  method: Method,
  demand: number,
): Check {
  const nominal = nominalFlexure(section, axis, terms)
  const capacity = available(nominal, FACTORS.flexure, method)
  const { phi, omega } = FACTORS.flexure
  const lrfd = method === 'LRFD'
  return {
    clause: clauseOf(section, axis),
    title: `Flexure about the ${axis} axis`,
    demand,
    capacity,
    unit: 'N·mm',
    utilisation: demand / capacity,
    steps: [
      ...limitSteps(section, axis, terms),
      momentStep('Mn', 'the least of these', '{0}', [bend(nominal)], nominal),
      momentStep(
        lrfd ? 'φMn' : 'Mn/Ω',
        lrfd ? 'φ · Mn' : 'Mn / Ω',
        lrfd ? `${phi.toFixed(2)} · {0}` : `{0} / ${omega.toFixed(2)}`,
        [bend(nominal)],
        capacity,
      ),
    ],
    notes: axis === 'strong' && section.shape !== 'round' ? ['Cb is taken as 1.'] : [],
  }
}

function clauseOf({ shape }: Section, axis: Axis): string {
  if (shape === 'box') return 'F7'
  if (shape === 'round') return 'F8'
  return axis === 'strong' ? 'F2, F3' : 'F6'
}

function limitSteps(section: Section, axis: Axis, { E, Fy, Lb, edition }: FlexureTerms): Step[] {
  switch (section.shape) {
    case 'I': {
      if (axis === 'weak') {
        const { Mp, flange } = weakFlexureI(section, E, Fy, edition)
        return [
          momentStep('Mp', 'Fy·Zy, at most 1.6·Fy·Sy', '{0} · {1}', [mpa(Fy), cubic(section.Zy)], Mp),
          momentStep('Mn', 'flange local buckling', '{0}', [bend(flange)], flange),
        ]
      }
      const { Mp, Lp, Lr, lateral, flange } = strongFlexureI(section, E, Fy, Lb)
      return [
        momentStep('Mp', 'Fy·Zx', '{0} · {1}', [mpa(Fy), cubic(section.Zx)], Mp),
        lengthStep(
          'Lp',
          '1.76·ry·√(E/Fy)',
          '1.76 · {0} · √({1} / {2})',
          [mm(section.ry), mpa(E), mpa(Fy)],
          Lp,
        ),
        lengthStep('Lr', 'Eq. F2-6, of rts, J, Sx, ho', '{0}', [mm(Lr)], Lr),
        lateralStep(Mp, 0.7 * Fy * section.Sx, { Lb, Lp, Lr }, lateral),
        momentStep('Mn', 'flange local buckling, F3', '{0}', [bend(flange)], flange),
      ]
    }
    case 'box': {
      const { Mp, Lp, Lr, lateral, flange, web } = flexureBox(section, axis, E, Fy, Lb)
      const Z = axis === 'strong' ? section.Zx : section.Zy
      return [
        momentStep('Mp', 'Fy·Z', '{0} · {1}', [mpa(Fy), cubic(Z)], Mp),
        momentStep('Mn', 'flange local buckling', '{0}', [bend(flange)], flange),
        momentStep('Mn', 'web local buckling', '{0}', [bend(web)], web),
        ...(lateral < Mp ? [lateralStep(Mp, 0.7 * Fy * section.Sx, { Lb, Lp, Lr }, lateral)] : []),
      ]
    }
    case 'round': {
      const { Mp, nominal } = flexureRound(section, E, Fy)
      return [
        momentStep('Mp', 'Fy·Z', '{0} · {1}', [mpa(Fy), cubic(section.Zx)], Mp),
        ...(nominal < Mp ? [momentStep('Mn', 'local buckling', '{0}', [bend(nominal)], nominal)] : []),
      ]
    }
  }
}

function lengthStep(
  symbol: string,
  expression: string,
  template: string,
  terms: Quantity[],
  value: number,
): Step {
  return makeStep({ symbol, expression, template, terms, value, unit: 'mm' })
}

function lateralStep(
  Mp: number,
  first: number,
  { Lb, Lp, Lr }: { Lb: number; Lp: number; Lr: number },
  value: number,
): Step {
  if (Lb <= Lp) return momentStep('Mn', 'Mp, as Lb ≤ Lp', '{0}', [bend(Mp)], value)
  if (Lb > Lr)
    return momentStep('Mn', 'elastic lateral-torsional buckling, as Lb > Lr', '{0}', [bend(value)], value)
  return momentStep(
    'Mn',
    'Mp − (Mp − 0.7·Fy·Sx)·(Lb − Lp)/(Lr − Lp), at most Mp',
    '{0} − ({0} − {1}) · ({2} − {3}) / ({4} − {3})',
    [bend(Mp), bend(first), mm(Lb), mm(Lp), mm(Lr)],
    value,
  )
}
