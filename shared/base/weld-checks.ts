import { availableStep } from '../standards/aisc360/compression-check.ts'
import { FACTORS, type Method } from '../standards/aisc360/resistance.ts'
import { makeStep } from '../units/render.ts'
import type { Check } from '../units/step.ts'
import type { BaseInput, BaseParts } from './base-design.ts'
import { E70, filletAvailable, filletNominal, leastLeg } from './fillet.ts'
import { wallOf } from './find-base.ts'

/** The fillet all round the shaft: not less than J2.4 asks for, which needs no check once it is kept; and uplift. */
export function weldChecks(
  { section, required }: BaseInput,
  { plate, leg }: BaseParts,
  method: Method,
): { checks: Check[]; values: Record<string, number> } {
  const thinner = Math.min(wallOf(section), plate.thickness)
  const least = leastLeg(thinner)
  const nominal = filletNominal(leg, section.perimeter)
  const capacity = filletAvailable(leg, section.perimeter, method)
  const legCheck: Check = {
    clause: 'J2.4',
    title: 'Least leg of the fillet weld',
    demand: least,
    capacity: leg,
    unit: 'mm',
    utilisation: least / leg,
    steps: [
      makeStep({
        symbol: 'thinner part',
        expression: 'of shaft and plate',
        template: 'min({0}, {1})',
        terms: [
          { value: wallOf(section), unit: 'mm' },
          { value: plate.thickness, unit: 'mm' },
        ],
        value: thinner,
        unit: 'mm',
      }),
    ],
    notes: ['Table J2.4: 3 mm to 6 mm of the thinner part, 5 mm to 13, 6 mm to 19, 8 mm above.'],
  }
  const strength: Check = {
    clause: 'J2',
    title: 'Fillet weld in uplift',
    demand: required.uplift,
    capacity,
    unit: 'N',
    utilisation: required.uplift / capacity,
    steps: [
      makeStep({
        symbol: 'Rn',
        expression: '0.60 · FEXX · 0.707 · leg · L',
        template: '0.60 · {0} · 0.707 · {1} · {2}',
        terms: [
          { value: E70, unit: 'MPa' },
          { value: leg, unit: 'mm' },
          { value: section.perimeter, unit: 'mm' },
        ],
        value: nominal,
        unit: 'N',
      }),
      availableStep(nominal, FACTORS.weld, method, 'Rn'),
    ],
    notes: [],
  }
  return {
    checks: [...(leg < least ? [legCheck] : []), ...(required.uplift > 0 ? [strength] : [])],
    values: { weldAvailable: capacity, leastLeg: least },
  }
}
