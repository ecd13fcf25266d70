import type { MoneyDto } from '../../shared/contracts/common.ts'

const formats = new Map<string, Intl.NumberFormat>()

function formatFor(currency: string): Intl.NumberFormat {
  let format = formats.get(currency)
  if (!format) {
    format = new Intl.NumberFormat('en-US', { style: 'currency', currency, currencyDisplay: 'code' })
    formats.set(currency, format)
  }
  return format
}

/** The figures alone: "1,591.84"; the currency stands beside them. */
export function moneyFigures({ amount, currency }: MoneyDto): string {
  const format = formatFor(currency)
  const digits = format.resolvedOptions().maximumFractionDigits ?? 2
  return format
    .formatToParts(amount / 10 ** digits)
    .filter(({ type }) => type !== 'currency' && type !== 'literal')
    .map(({ value }) => (value === '-' ? '−' : value))
    .join('')
}

/** "USD 1,591.84": the currency by its code, which no reader takes for another dollar. */
export function moneyText(money: MoneyDto): string {
  return `${money.currency}\u00a0${moneyFigures(money)}`
}

/** In whole units of the currency, for drawing to scale; never for reckoning. */
export function moneyNumber({ amount, currency }: MoneyDto): number {
  return amount / 10 ** (formatFor(currency).resolvedOptions().maximumFractionDigits ?? 2)
}
