import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { DEFAULT_PRICE_BOOK } from '../../../seeds/reference/price-book.ts'
import { basisStatements, CAUTIONS, EXCLUSIONS } from '../../../shared/quoting/cautions.ts'
import { capPlateFor, capWeldLeg, lineSpecOf, type ChosenLine } from '../../../shared/quoting/defaults.ts'
import type { Section } from '../../../shared/sections/section.ts'

function find(designation: string): Section {
  const section = catalogue.find(designation)
  if (!section) throw new Error(`${designation} is not in the catalogue`)
  return section
}

const base = {
  plate: { length: 380, width: 380, thickness: 25 },
  rods: { count: 4, diameter: 19.05, grade: 'F1554-36' },
  holes: { count: 4, diameter: 33.3 },
  welds: { leg: 8, length: 1499.4 },
}
const chosen: ChosenLine = {
  mark: 'A1',
  quantity: 4,
  section: find('W10X49'),
  grade: 'A992',
  height: 5400,
  finish: 'prime',
  base,
  withRods: true,
  withCap: true,
}

describe('how a chosen shape is made', () => {
  it('takes plate, rods and weld from the base design and a cap of the shop', () => {
    const spec = lineSpecOf(chosen)
    expect(spec).toMatchObject({ mark: 'A1', quantity: 4, section: 'W10X49', grade: 'A992', height: 5400 })
    expect(spec.base).toEqual({ ...base.plate, holes: base.holes })
    expect(spec.rods).toEqual(base.rods)
    // Common practice of the trade, as in the shop's worked example: 300 × 300 × 16 with four holes.
    expect(spec.cap).toMatchObject({ length: 300, width: 300, thickness: 16, holes: { count: 4 } })
    expect(spec.welds).toEqual([
      { where: 'base', leg: 8, length: 1500 },
      { where: 'cap', leg: 6, length: Math.ceil(chosen.section.perimeter) },
    ])
  })

  it('leaves out what is not wanted', () => {
    const bare = lineSpecOf({ ...chosen, base: null, withCap: false })
    expect(bare).toMatchObject({ base: null, cap: null, rods: null, welds: [] })
    expect(lineSpecOf({ ...chosen, withRods: false }).rods).toBeNull()
  })

  it('caps small hollow shapes with two holes, as in the worked example', () => {
    expect(capPlateFor(find('HSS6X6X3/8'))).toMatchObject({
      length: 200,
      width: 200,
      thickness: 12,
      holes: { count: 2 },
    })
  })

  // ANSI/AISC 360-22 Table J2.4: thinner part to 6, 13, 19 mm and above has legs of 3, 5, 6 and 8 mm.
  it.each([
    ['W8X10', 3, 5.2],
    ['W8X31', 5, 11.0],
    ['W10X49', 6, 14.2],
    ['W14X90', 6, 18.0],
    ['W14X109', 8, 21.8],
  ])('%s has a cap fillet of %d mm: flange %d mm', (name, leg, flange) => {
    const section = find(name)
    expect(section.shape === 'I' && section.tf).toBeCloseTo(flange, 0)
    expect(capWeldLeg(section, { ...capPlateFor(section), thickness: 40 })).toBe(leg)
  })

  it('uses plates that the shop stocks and that reach past the shape, for the whole catalogue', () => {
    for (const section of catalogue.sections) {
      const cap = capPlateFor(section)
      expect(DEFAULT_PRICE_BOOK.plate.thicknesses).toContain(cap.thickness)
      expect(cap.length - section.depth).toBeGreaterThanOrEqual(40)
      expect(cap.length - section.depth).toBeLessThan(50)
      expect(cap.width - section.width).toBeGreaterThanOrEqual(40)
      // Room for the fillet beside the shape.
      expect((cap.width - section.width) / 2).toBeGreaterThan(capWeldLeg(section, cap))
    }
  })
})

describe('statements', () => {
  const facts = { standards: ['AISC 360-22, LRFD'], deliveryKm: 84.6, holdsDays: 21, taxExempt: false }

  it('cover what the trade asks to be said', () => {
    const said = CAUTIONS.map(({ text }) => text).join(' ')
    for (const word of [
      'engineer of record',
      'authority having jurisdiction',
      'released from the crane',
      'seals',
    ]) {
      expect(said).toContain(word)
    }
    expect(said).toContain('breakout, pull-out and shear at the anchor rods are not covered')
    const keys = [...CAUTIONS, ...EXCLUSIONS].map(({ key }) => key)
    expect(keys.length).toBeGreaterThan(10)
  })

  it('name what this quote rests on', () => {
    const basis = basisStatements(facts).join(' ')
    for (const word of ['AISC 360-22, LRFD', '85 km', '21 days', 'deposit', 'finish', 'rigid']) {
      expect(basis).toContain(word)
    }
    expect(basisStatements({ ...facts, deliveryKm: null }).join(' ')).toContain('Collected')
    expect(basisStatements({ ...facts, taxExempt: true }).join(' ')).toContain('certificate')
  })
})
