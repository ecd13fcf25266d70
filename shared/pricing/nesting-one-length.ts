import { LENGTH_TOLERANCE, netBarCost, taken, usable, type NestInput } from './nesting.ts'

/** A way to cut one bar: so many pieces from this stock. */
interface Choice {
  stock: number
  pieces: number
  cost: number
}

/**
 * Cheapest bars for pieces of one length from stock without limit, exact: best(q) = least over the ways to cut one
 * bar of cost(way) + best(q − pieces of the way). Ties go to more pieces in the bar, then to the earlier stock.
 * Undefined when no bar takes the piece.
 */
export function nestOneLength(
  input: NestInput,
  length: number,
  quantity: number,
): { stock: number; cuts: number[] }[] | undefined {
  const choices = choicesFor(input, length, quantity)
  if (choices.length === 0) return undefined
  const best = new Float64Array(quantity + 1)
  const chosen = new Array<Choice | undefined>(quantity + 1)
  for (let q = 1; q <= quantity; q += 1) {
    best[q] = Infinity
    for (const choice of choices) {
      if (choice.pieces > q) continue
      const cost = choice.cost + (best[q - choice.pieces] ?? Infinity)
      if (cost < (best[q] ?? Infinity) - 1e-9) {
        best[q] = cost
        chosen[q] = choice
      }
    }
  }
  const bars: { stock: number; cuts: number[] }[] = []
  for (let q = quantity; q > 0;) {
    const choice = chosen[q]
    if (!choice) return undefined
    bars.push({ stock: choice.stock, cuts: Array.from({ length: choice.pieces }, () => length) })
    q -= choice.pieces
  }
  return bars
}

function choicesFor(input: NestInput, length: number, quantity: number): Choice[] {
  const each = taken(length, input)
  const choices = input.stock.flatMap((stock, index) => {
    if (stock.available !== null) return []
    const room = usable(stock, input)
    const most = Math.min(quantity, Math.floor((room + LENGTH_TOLERANCE) / each))
    return Array.from({ length: most }, (_, i): Choice => {
      const pieces = i + 1
      return { stock: index, pieces, cost: netBarCost(stock, room - pieces * each, input) }
    })
  })
  return choices.sort((a, b) => b.pieces - a.pieces || a.stock - b.stock)
}
