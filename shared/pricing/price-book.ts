import type { Family } from '../sections/section.ts'
import type { Finish } from './line-spec.ts'

/** Exact decimal as text, such as "1.85". */
export type DecimalText = string

/** Bars that the shop buys for some families: one price by mass, stock lengths in mm. */
export interface BarPrice {
  title: string
  families: readonly Family[]
  /** Grades that the price is for; another grade of the same shape is priced alike, with a warning. */
  grades: readonly string[]
  pricePerKg: DecimalText
  stockLengths: readonly number[]
}

/** Minutes of work as a + b·x; what x is stands with each. */
export interface LinearMinutes {
  a: DecimalText
  b: DecimalText
}

/**
 * Every number that makes a price. A book is never changed: a new one has the next version and a first day, and a
 * quote keeps the version that it was priced with.
 */
export interface PriceBook {
  version: number
  /** ISO day from which it is in force. */
  firstDay: string
  currency: string
  bars: readonly BarPrice[]
  plate: {
    grades: readonly string[]
    pricePerKg: DecimalText
    /** Fraction bought over what is used. */
    waste: DecimalText
    /** Thicknesses in stock, mm, ascending. */
    thicknesses: readonly number[]
  }
  rods: {
    grades: readonly string[]
    /** Price of a rod with nuts and washers by diameter, mm, ascending. */
    prices: readonly { diameter: number; each: DecimalText }[]
  }
  cutting: {
    /** mm lost with each piece, and once with each bar. */
    kerf: number
    endTrim: number
    /** A remnant from this length on (mm) is kept, at this fraction of its price; less is scrap. */
    reusableLength: number
    remnantWorth: DecimalText
    scrapPerKg: DecimalText
  }
  shopRatePerHour: DecimalText
  minutes: {
    /** Per cut: a set-up, b for each 1000 mm² of section. */
    sawing: LinearMinutes
    /** Per metre of edge: x is the thickness in mm. */
    plateCutting: LinearMinutes
    /** Per hole: x is the thickness in mm. */
    drilling: LinearMinutes
    /** Per metre of fillet: x is the square of the leg in mm². */
    welding: LinearMinutes
    fitting: { perPiece: DecimalText; perPlate: DecimalText; per100kg: DecimalText }
  }
  finish: {
    rates: Readonly<Record<Exclude<Finish, 'none'>, { per: 'm²' | 'kg'; rate: DecimalText }>>
    /** Least charge for all finishing of one order. */
    minimumPerOrder: DecimalText
  }
  drawingPerMark: DecimalText
  delivery: {
    base: DecimalText
    perKm: DecimalText
    /** kg a truck carries; mm of the longest piece. */
    payload: number
    longestPiece: number
  }
  /** Fractions. */
  contingency: DecimalText
  margin: DecimalText
  floorMargin: DecimalText
  deposit: { fraction: DecimalText; floor: DecimalText }
  holdsDays: number
}

/** The bars that a shape is cut from; undefined when the shop does not buy the family. */
export function barPriceOf(book: PriceBook, family: Family): BarPrice | undefined {
  return book.bars.find(({ families }) => families.includes(family))
}

/** The rod of the book to price a diameter with: itself or the next larger; undefined above the largest. */
export function rodPriceOf(
  book: PriceBook,
  diameter: number,
): PriceBook['rods']['prices'][number] | undefined {
  // A tenth of a millimetre lets 19.05 and 19 be the same rod.
  return book.rods.prices.find((rod) => rod.diameter >= diameter - 0.1)
}
