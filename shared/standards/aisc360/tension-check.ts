import type { Steel } from '../../materials/steel.ts'
import type { Section } from '../../sections/section.ts'
import { makeStep } from '../../units/render.ts'
import type { Check, Quantity, Step } from '../../units/step.ts'
import { availableStep } from './compression-check.ts'
import { FACTORS, type Method } from './resistance.ts'
import { availableTension, tensionRupture, tensionYield } from './tension.ts'

function nominalStep(symbol: string, expression: string, stress: number, area: number, value: number): Step {
  const terms: Quantity[] = [
    { value: stress, unit: 'MPa' },
    { value: area, unit: 'mm²' },
  ]
  return makeStep({ symbol, expression, template: '{0} · {1}', terms, value, unit: 'N' })
}

/** Net uplift on the shaft: yield of the gross section and rupture. N. */
export function tensionCheck(
  section: Section,
  { Fy, Fu }: Pick<Steel, 'Fy' | 'Fu'>,
  method: Method,
  demand: number,
): Check {
  const { area } = section
  const capacity = availableTension(Fy, Fu, area, method)
  const [yields, ruptures] = [tensionYield(Fy, area), tensionRupture(Fu, area)]
  return {
    clause: 'D2',
    title: 'Tension in uplift',
    demand,
    capacity,
    unit: 'N',
    utilisation: demand / capacity,
    steps: [
      nominalStep('Pn', 'Fy · Ag, yield', Fy, area, yields),
      availableStep(yields, FACTORS.tensionYield, method, 'Pn'),
      nominalStep('Pn', 'Fu · Ae, rupture; Ae = Ag for a shaft without holes', Fu, area, ruptures),
      availableStep(ruptures, FACTORS.tensionRupture, method, 'Pn'),
    ],
    notes: [],
  }
}
