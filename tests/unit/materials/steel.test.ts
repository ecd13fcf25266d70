import { describe, expect, it } from 'vitest'
import { plateSteel, rodSteel } from '../../../shared/materials/plate-steels.ts'
import { defaultSteel, steelOf, steelsFor } from '../../../shared/materials/shape-steels.ts'
import { E_AISC, G_AISC } from '../../../shared/materials/steel.ts'

describe('steels of shapes', () => {
  it.each([
    ['W', 'A992', 50, 65],
    ['HSS_SQUARE', 'A500-C', 50, 62],
    ['HSS_RECT', 'A500-C', 50, 62],
    ['HSS_ROUND', 'A500-C', 50, 62],
    ['PIPE', 'A53-B', 35, 60],
  ] as const)('%s is %s unless asked otherwise: %d and %d ksi', (family, name, Fy, Fu) => {
    expect(defaultSteel(family)).toMatchObject({ name, FyKsi: Fy, FuKsi: Fu })
    expect(steelOf(undefined, family).name).toBe(name)
  })

  it('are stated in MPa too: 50 ksi is 344.7 MPa', () => {
    expect(steelOf('A992', 'W').Fy).toBeCloseTo(344.738, 3)
  })

  it('round A500 is 46 ksi where the older Manual is set, rectangular stays', () => {
    expect(steelOf('A500-C', 'HSS_ROUND', { olderRoundTube: true }).FyKsi).toBe(46)
    expect(steelOf('A500-C', 'HSS_RECT', { olderRoundTube: true }).FyKsi).toBe(50)
  })

  it.each(['a572-50', 'ASTM A572 Grade 50', 'A572 Gr. 50', 'A572 50'])('%j is A572-50', (name) => {
    expect(steelOf(name, 'W').name).toBe('A572-50')
  })

  it('may be stated by strengths', () => {
    expect(steelOf({ yield: 345, ultimate: 450 }, 'W')).toMatchObject({ Fy: 345, Fu: 450 })
    expect(() => steelOf({ yield: 450, ultimate: 345 }, 'W')).toThrow('grade.ultimate')
  })

  it('that a family is not made of are refused, with those that it is', () => {
    expect(() => steelOf('A53-B', 'W')).toThrow('grade: this shape is made of A992, A572-50, A36')
    expect(() => steelOf('putty', 'PIPE')).toThrow('grade: this shape is made of A53-B')
    expect(steelsFor('HEB')).toEqual([])
    expect(() => steelOf(undefined, 'HEB')).toThrow('grade: no steel is listed for this family yet')
  })
})

describe('plates and rods', () => {
  it('have the strengths of their standards', () => {
    expect(plateSteel('a36')).toMatchObject({ FyKsi: 36, FuKsi: 58 })
    expect(rodSteel('F1554-36')).toMatchObject({ FyKsi: 36, FuKsi: 58 })
    expect(rodSteel('F1554-55')).toMatchObject({ FyKsi: 55, FuKsi: 75 })
    expect(rodSteel('F1554-105')).toMatchObject({ FyKsi: 105, FuKsi: 125 })
    expect(rodSteel('F1554-40')).toBeUndefined()
  })
})

/* ANSI/AISC 360-22, symbols: E = 29 000 ksi (200 000 MPa rounded), G = 11 200 ksi (77 200 MPa rounded). */
describe('moduli', () => {
  it('are those of AISC 360', () => {
    expect(E_AISC).toBeCloseTo(199_948, 0)
    expect(G_AISC).toBeCloseTo(77_221, 0)
  })
})
