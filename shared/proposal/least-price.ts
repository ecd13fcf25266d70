import type { LineSpec, PlateSpec } from '../pricing/line-spec.ts'
import { barPriceOf, rodPriceOf, type LinearMinutes, type PriceBook } from '../pricing/price-book.ts'
import type { Family, Section } from '../sections/section.ts'
import type { LineAsked } from './line-asked.ts'
import type { PriceTerms } from './price-terms.ts'

/*
 * Lower bounds of what a line costs delivered, in units of currency and in plain numbers: every term stands in the price
 * with at least this much. What is left out is kerf, trim and the last bar of a nest, and rounding.
 */

/** kg/mm³. */
const DENSITY = 7850e-9
/** Both plates together are never thicker, mm: what the shaft loses to them at the most. */
const THICKEST_PLATES = 150
/** A cap plate is never thinner, nor a fillet smaller, mm. */
const THINNEST_CAP = 12
const SMALLEST_LEG = 3

/** What a piece's cost comes to in the price of the line, delivered. */
function seller({ book, delivery }: PriceTerms, quantity: number): (piece: number) => number {
  const carried = delivery ? Number(book.delivery.base) + Number(book.delivery.perKm) * delivery.km : 0
  const fixed = Number(book.drawingPerMark) + carried
  const factor = (1 + Number(book.contingency)) / (1 - Number(book.margin))
  return (piece) => (piece * quantity + fixed) * factor
}

/** Above this many pieces the last bar is taken as shared: its waste no longer tells. */
const FEW = 40

/**
 * Metres of bar that so many pieces of a length, mm, cost at the least: over every stock length and every number of
 * pieces from a bar, the bar less the worth of what is left, without kerf and trim. `scrap`: worth of scrap as a share.
 */
function leastBars(
  stockLengths: readonly number[],
  cutting: PriceBook['cutting'],
  length: number,
  quantity: number,
  scrap: number,
): number {
  const worth = Math.max(Number(cutting.remnantWorth), scrap)
  // What a bar comes to from which so many pieces are cut, at the least.
  const bars: number[] = []
  for (const bar of stockLengths) {
    for (let pieces = 1; pieces * length <= bar; pieces += 1) {
      const left = bar - pieces * length
      const net = bar - left * (left >= cutting.reusableLength ? worth : scrap)
      bars[pieces] = Math.min(bars[pieces] ?? Infinity, net)
    }
  }
  // Longer than every bar: it has no price, and any bound will do.
  if (bars.length === 0) return (length * quantity) / 1000
  const each = bars.reduce((least, net, pieces) => Math.min(least, net / pieces), Infinity)
  if (quantity > FEW) return (each * quantity) / 1000
  const total = [0]
  for (let count = 1; count <= quantity; count += 1) {
    let least = Infinity
    for (let pieces = 1; pieces < bars.length && pieces <= count; pieces += 1) {
      least = Math.min(least, (bars[pieces] ?? Infinity) + (total[count - pieces] ?? Infinity))
    }
    total[count] = least
  }
  return (total[quantity] ?? 0) / 1000
}

/** What the shafts of a line cost for each kg/m of theirs: price and bars of the family. */
function shaftRate(book: PriceBook, family: Family, length: number, quantity: number): number {
  const bar = barPriceOf(book, family)
  if (!bar || length <= 0) return 0
  const price = Number(bar.pricePerKg)
  const scrap = Number(book.cutting.scrapPerKg) / price
  return price * leastBars(bar.stockLengths, book.cutting, length, quantity, scrap)
}

function linear({ a, b }: LinearMinutes, x: number): number {
  return Number(a) + Number(b) * x
}

/** A bound for any shape, from its table alone: plates no larger than the shape and as thin as there are. */
export function leastByShape(terms: PriceTerms, asked: LineAsked): (section: Section) => number {
  const { book } = terms
  const sell = seller(terms, asked.quantity)
  const perMinute = Number(book.shopRatePerHour) / 60
  const length = Math.max(0, (asked.height ?? 0) - THICKEST_PLATES) / 1000
  const plates: number[] = []
  if (asked.base.plate) plates.push(book.plate.thicknesses[0] ?? 0)
  if (asked.cap.plate) plates.push(THINNEST_CAP)
  const { fitting, sawing, welding, plateCutting } = book.minutes
  const plateKg = Number(book.plate.pricePerKg) * (1 + Number(book.plate.waste))
  const finish = asked.finish === 'none' ? undefined : book.finish.rates[asked.finish]
  const finishKg = finish?.per === 'kg' ? Number(finish.rate) : 0
  const finishArea = finish?.per === 'm²' ? Number(finish.rate) : 0
  const byMass = length * (finishKg + (Number(fitting.per100kg) / 100) * perMinute)
  const byPerimeter =
    (length * finishArea + plates.length * linear(welding, SMALLEST_LEG ** 2) * perMinute) / 1000
  const bySawn = (Number(sawing.b) / 1000) * perMinute
  const byPlan = plates.reduce((sum, t) => sum + t * DENSITY * plateKg + (2 * finishArea) / 1e6, 0)
  const byEdge = plates.reduce((sum, t) => sum + (2 / 1000) * linear(plateCutting, t) * perMinute, 0)
  const rods = asked.base.plate && asked.base.rods ? 4 * Number(book.rods.prices[0]?.each ?? 0) : 0
  const each =
    (Number(sawing.a) + Number(fitting.perPiece) + plates.length * Number(fitting.perPlate)) * perMinute +
    rods
  const rates = new Map<Family, number>()
  const rateOf = (family: Family) => {
    const known = rates.get(family)
    if (known !== undefined) return known
    const rate = shaftRate(book, family, length * 1000, asked.quantity) / asked.quantity
    rates.set(family, rate)
    return rate
  }
  return ({ family, mass, perimeter, area, depth, width }) =>
    sell(
      mass * (rateOf(family) + byMass) +
        perimeter * byPerimeter +
        area * bySawn +
        depth * width * byPlan +
        (depth + width) * byEdge +
        each,
    )
}

/** With the plates, rods and welds that it has: all but kerf, trim and the last bar. */
export function leastByWork(terms: PriceTerms, spec: LineSpec, section: Section): number {
  const { book } = terms
  const plates = [spec.base, spec.cap].filter((plate) => plate !== null)
  const length = (spec.height - plates.reduce((sum, { thickness }) => sum + thickness, 0)) / 1000
  const plateMass = plates.reduce(
    (sum, plate) => sum + plate.length * plate.width * plate.thickness * DENSITY,
    0,
  )
  const mass = length * section.mass + plateMass
  const material =
    (section.mass * shaftRate(book, section.family, length * 1000, spec.quantity)) / spec.quantity +
    plateMass * (1 + Number(book.plate.waste)) * Number(book.plate.pricePerKg) +
    (spec.rods ? spec.rods.count * Number(rodPriceOf(book, spec.rods.diameter)?.each ?? 0) : 0)
  const labour = (minutesOf(book, spec, section, plates, mass) / 60) * Number(book.shopRatePerHour)
  const finish = Math.max(finishOf(book, spec, section, plates, length, mass), leastFinish(book, spec))
  const piece = material + labour + finish
  return seller(terms, spec.quantity)(piece)
}

/** The order's least charge for finishing, for each piece. */
function leastFinish(
  { finish }: PriceBook,
  { finish: asked, quantity }: Pick<LineSpec, 'finish' | 'quantity'>,
): number {
  return asked === 'none' ? 0 : Number(finish.minimumPerOrder) / quantity
}

function minutesOf(
  { minutes }: PriceBook,
  spec: LineSpec,
  section: Section,
  plates: readonly PlateSpec[],
  mass: number,
): number {
  const { perPiece, perPlate, per100kg } = minutes.fitting
  let sum = linear(minutes.sawing, section.area / 1000) + Number(perPiece) + (Number(per100kg) * mass) / 100
  for (const { length, width, thickness, holes } of plates) {
    sum += ((2 * (length + width)) / 1000) * linear(minutes.plateCutting, thickness)
    sum += holes.count * linear(minutes.drilling, thickness) + Number(perPlate)
  }
  for (const { leg, length } of spec.welds) sum += (length / 1000) * linear(minutes.welding, leg ** 2)
  return sum
}

function finishOf(
  { finish }: PriceBook,
  spec: LineSpec,
  section: Section,
  plates: readonly PlateSpec[],
  length: number,
  mass: number,
): number {
  if (spec.finish === 'none') return 0
  const { per, rate } = finish.rates[spec.finish]
  if (per === 'kg') return Number(rate) * mass
  const faces = plates.reduce(
    (sum, plate) => sum + 2 * plate.length * plate.width + 2 * (plate.length + plate.width) * plate.thickness,
    0,
  )
  return Number(rate) * ((section.perimeter / 1000) * length + faces / 1e6)
}
