import { describe, expect, it } from 'vitest'
import type { BaseInput } from '../../../shared/base/base-design.ts'
import { designBase } from '../../../shared/base/design-base.ts'
import { Refusal } from '../../../shared/units/refusal.ts'
import { baseInput, STOCK } from '../../support/base-input.ts'

const failing = (input: BaseInput) =>
  designBase(input)
    .checks.filter(({ utilisation }) => utilisation > 1)
    .map(({ title }) => title)

describe('a base of which nothing is given', () => {
  const shapes = ['W10X49', 'W14X90', 'W24X104', 'HSS6X6X3/8', 'HSS12X4X1/4', 'PIPE6STD', 'HSS16.000X0.500']
  const loads = [50_000, 600_000, 2_500_000]
  it.each(shapes.flatMap((name) => loads.map((compression) => [name, compression] as const)))(
    '%s with %d N holds on the thinnest stocked plate that does',
    (name, compression) => {
      const input = baseInput(name, { required: { compression, uplift: 0 } })
      const found = designBase(input)
      expect(found.verdict).toBe('holds')
      expect(failing(input)).toEqual([])
      const { plate, rods, holes } = found
      expect(plate.length % 10).toBe(0)
      expect(plate.width % 10).toBe(0)
      expect(rods.positions).toHaveLength(4)
      expect(holes).toEqual({ count: 4, diameter: (21 / 16) * 25.4 })
      const thinner = STOCK.thicknesses[STOCK.thicknesses.indexOf(plate.thickness) - 1]
      if (thinner === undefined) return
      expect(designBase({ ...input, plate: { ...plate, thickness: thinner } }).verdict).toBe('fails')
    },
  )

  it('is the same base when it is given back to be checked', () => {
    const input = baseInput('W12X65', { required: { compression: 1_200_000, uplift: 150_000 } })
    const { plate, rods, values, verdict } = designBase(input)
    const { count, diameter, grade } = rods
    const again = designBase({ ...input, plate, rods: { count, diameter, grade } })
    expect(again).toMatchObject({ plate, rods, values, verdict })
  })

  it('grows with the load and with weaker concrete', () => {
    const area = (compression: number, strength: number) => {
      const { plate } = designBase(
        baseInput('W12X65', { required: { compression, uplift: 0 }, concrete: { strength } }),
      )
      return plate.length * plate.width
    }
    expect(area(6_000_000, 28)).toBeGreaterThan(area(3_000_000, 28))
    expect(area(6_000_000, 20)).toBeGreaterThan(area(6_000_000, 28))
  })

  it('takes larger rods, a thicker plate and a check of each for uplift', () => {
    const input = baseInput('W12X65', { required: { compression: 0, uplift: 400_000 } })
    const found = designBase(input)
    // 100 kN a rod: 0.75·0.75·58 ksi·Ab of a 3/4 in rod is 64 kN, of a 1 in rod 114 kN.
    expect(found.rods.diameter).toBeCloseTo(25.4, 6)
    expect(found.verdict).toBe('holds')
    expect(found.checks.map(({ title }) => title)).toEqual(
      expect.arrayContaining(['Uplift on each anchor rod', 'Fillet weld in uplift']),
    )
    expect(failing({ ...input, rods: { diameter: 19.05 } })).toEqual(['Uplift on each anchor rod'])
  })

  it('says what is not covered', () => {
    expect(designBase(baseInput('W10X49')).notes[0]).toContain('breakout, pull-out and shear')
  })
})

describe('what is given is checked as it is, and fails in words', () => {
  it.each<[string, Partial<BaseInput>, string]>([
    ['too thin', { plate: { thickness: 10 } }, 'Thickness of the base plate under bearing'],
    [
      'too small to bear',
      { plate: { length: 265, width: 265 }, concrete: { strength: 10 } },
      'Bearing on concrete',
    ],
    ['shorter than the shaft', { plate: { length: 200 } }, 'Length of the plate for the shaft'],
    ['narrower than the shaft', { plate: { width: 200 } }, 'Width of the plate for the shaft'],
    [
      'larger than its pier',
      { plate: { length: 600 }, concrete: { strength: 28, pier: { length: 500, width: 500 } } },
      'Length of the pier for the plate',
    ],
    ['without room for its rods', { plate: { length: 260, width: 100 } }, 'Room for the anchor rods'],
    ['on three rods', { rods: { count: 3 } }, 'Number of anchor rods'],
    ['on two rods', { rods: { count: 2 } }, 'Lines of anchor rods each way'],
  ])('%s', (_name, given, title) => {
    const input = baseInput('W10X49', { required: { compression: 1_500_000, uplift: 0 }, ...given })
    const found = designBase(input)
    expect(found.verdict).toBe('fails')
    expect(failing(input)).toContain(title)
    // Every figure goes over the wire.
    for (const { utilisation } of found.checks) expect(Number.isFinite(utilisation)).toBe(true)
    for (const value of Object.values(found.values)) expect(Number.isFinite(value)).toBe(true)
  })

  it('keeps what is given and finds the rest', () => {
    const { plate, rods } = designBase(
      baseInput('W10X49', { plate: { width: 380 }, rods: { diameter: 25.4, grade: 'F1554-55' } }),
    )
    expect(plate.width).toBe(380)
    expect(plate.length).toBeGreaterThan(254)
    expect(rods).toMatchObject({ count: 4, diameter: 25.4, grade: 'F1554-55' })
  })

  /* 29 CFR 1926.751: a post weighs 300 lb (1334 N) or less; 1926.755(a) speaks of columns. */
  it('lets a post stand on two rods, and a column not', () => {
    const input = baseInput('HSS3X3X1/8', {
      required: { compression: 20_000, uplift: 0 },
      rods: { count: 2 },
    })
    expect(designBase({ ...input, weight: 1300 }).verdict).toBe('holds')
    expect(designBase({ ...input, weight: 1400 }).verdict).toBe('fails')
    expect(designBase(input).verdict).toBe('fails')
  })
})

describe('what cannot be taken is refused by its field', () => {
  it.each<[string, Partial<BaseInput>]>([
    ['required', { required: { compression: 0, uplift: 0 } }],
    ['required.compression', { required: { compression: NaN, uplift: 0 } }],
    ['required.uplift', { required: { compression: 1, uplift: -1 } }],
    ['concrete.strength', { concrete: { strength: 0 } }],
    ['concrete.pier.width', { concrete: { strength: 28, pier: { length: 500, width: 0 } } }],
    ['plate.thickness', { plate: { thickness: -5 } }],
    ['plate.yield', { plate: { yield: 0 } }],
    ['rods.count', { rods: { count: 2.5 } }],
    ['rods.diameter', { rods: { diameter: 0 } }],
    ['rods.grade', { rods: { grade: 'F1554-40' } }],
  ])('%s', (path, given) => {
    expect(() => designBase(baseInput('W10X49', given))).toThrow(Refusal)
    try {
      designBase(baseInput('W10X49', given))
    } catch (error) {
      expect((error as Refusal).issues.map((issue) => issue.path)).toEqual([path])
    }
  })
})

describe('steps of the checks', () => {
  it('end in the figure that the check compares', () => {
    for (const method of ['LRFD', 'ASD'] as const) {
      const input = baseInput('W12X65', { method, required: { compression: 900_000, uplift: 90_000 } })
      for (const { title, steps, demand, capacity } of designBase(input).checks) {
        const last = steps.at(-1)
        expect([demand, capacity], title).toContainEqual(expect.closeTo(last?.value ?? NaN, 6))
        expect(last?.substitution).not.toContain('{')
      }
    }
  })
})
