import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { netBarCost, type NestInput, type NestResult } from '../../../shared/pricing/nesting.ts'
import { nestGreedy } from '../../../shared/pricing/nesting-greedy.ts'

const bar = (length: number, available: number | null = null, cost = length * 13) => ({
  length,
  cost,
  available,
})
const STOCK = [6096, 9144, 12192, 15240, 18288].map((length) => bar(length))
const RULES = { kerf: 3, endTrim: 10, reusable: { from: 900, worth: 0.6 }, scrapWorth: 0.15 }

const lengths = fc.record({
  length: fc.integer({ min: 400, max: 12_000 }),
  quantity: fc.integer({ min: 1, max: 30 }),
})
const pieces = fc.array(lengths, { minLength: 1, maxLength: 12 })
const remnants = fc.array(
  fc.record({
    length: fc.integer({ min: 900, max: 9000 }),
    cost: fc.integer({ min: 100, max: 60_000 }),
    available: fc.integer({ min: 0, max: 4 }),
  }),
  { maxLength: 4 },
)
const jobs = fc
  .record({ pieces, remnants, stock: fc.subarray(STOCK, { minLength: 1 }) })
  .map((job): NestInput => ({ ...RULES, pieces: job.pieces, stock: [...job.stock, ...job.remnants] }))

function counts(cuts: readonly { length: number; quantity: number }[]): Record<string, number> {
  const all: Record<string, number> = {}
  for (const { length, quantity } of cuts) all[length] = (all[length] ?? 0) + quantity
  return all
}

function cutFrom(result: NestResult): { length: number; quantity: number }[] {
  return result.bars.flatMap(({ times, cuts }) => cuts.map((length) => ({ length, quantity: times })))
}

describe('cutting bars by rule of thumb', () => {
  it('cuts every piece once, from bars that take it and are there', () => {
    fc.assert(
      fc.property(jobs, (input) => {
        const result = nestGreedy(input)
        expect(counts([...cutFrom(result), ...result.unplaced])).toEqual(counts(input.pieces))
        const used = new Map<number, number>()
        for (const { stock, times, cuts, left } of result.bars) {
          const used1 = cuts.reduce((all, cut) => all + cut + RULES.kerf, RULES.endTrim)
          expect(used1 + left).toBe(input.stock[stock]?.length)
          expect(left).toBeGreaterThanOrEqual(0)
          used.set(stock, (used.get(stock) ?? 0) + times)
        }
        for (const [stock, times] of used) {
          expect(times).toBeLessThanOrEqual(input.stock[stock]?.available ?? Infinity)
        }
      }),
    )
  })

  it('says what the plan costs and never less than its bound', () => {
    fc.assert(
      fc.property(jobs, (input) => {
        const result = nestGreedy(input)
        const cost = result.bars.reduce((all, { stock, times, left }) => {
          const from = input.stock[stock]
          return all + (from ? times * netBarCost(from, left, input) : 0)
        }, 0)
        expect(result.cost).toBeCloseTo(cost, 6)
        expect(result.bound).toBeLessThanOrEqual(result.cost + 1e-6)
        expect(result.gap).toBeGreaterThanOrEqual(0)
        expect(result.barCount).toBe(result.bars.reduce((all, { times }) => all + times, 0))
      }),
    )
  })

  it('gives the same answer again, and to the same pieces in another order', () => {
    fc.assert(
      fc.property(jobs, (input) => {
        expect(nestGreedy(input)).toEqual(nestGreedy(input))
        expect(nestGreedy({ ...input, pieces: [...input.pieces].reverse() })).toEqual(nestGreedy(input))
      }),
    )
  })

  it('costs no more than first-fit-decreasing from any one stock length', () => {
    fc.assert(
      fc.property(pieces, fc.nat(STOCK.length - 1), (asked, which) => {
        const only = STOCK[which]
        if (!only || asked.some(({ length }) => length + 13 > only.length)) return
        const all = asked.flatMap(({ length, quantity }) => Array.from({ length: quantity }, () => length))
        const rooms: number[] = []
        for (const length of all.sort((a, b) => b - a)) {
          const place = rooms.findIndex((room) => room >= length + RULES.kerf)
          if (place < 0) rooms.push(only.length - RULES.endTrim - length - RULES.kerf)
          else rooms[place] = (rooms[place] ?? 0) - length - RULES.kerf
        }
        const input = { ...RULES, pieces: asked, stock: STOCK }
        const plain = rooms.reduce((cost, room) => cost + netBarCost(only, room, input), 0)
        expect(nestGreedy(input).cost).toBeLessThanOrEqual(plain + 1e-6)
      }),
    )
  })

  it('finds the cheapest bars for one length, by trying all', () => {
    const twoStocks = [bar(6096), bar(9144, null, 9144 * 12.5)]
    fc.assert(
      fc.property(
        fc.integer({ min: 1400, max: 6000 }),
        fc.integer({ min: 1, max: 7 }),
        (length, quantity) => {
          const input = { ...RULES, pieces: [{ length, quantity }], stock: twoStocks }
          const tryAll = (left: number): number => {
            if (left === 0) return 0
            const ways = twoStocks.flatMap((stock) => {
              const most = Math.floor((stock.length - RULES.endTrim) / (length + RULES.kerf))
              return Array.from({ length: Math.min(most, left) }, (_, i) => {
                const over = stock.length - RULES.endTrim - (i + 1) * (length + RULES.kerf)
                return netBarCost(stock, over, input) + tryAll(left - i - 1)
              })
            })
            return Math.min(...ways)
          }
          const result = nestGreedy(input)
          expect(result.cost).toBeCloseTo(tryAll(quantity), 4)
          expect(result).toMatchObject({ optimal: true, gap: 0 })
        },
      ),
      { numRuns: 60 },
    )
  })

  it('leaves out what no bar takes, and says why', () => {
    const result = nestGreedy({ ...RULES, stock: STOCK, pieces: [{ length: 18_280, quantity: 2 }] })
    expect(result.bars).toEqual([])
    expect(result.unplaced).toEqual([
      { length: 18_280, quantity: 2, reason: expect.stringContaining('18288 mm) gives: it needs a splice') },
    ])
    const rackOnly = nestGreedy({ ...RULES, stock: [bar(4000, 1)], pieces: [{ length: 3000, quantity: 2 }] })
    expect(rackOnly.barCount).toBe(1)
    expect(rackOnly.unplaced).toEqual([
      { length: 3000, quantity: 1, reason: expect.stringContaining('none can be bought') },
    ])
  })

  it('takes a piece that fills the bar to the last millimetre, and none longer', () => {
    const stock = [bar(6000)]
    expect(nestGreedy({ ...RULES, stock, pieces: [{ length: 5987, quantity: 1 }] }).bars[0]?.left).toBe(0)
    expect(nestGreedy({ ...RULES, stock, pieces: [{ length: 5987.1, quantity: 1 }] }).unplaced).toHaveLength(
      1,
    )
  })

  it('cuts from the rack where that is cheaper, and leaves it alone where it is not', () => {
    const asked = { ...RULES, pieces: [{ length: 2900, quantity: 1 }] }
    const cheap = nestGreedy({ ...asked, stock: [bar(6096), bar(3000, 1, 5000)] })
    expect(cheap.bars).toMatchObject([{ stock: 1, times: 1 }])
    const dear = nestGreedy({ ...asked, stock: [bar(6096), bar(3000, 1, 900_000)] })
    expect(dear.bars).toMatchObject([{ stock: 0, times: 1 }])
  })
})
