import { describe, expect, it } from 'vitest'
import { ksi } from '../../../shared/units/convert.ts'
import { figures } from '../../../shared/units/figures.ts'
import { fillTemplate, formatQuantity, makeStep, render } from '../../../shared/units/render.ts'

const plain = (text: string): string => text.replaceAll('\u00a0', ' ')

describe('a number as read', () => {
  it.each([
    [0, '0'],
    [-12.3456, '−12.35'],
    [0.99996, '1'],
    [999.96, '1 000'],
    [1234.6, '1 235'],
    [199_948, '199 948'],
    [9_999_999, '9 999 999'],
    [555_869_243_738, '5.559·10¹¹'],
    [0.000123, '1.23·10⁻⁴'],
    [Infinity, '∞'],
    [NaN, '–'],
  ])('%d is %s', (value, text) => {
    expect(plain(figures(value))).toBe(text)
  })
})

describe('a result', () => {
  it.each([
    [2_114_000, 'N', 'SI', '2 114 kN'],
    [2_114_000, 'N', 'US', '475.2 kip'],
    [135_582_000, 'N·mm', 'SI', '135.6 kN·m'],
    [135_581_795, 'N·mm', 'US', '100 kip·ft'],
    [344.738, 'MPa', 'US', '50 ksi'],
    [72.92, 'kg/m', 'US', '49 lb/ft'],
    [9290.304, 'mm²', 'US', '14.4 in²'],
    [0.591, '1', 'US', '0.591'],
  ] as const)('%d %s in %s is %s', (value, unit, system, text) => {
    expect(plain(formatQuantity(value, unit, system))).toBe(text)
  })
})

describe('a step', () => {
  const step = makeStep({
    symbol: 'Fe',
    expression: 'π²·E / (Lc/r)²',
    template: 'π² · {0} / ({1} / {2})²',
    terms: [
      { value: ksi(29_000), unit: 'MPa' },
      { value: 3000, unit: 'mm' },
      { value: 64.5, unit: 'mm' },
    ],
    value: 912.4,
    unit: 'MPa',
  })

  it('shows every term with its unit, in either system', () => {
    expect(plain(step.substitution)).toBe('π² · 199 948 MPa / (3 000 mm / 64.5 mm)²')
    expect(plain(render(step, 'US'))).toBe('π² · 29 000 ksi / (118.1 in / 2.539 in)²')
  })

  it('keeps moments of one expression in the same units as its lengths', () => {
    const terms = [{ value: 112_984_829, unit: 'N·mm' as const }]
    expect(plain(fillTemplate('{0}', terms, 'US'))).toBe('1 000 kip·in')
  })

  it('leaves a place without a term as it is', () => {
    expect(fillTemplate('{0} + {1}', [{ value: 1, unit: '1' }], 'SI')).toBe('1 + {1}')
  })
})
