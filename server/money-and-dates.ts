import type { MoneyDto } from '../shared/contracts/common.ts'

const formats = new Map<string, Intl.NumberFormat>()

/** "USD 1,591.84": the currency by its code, which no reader takes for another dollar. */
export function moneyText({ amount, currency }: MoneyDto): string {
  let format = formats.get(currency)
  if (!format) {
    format = new Intl.NumberFormat('en-US', { style: 'currency', currency, currencyDisplay: 'code' })
    formats.set(currency, format)
  }
  const digits = format.resolvedOptions().maximumFractionDigits ?? 2
  return format.format(amount / 10 ** digits)
}

const dates = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })

/** "1 December 2026". */
export function dateText(instant: string): string {
  return dates.format(new Date(instant))
}
