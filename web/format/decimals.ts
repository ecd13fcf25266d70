/*
 * Exact decimals stay text all the way: what a person types is what the desk reckons with. A fraction is typed as a
 * percentage by moving its point, never by arithmetic in floating point.
 */
const DECIMAL = /^-?\d{1,12}(\.\d{1,12})?$/

/** "1 250,5"? No: digits and one point, as "1250.50". Spaces and an explicit minus sign are taken as meant. */
export function readDecimal(text: string): string | null {
  const plain = text.replaceAll(/[\s\u00a0]/g, '').replace('−', '-')
  return DECIMAL.test(plain) ? plain : null
}

/** "0.185" as "18.5". */
export function percentOf(fraction: string): string {
  return movePoint(fraction, 2)
}

/** "18.5" as "0.185". */
export function fractionOf(percent: string): string {
  return movePoint(percent, -2)
}

function movePoint(text: string, places: number): string {
  const negative = text.startsWith('-')
  const [whole = '0', part = ''] = text.replace('-', '').split('.')
  const digits = whole.padStart(whole.length + 2, '0') + part.padEnd(part.length + 2, '0')
  const at = whole.length + 2 + places
  const left = digits.slice(0, at).replace(/^0+(?=\d)/, '')
  const right = digits.slice(at).replace(/0+$/, '')
  const moved = right ? `${left}.${right}` : left
  return negative && moved !== '0' ? `-${moved}` : moved
}

/** A decimal as read: digits in groups, rounded to `places` at most; for the eye only. */
export function decimalFigures(text: string, places = 2): string {
  const format = new Intl.NumberFormat('en-US', { maximumFractionDigits: places })
  return format.format(Number(text)).replace('-', '−')
}

/** An amount of money that is still an exact decimal: "4,711.11". */
export function costFigures(text: string): string {
  const format = new Intl.NumberFormat('en-US', { minimumFractionDigits: 2, maximumFractionDigits: 2 })
  return format.format(Number(text)).replace('-', '−')
}
