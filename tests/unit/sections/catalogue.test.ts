import { describe, expect, it } from 'vitest'
import { catalogue } from '../../../seeds/reference/catalogue.ts'
import { EU_FAMILIES, normaliseDesignation, US_FAMILIES } from '../../../shared/sections/catalogue.ts'

describe('looking a shape up', () => {
  it.each(['W10X49', 'w10x49', ' W 10 x 49 ', 'W10×49', 'W250X73', 'w250 x 73'])(
    '%j finds W10X49',
    (name) => {
      expect(catalogue.find(name)?.designation).toBe('W10X49')
    },
  )

  it('finds every shape by its own designation', () => {
    for (const section of catalogue.sections) {
      expect(catalogue.find(section.designation), section.designation).toBe(section)
    }
  })

  it('prefers a shape of that name to one whose metric name it is', () => {
    // Pipe20STD is NPS 20, and also the metric name of NPS 3/4.
    expect(catalogue.find('Pipe20STD')?.depth).toBeCloseTo(508, 6)
    expect(catalogue.find('Pipe3/4STD')?.designationSI).toBe('Pipe20STD')
  })

  it.each(['', 'W10', 'W10X49X2', 'constructor', 'HSS'])('%j is no shape', (name) => {
    expect(catalogue.find(name)).toBeUndefined()
  })

  it('has one shape to a designation', () => {
    const names = catalogue.sections.map((section) => normaliseDesignation(section.designation))
    expect(new Set(names).size).toBe(names.length)
  })
})

describe('searching', () => {
  it('takes a part of either name, within the families asked for', () => {
    const found = catalogue.search('w14x')
    expect(found.length).toBeGreaterThan(20)
    expect(found.every((section) => section.family === 'W')).toBe(true)
    expect(catalogue.search('200 x 200', ['HEB', 'SHS']).map((section) => section.family)).toContain('SHS')
    expect(catalogue.search('w10x', ['PIPE'])).toEqual([])
    expect(catalogue.search('', ['PIPE'])).toHaveLength(51)
  })
})

describe('families', () => {
  it('of both standards are all in the tables, and none is of both', () => {
    for (const family of [...US_FAMILIES, ...EU_FAMILIES]) expect(catalogue.families).toContain(family)
    expect(US_FAMILIES.filter((family) => EU_FAMILIES.includes(family))).toEqual([])
  })
})

describe('every shape', () => {
  it('has positive finite figures, its strong axis first and its deep side up', () => {
    for (const section of catalogue.sections) {
      for (const [name, value] of Object.entries(section)) {
        if (typeof value !== 'number' || (section.shape === 'round' && name === 'corner')) continue
        expect(Number.isFinite(value) && value > 0, `${section.designation} ${name}`).toBe(true)
      }
      expect(section.Ix, section.designation).toBeGreaterThanOrEqual(section.Iy)
    }
  })
})
