import { Refusal, type Issue } from '../units/refusal.ts'
import { exact, type Exact } from './exact.ts'
import type { Override } from './line-spec.ts'
import { barPriceOf, rodPriceOf, type PriceBook } from './price-book.ts'
import type { LineToPrice } from './priced-quote.ts'
import { size, takeOff } from './take-off.ts'

export interface Terms {
  delivery: { km: number } | null
  tax: { rate: string; exempt: boolean }
  discount: string
}

/** Refuses what has no price, naming every field that is wrong and what would be right. */
export function validatePricing(book: PriceBook, lines: readonly LineToPrice[], terms: Terms): void {
  const issues: Issue[] = []
  const say = (path: string, message: string) => issues.push({ path, message })
  if (lines.length === 0) say('lines', 'at least one line')
  lines.forEach((line, index) => {
    checkLine(book, line, (path, message) => say(`lines.${index}.${path}`, message))
  })
  const { delivery, tax, discount } = terms
  if (delivery && !(delivery.km >= 0 && delivery.km <= 5000)) say('delivery.km', 'from 0 to 5000 km')
  if (!within(tax.rate, 0, 0.5)) say('tax.rate', 'a fraction from 0 to 0.5, such as 0.0725')
  if (!within(discount, 0, 0.5)) say('discount', 'a fraction from 0 to 0.5, such as 0.05')
  if (issues.length > 0) throw new Refusal(issues)
}

function checkLine(
  book: PriceBook,
  { spec, section }: LineToPrice,
  say: (path: string, message: string) => void,
): void {
  if (!Number.isInteger(spec.quantity) || spec.quantity < 1) say('quantity', 'a whole number of at least 1')
  if (!barPriceOf(book, section.family)) {
    const sold = book.bars.map(({ title }) => title).join(', ')
    say('section', `${section.designation} is not among what the shop buys: ${sold}`)
  }
  const numbers = [
    spec.height,
    ...[spec.base, spec.cap].flatMap((p) => (p ? [p.length, p.width, p.thickness] : [])),
  ]
  if (!numbers.every((value) => Number.isFinite(value) && value > 0)) {
    say('height', 'height and plates are lengths above 0 mm')
  } else if (takeOff(section, spec).shaftLength.lte(0)) {
    say('height', 'more than its plates are thick')
  }
  if (spec.rods && !rodPriceOf(book, spec.rods.diameter)) {
    const largest = book.rods.prices.at(-1)?.diameter ?? 0
    say('rods.diameter', `at most ${size(largest)} mm, the largest rod of the price book`)
  }
  spec.extras.forEach(({ unitCost, quantity }, index) => {
    if (!within(unitCost, 0, 1e9)) say(`extras.${index}.unitCost`, 'an amount of at least 0, such as 12.50')
    if (!(quantity > 0)) say(`extras.${index}.quantity`, 'more than 0')
  })
  spec.overrides.forEach((override, index) => {
    const wrong = overrideFault(override, spec.overrides.slice(0, index))
    if (wrong) say(`overrides.${index}.${wrong.field}`, wrong.message)
  })
}

function overrideFault(
  { item, value, reason }: Override,
  earlier: readonly Override[],
): { field: string; message: string } | undefined {
  if (earlier.some((one) => one.item === item)) return { field: 'item', message: `${item} is set twice` }
  if (reason.trim() === '') return { field: 'reason', message: 'say why it is set by hand' }
  if (item === 'margin' && !within(value, 0, 0.9))
    return { field: 'value', message: 'a fraction from 0 to 0.9' }
  if (item === 'unitPrice' && !within(value, 0.01, 1e9)) return { field: 'value', message: 'a price above 0' }
  if (item.startsWith('minutes.') && !within(value, 0, 1e6)) {
    return { field: 'value', message: 'minutes for the whole line, from 0 to 1000000' }
  }
  return undefined
}

function within(value: string, least: number, most: number): boolean {
  const parsed = parse(value)
  return parsed !== undefined && parsed.gte(least) && parsed.lte(most)
}

function parse(value: string): Exact | undefined {
  return /^-?\d+(\.\d+)?$/.test(value) ? exact(value) : undefined
}
