import { exact, settled, share, sum, ZERO, type Exact } from './exact.ts'
import { minorUnits } from './money.ts'
import type { Nest, NestInput, NestResult, NestStock } from './nesting.ts'
import { barPriceOf, type PriceBook } from './price-book.ts'
import type { LineToPrice, RackBar, SteelPlan } from './priced-quote.ts'
import { size, type PricedSection, type TakeOff } from './take-off.ts'

export interface LineWithTakeOff extends LineToPrice {
  piece: TakeOff
}

/** Lines cut from the same bars: one section and one grade. */
export interface SteelJob {
  section: PricedSection
  grade: string
  /** Places in the list of lines. */
  members: number[]
  pricePerKg: Exact
  /** What a bar costs, currency units, by its place in the stock. */
  barCosts: Exact[]
  input: NestInput
}

/** A line's part in its bars. */
export interface SteelShare {
  cost: Exact
  /** Trim cuts: one a bar, shared by cut length. */
  trimCuts: Exact
  basis: () => string
}

/** The cutting to be solved for a quote: one job for each section and grade, in the order of the lines. */
export function steelJobs(
  book: PriceBook,
  lines: readonly LineWithTakeOff[],
  rack: readonly RackBar[] = [],
): SteelJob[] {
  const groups = new Map<string, number[]>()
  lines.forEach(({ section, spec }, index) => {
    const key = `${section.designation} ${spec.grade}`
    groups.set(key, [...(groups.get(key) ?? []), index])
  })
  return [...groups.values()].flatMap((members) => {
    const first = lines[members[0] ?? 0]
    return first ? [steelJob(book, lines, members, first, rack)] : []
  })
}

function steelJob(
  book: PriceBook,
  lines: readonly LineWithTakeOff[],
  members: number[],
  { section, spec: { grade } }: LineWithTakeOff,
  rack: readonly RackBar[],
): SteelJob {
  const price = barPriceOf(book, section.family)
  const pricePerKg = exact(price?.pricePerKg ?? 0)
  const perMetre = pricePerKg.times(section.mass)
  const minor = minorUnits(book.currency)
  const stock: NestStock[] = []
  const barCosts: Exact[] = []
  for (const length of price?.stockLengths ?? []) {
    const cost = perMetre.times(length).div(1000)
    barCosts.push(cost)
    stock.push({ length, cost: cost.times(minor).toNumber(), available: null })
  }
  for (const { length, bookValue, count } of remnantsOf(rack, section.designation, grade)) {
    barCosts.push(exact(bookValue))
    stock.push({ length, cost: exact(bookValue).times(minor).toNumber(), available: count })
  }
  const { kerf, endTrim, reusableLength, remnantWorth, scrapPerKg } = book.cutting
  const pieces = members.flatMap((index) => {
    const line = lines[index]
    return line ? [{ length: line.piece.shaftLength.toNumber(), quantity: line.spec.quantity }] : []
  })
  const input: NestInput = {
    stock,
    pieces,
    kerf,
    endTrim,
    reusable: { from: reusableLength, worth: Number(remnantWorth) },
    scrapWorth: pricePerKg.isZero() ? 0 : exact(scrapPerKg).div(pricePerKg).toNumber(),
  }
  return { section, grade, members, pricePerKg, barCosts, input }
}

function remnantsOf(rack: readonly RackBar[], section: string, grade: string): RackBar[] {
  return rack.filter((bar) => bar.section === section && bar.grade === grade && bar.count > 0)
}

/**
 * What a plan costs, exactly: each bar at its price, less what is left of it: from the reusable length on at the
 * remnant's share of the bar's price by length, below it at scrap price by mass. Pieces that no bar takes are charged
 * by their mass, so that the sheet shows at least their steel.
 */
export function netCost(book: PriceBook, job: SteelJob, nest: NestResult): Exact {
  const { reusableLength, remnantWorth, scrapPerKg } = book.cutting
  const bars = nest.bars.map((bar) => {
    const cost = job.barCosts[bar.stock] ?? ZERO
    const length = job.input.stock[bar.stock]?.length ?? 1
    const worth =
      bar.left >= reusableLength
        ? cost.times(bar.left).div(length).times(remnantWorth)
        : exact(bar.left).div(1000).times(job.section.mass).times(scrapPerKg)
    return cost.minus(worth).times(bar.times)
  })
  const loose = nest.unplaced.map(({ length, quantity }) =>
    exact(length).div(1000).times(job.section.mass).times(job.pricePerKg).times(quantity),
  )
  return settled(sum([...bars, ...loose]))
}

/** Solves each job and shares its net cost and trim cuts over the lines by cut length. */
export function shareSteel(
  book: PriceBook,
  lines: readonly LineWithTakeOff[],
  jobs: readonly SteelJob[],
  nest: Nest,
): { shares: SteelShare[]; plans: SteelPlan[] } {
  const shares: SteelShare[] = []
  const plans = jobs.map((job): SteelPlan => {
    const result = nest(job.input)
    const net = netCost(book, job, result)
    const weights = job.members.map((index) => cutLength(lines[index]))
    const costs = share(net, weights)
    const trims = share(exact(result.barCount), weights)
    job.members.forEach((index, place) => {
      shares[index] = {
        cost: costs[place] ?? ZERO,
        trimCuts: trims[place] ?? ZERO,
        basis: () => basisOf(job, result),
      }
    })
    const { section, grade, input } = job
    return {
      section: section.designation,
      grade,
      stock: [...input.stock],
      nest: result,
      netCost: net.toFixed(),
    }
  })
  return { shares, plans }
}

function cutLength(line: LineWithTakeOff | undefined): Exact {
  return line ? line.piece.shaftLength.times(line.spec.quantity) : ZERO
}

function basisOf(job: SteelJob, result: NestResult): string {
  const bars = result.bars.map(({ stock, times, cuts, left }) => {
    const length = job.input.stock[stock]?.length ?? 0
    return `${times} × ${size(length)} mm bar cut to ${cutsText(cuts)}, ${size(left)} mm left`
  })
  const loose = result.unplaced.map(
    ({ length, quantity }) => `${quantity} × ${size(length)} mm by mass, no bar takes it`,
  )
  const together = job.members.length > 1 ? `; shared by cut length over ${job.members.length} lines` : ''
  return [...bars, ...loose].join('; ') + together
}

function cutsText(cuts: readonly number[]): string {
  const counts = new Map<number, number>()
  for (const cut of cuts) counts.set(cut, (counts.get(cut) ?? 0) + 1)
  return [...counts].map(([cut, count]) => `${count} × ${size(cut)}`).join(' + ')
}
