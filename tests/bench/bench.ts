import { catalogue } from '../../seeds/reference/catalogue.ts'
import { DEFAULT_PRICE_BOOK } from '../../seeds/reference/price-book.ts'
import { familiesFor, screenStock, stockOf } from '../../shared/proposal/candidates.ts'
import type { LineAsked } from '../../shared/proposal/line-asked.ts'
import { scheduler } from '../../shared/proposal/propose-schedule.ts'
import { propose } from '../../shared/proposal/propose.ts'
import { solveColumn } from '../../shared/stability/column-lengths.ts'
import { prepareColumn } from '../../shared/standards/prepare-column.ts'

/*
 * How quick the engine is on one core. Other work on the machine changes the figures: compare those of one run.
 * Usage: npm run bench
 */

const PINNED = { bottom: 'pinned', top: 'pinned' } as const
const DELIVERY = { km: 60 }

/** A schedule of columns that differ in height, load, quantity and bracing, without randomness. */
function line(index: number): LineAsked {
  return {
    mark: `A${index}`,
    quantity: 1 + (index % 9),
    limits: { maxUtilisation: 1 },
    finish: 'prime',
    base: { plate: true, rods: true, concrete: { strength: 28 } },
    cap: { plate: true },
    height: 3000 + ((index * 37) % 6000),
    ends: { strong: PINNED, weak: PINNED },
    braces: index % 2 === 1 ? [{ height: 1500, holds: 'weak', stopsTwist: true }] : [],
    loads: { dead: 50_000 + ((index * 7919) % 400_000), live: 60_000 + ((index * 104_729) % 900_000) },
  }
}

/** Best of some runs, ms: the machine's own noise only ever adds. */
function timed(runs: number, work: () => void): number {
  let best = Infinity
  for (let run = 0; run < runs; run += 1) {
    const start = performance.now()
    work()
    best = Math.min(best, performance.now() - start)
  }
  return best
}

function say(what: string, figure: string): void {
  process.stdout.write(`${what.padEnd(64)} ${figure}\n`)
}

const stock = stockOf(catalogue.ofFamilies(familiesFor(line(0), DEFAULT_PRICE_BOOK)), undefined)
const columns = Array.from({ length: 50 }, (_, index) => prepareColumn(line(index)))

/** E3 alone over packed numbers: as fast as the arithmetic can be. */
const packed = Float64Array.from(
  stock.flatMap(({ section, steel }) => [section.area, section.rx, section.ry, steel.Fy]),
)
function floor(strong: number, weak: number): number {
  let sum = 0
  for (let at = 0; at < packed.length; at += 4) {
    const [area = 0, rx = 1, ry = 1, Fy = 1] = [packed[at], packed[at + 1], packed[at + 2], packed[at + 3]]
    const slender = Math.max(strong / rx, weak / ry)
    const Fe = (Math.PI ** 2 * 199_948) / slender ** 2
    sum += 0.9 * area * (Fy / Fe <= 2.25 ? 0.658 ** (Fy / Fe) * Fy : 0.877 * Fe)
  }
  return sum
}

const full = timed(20, () => columns.forEach((column) => screenStock(column, stock)))
const bare = timed(20, () =>
  columns.forEach(({ solution }) => floor(solution.strong.used, solution.weak.used)),
)
const candidates = columns.length * stock.length
say(
  'candidate checks, AISC 360 in full, per second',
  Math.round((candidates / full) * 1000).toLocaleString('en'),
)
say(
  'the same shapes, E3 arithmetic alone, per second',
  Math.round((candidates / bare) * 1000).toLocaleString('en'),
)
say('full screening against that floor', `${(full / bare).toFixed(1)} times`)

const geometry = line(1)
const column = {
  height: 6000,
  ends: { strong: PINNED, weak: PINNED },
  braces: [...(geometry.braces ?? [])],
  endFixity: 'recommended',
} as const
say(
  'eigenvalue and segment solve, both axes',
  `${timed(50, () => solveColumn({ ...column, braces: [...column.braces] })).toFixed(2)} ms`,
)

const proposals = Array.from({ length: 20 }, (_, index) => line(index * 7))
const one = timed(5, () =>
  proposals.forEach((asked) => propose({ asked, catalogue, book: DEFAULT_PRICE_BOOK, delivery: DELIVERY })),
)
say(
  'one proposal over the whole catalogue, with alternatives and advice',
  `${(one / proposals.length).toFixed(1)} ms`,
)

const schedule = timed(3, () => {
  const offer = scheduler(catalogue, DEFAULT_PRICE_BOOK)
  for (let index = 0; index < 1000; index += 1) offer({ asked: line(index), delivery: DELIVERY })
})
say('a schedule of 1 000 different lines', `${(schedule / 1000).toFixed(2)} s`)
