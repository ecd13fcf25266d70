import { describe, expect, it } from 'vitest'
import { catalogue } from '../../seeds/reference/catalogue.ts'
import { designBase } from '../../shared/base/design-base.ts'

/* EN 1993-1-8 6.2.5, against a separate program written from the standard alone. Tolerance 0.1 %. */
describe('HEB 200 on a plate 350 × 350 × 25 of S275 (265 MPa), C25/30, 1200 kN', () => {
  const section = catalogue.find('HEB 200')
  if (!section) throw new Error('no HEB 200')
  const { values, verdict } = designBase({
    standard: 'EN 1993-1-1',
    section,
    required: { compression: 1_200_000, uplift: 0 },
    concrete: { strength: 25 },
    plate: { length: 350, width: 350, thickness: 25, yield: 265 },
    stock: { thicknesses: [25], rodDiameters: [19.05] },
  })
  it.each([
    ['fjd', 9.4444444],
    ['bearingWidth', 76.456447],
    ['bearingArea', 119_286.14],
    ['bearingAvailable', 1_126_591.3],
    ['bearingRatio', 1.06516],
  ])('%s is %s', (name, expected) => {
    expect(Math.abs((values[name] ?? NaN) / expected - 1)).toBeLessThanOrEqual(1e-3)
  })
  it('fails', () => expect(verdict).toBe('fails'))
})
