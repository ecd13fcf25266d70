import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { exact, share, sum } from '../../../shared/pricing/exact.ts'
import {
  add,
  allocate,
  compare,
  money,
  moneyToDecimal,
  roundToMoney,
  subtract,
  times,
} from '../../../shared/pricing/money.ts'

const usd = (amount: number) => money(amount, 'USD')

describe('money', () => {
  it('is added, taken away and multiplied in minor units', () => {
    expect(add(usd(10), usd(20), usd(-5))).toEqual(usd(25))
    expect(subtract(usd(10), usd(20))).toEqual(usd(-10))
    expect(times(usd(159_184), 4)).toEqual(usd(636_736))
    expect(compare(usd(1), usd(2))).toBe(-1)
    expect(moneyToDecimal(usd(159_184))).toBe('1591.84')
    expect(moneyToDecimal(money(500, 'JPY'))).toBe('500')
  })

  it('of two currencies is never mixed', () => {
    expect(() => add(usd(1), money(1, 'EUR'))).toThrow()
    expect(() => compare(usd(1), money(1, 'EUR'))).toThrow()
    expect(() => money(1, 'XXX')).toThrow('currency: XXX is not kept here')
  })

  it('that no whole number of minor units can hold is refused', () => {
    expect(() => usd(0.5)).toThrow('amount')
    expect(() => usd(2 ** 53)).toThrow('amount')
    expect(() => times(usd(2 ** 52), 4)).toThrow('amount')
    expect(() => times(usd(1), 1.5)).toThrow('quantity')
  })

  it.each([
    ['1.004999', 100],
    ['1.005', 101],
    ['1.0149999', 101],
    ['0.005', 1],
    ['669.496890', 66_950],
  ])('%s is rounded half up to %d', (value, amount) => {
    expect(roundToMoney(exact(value), 'USD')).toEqual(usd(amount))
  })
})

describe('allocation', () => {
  it('gives what is left over in single cents from the first part on', () => {
    expect(allocate(usd(100), [1, 1, 1]).map(({ amount }) => amount)).toEqual([34, 33, 33])
    expect(allocate(usd(5), [0, 0]).map(({ amount }) => amount)).toEqual([3, 2])
    expect(allocate(usd(5), [])).toEqual([])
    expect(() => allocate(usd(5), [-1, 2])).toThrow('weights')
  })

  it('keeps every cent, and gives nobody a cent more than their share rounded up', () => {
    const weights = fc.array(fc.integer({ min: 0, max: 10_000_000 }), { minLength: 1, maxLength: 40 })
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1_000_000_000 }), weights, (amount, parts) => {
        const given = allocate(usd(amount), parts)
        expect(given.reduce((all, part) => all + part.amount, 0)).toBe(amount)
        const total = parts.reduce((all, weight) => all + weight, 0)
        if (total === 0) return
        given.forEach((part, index) => {
          expect(Math.abs(part.amount - (amount * (parts[index] ?? 0)) / total)).toBeLessThanOrEqual(1 + 1e-6)
        })
      }),
    )
  })

  it('of an exact cost adds up to its last digit', () => {
    const weights = fc.array(fc.integer({ min: 0, max: 30_000 }), { minLength: 1, maxLength: 20 })
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1e12 }), weights, (millionths, parts) => {
        const total = exact(millionths).div(1e6)
        const given = share(
          total,
          parts.map((weight) => exact(weight)),
        )
        expect(sum(given).eq(total)).toBe(true)
        expect(given.every((part) => part.gte(-1e-9))).toBe(true)
      }),
    )
  })
})
