import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { MM_PER_INCH, N_PER_KIP } from '../../../shared/units/convert.ts'
import { parseForce } from '../../../shared/units/parse-force.ts'
import { parseLength } from '../../../shared/units/parse-length.ts'

function lengthOf(text: string, system: 'SI' | 'US', bare?: 'm' | 'ft'): number | string {
  const parsed = parseLength(text, system, bare)
  return parsed.ok ? parsed.value : parsed.message
}

describe('a typed length', () => {
  it.each([
    [`12'-6 1/2"`, 150.5],
    [`12' 6.5"`, 150.5],
    [`12'-6-1/2"`, 150.5],
    ['12′-6 1/2″', 150.5],
    [`12'6`, 150],
    ['12 ft 6 in', 150],
    [`12.5'`, 150],
    [`12' 1/2"`, 144.5],
    [`5'-0 1/2"`, 60.5],
    ['6 1/2"', 6.5],
    ['3/4"', 0.75],
    ['150.5 in', 150.5],
    ['150.5', 150.5],
    [`-3"`, -3],
  ])('%s is %d in', (text, inches) => {
    expect(lengthOf(text, 'US')).toBeCloseTo(inches * MM_PER_INCH, 9)
  })

  it.each([
    ['4200', 4200],
    ['4200 mm', 4200],
    ['4 200 mm', 4200],
    ['4.2 m', 4200],
    ['4,2 m', 4200],
    ['420cm', 4200],
    ['−50', -50],
    [`1'`, 304.8],
  ])('%s is %d mm', (text, mm) => {
    expect(lengthOf(text, 'SI')).toBeCloseTo(mm, 9)
  })

  it('a bare number is in the unit that the field says', () => {
    expect(lengthOf('4.2', 'SI', 'm')).toBeCloseTo(4200, 9)
    expect(lengthOf('12.5', 'US', 'ft')).toBeCloseTo(3810, 9)
  })

  it.each([
    ['', 'a length is written like'],
    ['tall', 'a length is written like'],
    ['12 6"', 'a length is written like'],
    ['1e3', 'a length is written like'],
    ['4,200 mm', 'two readings; write 4200 or 4.200'],
    [`12'-14"`, 'inches beside feet are less than 12'],
    ['61/2"', 'less than one'],
    ['1/0"', 'less than one'],
    ['4 2 m', 'is not a number'],
  ])('%j is refused with a reason', (text, reason) => {
    expect(lengthOf(text, 'US')).toContain(reason)
  })

  it('feet, inches and sixteenths come back as typed', () => {
    fc.assert(
      fc.property(fc.nat(98), fc.nat(11), fc.nat(15), (feet, inches, sixteenths) => {
        const text = `${feet}'-${inches} ${sixteenths}/16"`
        expect(lengthOf(text, 'US')).toBeCloseTo((feet * 12 + inches + sixteenths / 16) * MM_PER_INCH, 6)
      }),
    )
  })
})

function forceOf(text: string, system: 'SI' | 'US'): number | string {
  const parsed = parseForce(text, system)
  return parsed.ok ? parsed.value : parsed.message
}

describe('a typed force', () => {
  it.each([
    ['1250', 'SI', 1_250_000],
    ['1 250 kN', 'US', 1_250_000],
    ['1.25 MN', 'SI', 1_250_000],
    ['-40', 'SI', -40_000],
    ['280', 'US', 280 * N_PER_KIP],
    ['280 kips', 'SI', 280 * N_PER_KIP],
    ['12k', 'US', 12 * N_PER_KIP],
    ['2000 lb', 'US', 2 * N_PER_KIP],
  ] as const)('%s in %s is %d N', (text, system, newtons) => {
    expect(forceOf(text, system)).toBeCloseTo(newtons, 6)
  })

  it.each([
    ['', 'a force is written like'],
    ['5 tons', 'a force is written like'],
    ['1,250', 'two readings'],
    ['heavy', 'a force is written like'],
  ])('%j is refused with a reason', (text, reason) => {
    expect(forceOf(text, 'SI')).toContain(reason)
  })
})
