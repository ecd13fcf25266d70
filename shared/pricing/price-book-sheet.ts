import { exact } from './exact.ts'
import type { LinearMinutes, PriceBook } from './price-book.ts'
import { size } from './take-off.ts'

export interface SheetRow {
  name: string
  value: string
  unit: string
}
export interface SheetGroup {
  title: string
  rows: SheetRow[]
}

/** A price book to be read: every figure with its name and unit, in groups. */
export function priceBookSheet(book: PriceBook): SheetGroup[] {
  const { currency } = book
  return [
    { title: 'Bars', rows: book.bars.flatMap((bar) => barRows(bar, currency)) },
    { title: 'Plate and rods', rows: plateAndRods(book) },
    { title: 'Cutting', rows: cutting(book) },
    { title: 'Shop time', rows: shopTime(book) },
    { title: 'Finish, drawing and delivery', rows: finishAndDelivery(book) },
    { title: 'Selling', rows: selling(book) },
  ]
}

function barRows(
  { title, grades, pricePerKg, stockLengths }: PriceBook['bars'][number],
  currency: string,
): SheetRow[] {
  return [
    row(`${title}, ${grades.join(' or ')}`, pricePerKg, `${currency}/kg`),
    row(`${title}, stock lengths`, stockLengths.map(size).join(', '), 'mm'),
  ]
}

function plateAndRods({ plate, rods, currency }: PriceBook): SheetRow[] {
  const grade = rods.grades.join(' or ')
  return [
    row(`Plate, ${plate.grades.join(' or ')}`, plate.pricePerKg, `${currency}/kg`),
    row('Plate waste', percent(plate.waste), '%'),
    row('Plate thicknesses', plate.thicknesses.map(size).join(', '), 'mm'),
    ...rods.prices.map(({ diameter, each }) =>
      row(`Rod set ${grade}, ${size(diameter)} mm`, each, `${currency} each`),
    ),
  ]
}

function cutting({ cutting: rules, currency }: PriceBook): SheetRow[] {
  return [
    row('Kerf', size(rules.kerf), 'mm per piece'),
    row('End trim', size(rules.endTrim), 'mm per bar'),
    row('Reusable from', size(rules.reusableLength), 'mm'),
    row('Worth of a remnant', percent(rules.remnantWorth), '% of its price'),
    row('Scrap', rules.scrapPerKg, `${currency}/kg`),
  ]
}

function shopTime({ minutes, shopRatePerHour, currency }: PriceBook): SheetRow[] {
  const { fitting } = minutes
  return [
    row('Shop rate', shopRatePerHour, `${currency}/h`),
    row('Sawing', formula(minutes.sawing, 'A/1000'), 'min per cut, A in mm²'),
    row('Plate cutting', formula(minutes.plateCutting, 't'), 'min per m, t in mm'),
    row('Drilling', formula(minutes.drilling, 't'), 'min per hole, t in mm'),
    row('Welding', formula(minutes.welding, 'leg²'), 'min per m, leg in mm'),
    row('Fitting and handling', fitting.perPiece, 'min per piece'),
    row('Fitting and handling', fitting.perPlate, 'min per plate'),
    row('Fitting and handling', fitting.per100kg, 'min per 100 kg'),
  ]
}

function finishAndDelivery({ finish, drawingPerMark, delivery, currency }: PriceBook): SheetRow[] {
  const { prime, paint, galvanise } = finish.rates
  return [
    row('Blast and prime', prime.rate, `${currency}/${prime.per}`),
    row('Blast and paint', paint.rate, `${currency}/${paint.per}`),
    row('Galvanise', galvanise.rate, `${currency}/${galvanise.per}`),
    row('Finish, least charge', finish.minimumPerOrder, `${currency} per order`),
    row('Drawing and checking', drawingPerMark, `${currency} per mark`),
    row('Delivery', delivery.base, `${currency} per truck`),
    row('Delivery', delivery.perKm, `${currency} per km and truck`),
    row('Payload of a truck', String(delivery.payload), 'kg'),
    row('Longest piece of a truck', size(delivery.longestPiece), 'mm'),
  ]
}

function selling({ contingency, margin, floorMargin, deposit, holdsDays, currency }: PriceBook): SheetRow[] {
  return [
    row('Contingency', percent(contingency), '%'),
    row('Margin', percent(margin), '%'),
    row('Floor margin', percent(floorMargin), '%'),
    row('Deposit', percent(deposit.fraction), '% of the total'),
    row('Deposit, least', deposit.floor, currency),
    row('A quote holds for', String(holdsDays), 'days'),
  ]
}

function row(name: string, value: string, unit: string): SheetRow {
  return { name, value, unit }
}

function percent(fraction: string): string {
  return exact(fraction).times(100).toFixed()
}

function formula({ a, b }: LinearMinutes, x: string): string {
  return `${a} + ${b} · ${x}`
}
