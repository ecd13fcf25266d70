import { describe, expect, it } from 'vitest'
import {
  feet,
  inches,
  kips,
  ksi,
  KG_M_PER_LB_FT,
  MPA_PER_KSI,
  mm,
  newtons,
  type Megapascals,
  type Millimetres,
  type Newtons,
} from '../../../shared/units/convert.ts'

function clear(height: Millimetres): number {
  return height
}
function carry(force: Newtons): number {
  return force
}
function stress(value: Megapascals): number {
  return value
}

/** What must not compile; the type check of the tests fails when one of these does. */
export function mixesUnits(): number[] {
  return [
    // @ts-expect-error a force is not a length
    clear(newtons(5)),
    // @ts-expect-error a length is not a force
    carry(mm(5)),
    // @ts-expect-error a stress is not a force
    carry(ksi(50)),
    // @ts-expect-error a bare number has no unit
    stress(50),
  ]
}

/* Exact by definition: 1 in = 25.4 mm, 1 lb = 0.45359237 kg, standard gravity 9.80665 m/s² (NIST SP 811, appendix B). */
describe('conversions', () => {
  it('are the exact ones', () => {
    expect(clear(inches(1))).toBe(25.4)
    expect(clear(feet(1))).toBeCloseTo(304.8, 12)
    expect(carry(kips(1))).toBeCloseTo(0.45359237 * 9.80665 * 1000, 9)
    expect(stress(ksi(1))).toBeCloseTo((0.45359237 * 9.80665 * 1000) / 25.4 ** 2, 12)
    expect(MPA_PER_KSI).toBeCloseTo(6.894757, 6)
    expect(KG_M_PER_LB_FT).toBeCloseTo(1.48816394, 8)
  })
})
