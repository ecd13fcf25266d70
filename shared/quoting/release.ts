import { compare, moneyToDecimal, subtract, type Money } from '../pricing/money.ts'

/**
 * Why an order cannot be released; null when it can. No steel is ordered before the deposit is in, unless the company
 * has credit terms.
 */
export function releaseFault(deposit: { due: Money; paid: Money; creditTerms: boolean }): string | null {
  const { due, paid, creditTerms } = deposit
  if (creditTerms || compare(paid, due) >= 0) return null
  const missing = subtract(due, paid)
  return `${missing.currency} ${moneyToDecimal(missing)} of the deposit is not in`
}
