import { Decimal } from 'decimal.js'

/** Decimals of this desk: forty digits, so that a quotient in the middle of a price never shows in its cents. */
export const Exact = Decimal.clone({ precision: 40, rounding: Decimal.ROUND_HALF_UP })
export type Exact = Decimal

/** Digits behind the point that a cost keeps once it stands on a sheet. */
const PLACES = 12

export const ZERO = new Exact(0)

export function exact(value: string | number | Decimal): Exact {
  return new Exact(value)
}

/** A cost as it stands on the sheet. Sums are taken of these, so that what is shown adds up to the last digit. */
export function settled(value: Exact): Exact {
  return value.toDecimalPlaces(PLACES)
}

export function sum(values: readonly Exact[]): Exact {
  return values.reduce((total, value) => total.plus(value), ZERO)
}

/** Plain decimal text, never with an exponent, at most twelve places. */
export function decimalText(value: Exact): string {
  return settled(value).toFixed()
}

/**
 * Shares `total` by `weights`; the last share takes what rounding leaves, so that the shares add up to the total.
 * All weights zero: the first takes all.
 */
export function share(total: Exact, weights: readonly Exact[]): Exact[] {
  const whole = sum(weights)
  let rest = total
  return weights.map((weight, index) => {
    if (index === weights.length - 1) return rest
    const part = whole.isZero() ? (index === 0 ? total : ZERO) : settled(total.times(weight).div(whole))
    rest = rest.minus(part)
    return part
  })
}
