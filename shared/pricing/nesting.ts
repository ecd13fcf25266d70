/** A bar that can be had. `available` null: as many as wanted. */
export interface NestStock {
  /** mm */
  length: number
  /** Minor units a bar. */
  cost: number
  available: number | null
}

export interface NestPiece {
  /** mm */
  length: number
  quantity: number
}

export interface NestInput {
  stock: readonly NestStock[]
  pieces: readonly NestPiece[]
  /** mm lost with each piece. */
  kerf: number
  /** mm lost once with each bar. */
  endTrim: number
  /** What is left from this length on is worth this share of the bar's cost, by length. */
  reusable: { from: number; worth: number }
  /** The same share for anything shorter. */
  scrapWorth: number
  timeLimitMs?: number
}

/** Bars cut alike. */
export interface NestedBar {
  /** Index into the stock of the input. */
  stock: number
  times: number
  /** Piece lengths, longest first, mm. */
  cuts: number[]
  /** mm */
  left: number
}

export interface NestResult {
  bars: NestedBar[]
  /** Cost of the bars less the worth of what is left, minor units. */
  cost: number
  /** No plan can cost less. */
  bound: number
  /** (cost − bound) ÷ cost. */
  gap: number
  optimal: boolean
  barCount: number
  unplaced: { length: number; quantity: number; reason: string }[]
}

/** Cuts bars: same input, same answer. */
export type Nest = (input: NestInput) => NestResult

/** Length of bar that a piece takes up, mm. */
export function taken(length: number, { kerf }: Pick<NestInput, 'kerf'>): number {
  return length + kerf
}

/** Length of bar that pieces may take up, mm. */
export function usable(stock: NestStock, { endTrim }: Pick<NestInput, 'endTrim'>): number {
  return stock.length - endTrim
}

/** Lengths are compared to a thousandth of a millimetre: a sum of cuts is not to fail on its last bit. */
export const LENGTH_TOLERANCE = 1e-3

export function fits(length: number, stock: NestStock, input: NestInput): boolean {
  return taken(length, input) <= usable(stock, input) + LENGTH_TOLERANCE
}

/** Net cost of one bar with so much left over, minor units. */
export function netBarCost(stock: NestStock, left: number, { reusable, scrapWorth }: NestInput): number {
  const worth = left >= reusable.from - LENGTH_TOLERANCE ? reusable.worth : scrapWorth
  return stock.cost * (1 - (worth * Math.max(0, left)) / stock.length)
}

/** Puts bars cut alike together and prices the plan. `bound` defaults to the plain bound by length. */
export function finishNest(
  input: NestInput,
  cutBars: readonly { stock: number; cuts: readonly number[] }[],
  unplaced: NestResult['unplaced'],
  proven = false,
): NestResult {
  const alike = new Map<string, NestedBar>()
  let cost = 0
  for (const bar of cutBars) {
    const stock = input.stock[bar.stock]
    if (!stock) continue
    const cuts = [...bar.cuts].sort((a, b) => b - a)
    const left = leftOver(stock, cuts, input)
    cost += netBarCost(stock, left, input)
    const key = `${bar.stock}:${cuts.join(',')}`
    const same = alike.get(key)
    if (same) same.times += 1
    else alike.set(key, { stock: bar.stock, times: 1, cuts, left })
  }
  const bound = proven ? cost : Math.min(cost, boundByLength(input, unplaced))
  return {
    bars: [...alike.values()],
    cost,
    bound,
    gap: cost > 0 ? (cost - bound) / cost : 0,
    optimal: proven || bound === cost,
    barCount: cutBars.length,
    unplaced,
  }
}

export function leftOver(stock: NestStock, cuts: readonly number[], input: NestInput): number {
  const used = cuts.reduce((total, cut) => total + taken(cut, input), 0)
  return Math.max(0, Math.round((usable(stock, input) - used) * 1000) / 1000)
}

/**
 * No plan costs less than this: a bar of cost c with usable length u never nets under c/u for each mm it gives to
 * pieces, since what is left is worth no more than its share. Each piece at the cheapest bar that takes it.
 */
function boundByLength(input: NestInput, unplaced: NestResult['unplaced']): number {
  const bounds = input.pieces.map(({ length, quantity }) => quantity * leastCost(input, length))
  const left = unplaced.map(({ length, quantity }) => -quantity * leastCost(input, length))
  // Smallest first: the same sum whatever the order of the pieces.
  const parts = [...bounds, ...left].sort((a, b) => a - b)
  return Math.max(
    0,
    parts.reduce((total, part) => total + part, 0),
  )
}

function leastCost(input: NestInput, length: number): number {
  const rates = input.stock
    .filter((stock) => stock.available !== 0 && fits(length, stock, input))
    .map((stock) => stock.cost / usable(stock, input))
  return rates.length > 0 ? taken(length, input) * Math.min(...rates) : 0
}
