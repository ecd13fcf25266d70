import {
  finishNest,
  fits,
  leftOver,
  LENGTH_TOLERANCE,
  netBarCost,
  taken,
  usable,
  type NestInput,
  type NestPiece,
  type NestResult,
} from './nesting.ts'
import { nestOneLength } from './nesting-one-length.ts'

interface OpenBar {
  stock: number
  cuts: number[]
  room: number
}

/** How to open a bar: a stock length to prefer, and whether the rack's remnants are filled first. */
interface Policy {
  prefer: number | 'mixed'
  remnants: boolean
}

/**
 * Cuts bars by rule of thumb: first-fit-decreasing with each stock length and with all of them, remnants first and
 * remnants left alone, and each length for itself (exact); the cheapest of these plans, net of what is left. Then each
 * bar is changed for the cheapest one that takes its cuts. A piece longer than every bar is left out, with the reason.
 */
export function nestGreedy(input: NestInput): NestResult {
  const { placeable, tooLong } = sortOut(input)
  if (placeable.length === 0) return finishNest(input, [], tooLong, true)
  const limited = input.stock.some(({ available }) => available !== null && available > 0)
  const plans: NestResult[] = []
  const single = eachLengthAlone(input, placeable)
  if (single) plans.push(finishNest(input, single, tooLong, !limited && placeable.length === 1))
  if (plans[0]?.optimal) return plans[0]
  for (const policy of policies(input, limited)) {
    const { bars, short } = firstFit(input, placeable, policy)
    plans.push(finishNest(input, cheaper(input, bars), [...tooLong, ...short]))
  }
  return plans.reduce((best, plan) => (better(plan, best) ? plan : best))
}

function better(a: NestResult, b: NestResult): boolean {
  const [missingA, missingB] = [missing(a), missing(b)]
  if (missingA !== missingB) return missingA < missingB
  if (Math.abs(a.cost - b.cost) > 1e-6) return a.cost < b.cost
  return a.barCount < b.barCount
}

function missing(result: NestResult): number {
  return result.unplaced.reduce((total, { quantity }) => total + quantity, 0)
}

function sortOut(input: NestInput): { placeable: NestPiece[]; tooLong: NestResult['unplaced'] } {
  const byLength = new Map<number, number>()
  for (const { length, quantity } of input.pieces) {
    if (quantity > 0) byLength.set(length, (byLength.get(length) ?? 0) + quantity)
  }
  const placeable: NestPiece[] = []
  const tooLong: NestResult['unplaced'] = []
  const longest = Math.max(0, ...input.stock.map(({ length }) => length))
  for (const [length, quantity] of [...byLength].sort((a, b) => b[0] - a[0])) {
    if (input.stock.some((stock) => stock.available !== 0 && fits(length, stock, input))) {
      placeable.push({ length, quantity })
    } else {
      const reason = `longer than the longest bar (${longest} mm) gives: it needs a splice`
      tooLong.push({ length, quantity, reason })
    }
  }
  return { placeable, tooLong }
}

function policies(input: NestInput, limited: boolean): Policy[] {
  const prefers: Policy['prefer'][] = ['mixed']
  input.stock.forEach(({ available }, index) => {
    if (available === null) prefers.push(index)
  })
  const rack = limited ? [true, false] : [false]
  return rack.flatMap((remnants) => prefers.map((prefer) => ({ prefer, remnants })))
}

function eachLengthAlone(input: NestInput, pieces: NestPiece[]): OpenBar[] | undefined {
  const bars: OpenBar[] = []
  for (const { length, quantity } of pieces) {
    const alone = nestOneLength(input, length, quantity)
    if (!alone) return undefined
    bars.push(...alone.map((bar) => ({ ...bar, room: 0 })))
  }
  return bars
}

/** First-fit-decreasing: each piece, longest first, into the first bar with room; a new bar by the policy. */
function firstFit(
  input: NestInput,
  pieces: NestPiece[],
  policy: Policy,
): { bars: OpenBar[]; short: NestResult['unplaced'] } {
  const supply = input.stock.map(({ available }) => available)
  const bars: OpenBar[] = []
  const short: NestResult['unplaced'] = []
  for (const { length, quantity } of pieces) {
    let from = 0
    let placed = 0
    while (placed < quantity) {
      const each = taken(length, input)
      while (from < bars.length && (bars[from]?.room ?? 0) + LENGTH_TOLERANCE < each) from += 1
      if (from === bars.length) {
        const stock = openBar(input, length, policy, supply)
        const opened = stock === undefined ? undefined : input.stock[stock]
        if (stock === undefined || !opened) break
        const left = supply[stock]
        if (typeof left === 'number') supply[stock] = left - 1
        bars.push({ stock, cuts: [], room: usable(opened, input) })
      }
      const bar = bars[from]
      if (!bar) break
      bar.cuts.push(length)
      bar.room -= each
      placed += 1
    }
    if (placed < quantity) {
      const reason = 'no bar of that length is left in the rack and none can be bought'
      short.push({ length, quantity: quantity - placed, reason })
    }
  }
  return { bars, short }
}

function openBar(
  input: NestInput,
  length: number,
  policy: Policy,
  supply: (number | null)[],
): number | undefined {
  const candidates = input.stock
    .map((stock, index) => ({ stock, index }))
    .filter(({ stock, index }) => supply[index] !== 0 && fits(length, stock, input))
  const bought = candidates.filter(({ index }) => supply[index] === null)
  const remnants = candidates.filter(({ index }) => supply[index] !== null)
  remnants.sort((a, b) => a.stock.length - b.stock.length || a.index - b.index)
  if (remnants[0] && (policy.remnants || bought.length === 0)) return remnants[0].index
  if (policy.prefer !== 'mixed' && bought.some(({ index }) => index === policy.prefer)) return policy.prefer
  // Cheapest for each mm of this length that it gives.
  const rate = ({ stock }: (typeof bought)[number]) => {
    const each = taken(length, input)
    const most = Math.max(1, Math.floor((usable(stock, input) + LENGTH_TOLERANCE) / each))
    return netBarCost(stock, Math.max(0, usable(stock, input) - most * each), input) / most
  }
  return bought.sort((a, b) => rate(a) - rate(b) || a.index - b.index)[0]?.index
}

/** Changes each bought bar for the cheapest one that can be bought and takes the same cuts. */
function cheaper(input: NestInput, bars: OpenBar[]): OpenBar[] {
  return bars.map((bar) => {
    if (input.stock[bar.stock]?.available !== null) return bar
    let best = bar.stock
    let cost = Infinity
    const used = bar.cuts.reduce((total, cut) => total + taken(cut, input), 0)
    input.stock.forEach((stock, index) => {
      if (stock.available !== null || used > usable(stock, input) + LENGTH_TOLERANCE) return
      const net = netBarCost(stock, leftOver(stock, bar.cuts, input), input)
      if (net < cost - 1e-9) [best, cost] = [index, net]
    })
    return { ...bar, stock: best }
  })
}
