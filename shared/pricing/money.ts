import {
  add as addDinero,
  allocate as allocateDinero,
  CAD,
  CHF,
  compare as compareDinero,
  dinero,
  DKK,
  EUR,
  GBP,
  JPY,
  multiply,
  NOK,
  PLN,
  SEK,
  subtract as subtractDinero,
  toDecimal,
  toSnapshot,
  USD,
  type Dinero,
  type DineroCurrency,
} from 'dinero.js'
import { refuse } from '../units/refusal.ts'
import { exact, type Exact } from './exact.ts'

/** Integer minor units of a currency: 159184 of USD is 1,591.84. */
export interface Money {
  amount: number
  currency: string
}

/** Currencies that a price book may be kept in, with their minor units. */
const CURRENCIES: Readonly<Record<string, DineroCurrency<number>>> = {
  CAD,
  CHF,
  DKK,
  EUR,
  GBP,
  JPY,
  NOK,
  PLN,
  SEK,
  USD,
}

function currencyOf(code: string): DineroCurrency<number> {
  const currency = CURRENCIES[code]
  return (
    currency ?? refuse('currency', `${code} is not kept here; one of ${Object.keys(CURRENCIES).join(', ')}`)
  )
}

function toDinero({ amount, currency }: Money): Dinero<number> {
  if (!Number.isSafeInteger(amount)) refuse('amount', 'money is a whole number of minor units within 2^53')
  return dinero({ amount, currency: currencyOf(currency) })
}

function fromDinero(value: Dinero<number>): Money {
  const { amount, currency } = toSnapshot(value)
  return money(amount, currency.code)
}

export function money(amount: number, currency: string): Money {
  currencyOf(currency)
  if (!Number.isSafeInteger(amount)) refuse('amount', 'money is a whole number of minor units within 2^53')
  // −0 would be another value than 0 to a test and to JSON's reader.
  return { amount: amount === 0 ? 0 : amount, currency }
}

/** Sum of at least one amount, all of one currency. */
export function add(first: Money, ...others: Money[]): Money {
  return fromDinero(others.reduce((total, other) => addDinero(total, toDinero(other)), toDinero(first)))
}

export function subtract(from: Money, what: Money): Money {
  return fromDinero(subtractDinero(toDinero(from), toDinero(what)))
}

/** A whole number of times. */
export function times(value: Money, count: number): Money {
  if (!Number.isSafeInteger(count)) refuse('quantity', 'a whole number of pieces')
  return fromDinero(multiply(toDinero(value), count))
}

/** −1, 0 or 1. */
export function compare(a: Money, b: Money): -1 | 0 | 1 {
  return compareDinero(toDinero(a), toDinero(b))
}

/** Minor units of one whole unit: 100 for USD, 1 for JPY. */
export function minorUnits(currency: string): number {
  return 10 ** currencyOf(currency).exponent
}

/** Rounds an exact amount of currency units to minor units, half up (a half goes away from zero). */
export function roundToMoney(value: Exact, currency: string): Money {
  return money(value.times(minorUnits(currency)).toDecimalPlaces(0).toNumber(), currency)
}

/** The amount in currency units, exact. */
export function moneyToExact(value: Money): Exact {
  return exact(value.amount).div(minorUnits(value.currency))
}

/** "1591.84". */
export function moneyToDecimal(value: Money): string {
  return toDecimal(toDinero(value))
}

/**
 * Splits an amount by whole weights (the minor units of each part, or 1 each) so that the parts add up to it: what
 * rounding leaves goes out by single minor units from the first part on. All weights zero: equal parts.
 */
export function allocate(value: Money, weights: readonly number[]): Money[] {
  if (weights.length === 0) return []
  for (const weight of weights) {
    if (!Number.isSafeInteger(weight) || weight < 0) refuse('weights', 'whole numbers that are not negative')
  }
  const total = weights.reduce((all, weight) => all + weight, 0)
  const parts = total === 0 ? weights.map(() => 1) : [...weights]
  return allocateDinero(toDinero(value), parts).map(fromDinero)
}
