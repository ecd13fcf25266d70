import { barPriceOf, type PriceBook } from '../pricing/price-book.ts'
import { limitsBroken, type Candidate, type LimitName } from './candidates.ts'
import { leastBy } from './least-by.ts'
import type { Limits, LineAsked } from './line-asked.ts'
import { percentText } from './words.ts'

export interface NoProposal {
  found: false
  reason: string
  nearest: { section: string; utilisation: number; needs: string } | null
}

/** Which limit stands in the way, and what the nearest shape would need. */
export function nothingFits(
  asked: LineAsked,
  screened: readonly Candidate[],
  holding: readonly Candidate[],
  book: PriceBook,
): NoProposal {
  const [first] = holding
  if (first) {
    const { designation } = first.section
    const needs = 'a base or a bar that the shop does not have'
    return {
      found: false,
      reason: whyNotMade(asked, first, book),
      nearest: { section: designation, utilisation: first.screening.utilisation, needs },
    }
  }
  const nearest = nearestOf(screened, asked.limits)
  return { found: false, reason: whyNoneHolds(screened, asked.limits), nearest }
}

/** It holds, and still cannot be made or set on its base. */
function whyNotMade(asked: LineAsked, { section }: Candidate, book: PriceBook): string {
  const longest = Math.max(...(barPriceOf(book, section.family)?.stockLengths ?? [0]))
  if ((asked.height ?? 0) > longest) {
    return `The column is longer than every bar that the shop buys (${longest} mm) and needs a splice: ask the shop.`
  }
  return asked.base.concrete.pier
    ? 'Shapes hold, but no base plate that the shop stocks holds on this pier: a larger pier or stronger concrete.'
    : 'Shapes hold, but no base plate that the shop stocks does: ask the shop.'
}

const NAMES: readonly LimitName[] = ['depth', 'width', 'utilisation', 'slenderness']

function inWords(name: LimitName, limits: Limits): string {
  switch (name) {
    case 'depth':
      return `the limit of depth, ${(limits.maxDepth ?? Infinity).toFixed(0)} mm`
    case 'width':
      return `the limit of width, ${(limits.maxWidth ?? Infinity).toFixed(0)} mm`
    case 'utilisation':
      return `the limit of utilisation, ${percentText(limits.maxUtilisation)}`
    case 'slenderness':
      return `the limit of slenderness, ${limits.maxSlenderness ?? Infinity}`
  }
}

function isStrongEnough({ screening }: Candidate): boolean {
  return screening.utilisation <= 1
}

/** Limits that alone keep a strong enough shape out; or all that do together; or strength itself. */
function whyNoneHolds(screened: readonly Candidate[], limits: Limits): string {
  const keptOut = screened.filter(isStrongEnough).map((candidate) => limitsBroken(candidate, limits))
  if (keptOut.length === 0) {
    return 'No shape that the shop buys is strong enough: add a brace, hold an end, or share the load over more columns.'
  }
  const alone = NAMES.filter((name) => keptOut.some(([only, ...more]) => only === name && more.length === 0))
  if (alone.length > 0) {
    return `What stands in the way is ${alone.map((name) => inWords(name, limits)).join(', or ')}.`
  }
  const together = NAMES.filter((name) => keptOut.some((broken) => broken.includes(name)))
  return `What stands in the way is ${together.map((name) => inWords(name, limits)).join(' and ')} together.`
}

/** By how much a shape is over the worst of its limits: 1 is the limit. */
function overLimits({ section, screening }: Candidate, limits: Limits): number {
  return Math.max(
    section.depth / (limits.maxDepth ?? Infinity),
    section.width / (limits.maxWidth ?? Infinity),
    screening.utilisation / limits.maxUtilisation,
    screening.slenderness / (limits.maxSlenderness ?? Infinity),
  )
}

/** Of the shapes that are strong enough, the one that is over its limits by the least; the strongest where none is. */
function nearestOf(screened: readonly Candidate[], limits: Limits): NoProposal['nearest'] {
  const strong = screened.filter(isStrongEnough)
  const nearest =
    strong.length > 0
      ? leastBy(strong, (candidate) => overLimits(candidate, limits))
      : leastBy(screened, ({ screening }) => screening.utilisation)
  if (!nearest) return null
  const { section, screening } = nearest
  const needs = limitsBroken(nearest, limits).map((name) => needed(name, nearest, limits))
  return {
    section: section.designation,
    utilisation: screening.utilisation,
    needs: needs.join(' and '),
  }
}

function needed(name: LimitName, { section, screening }: Candidate, limits: Limits): string {
  switch (name) {
    case 'depth':
      return `a depth of ${section.depth.toFixed(0)} mm`
    case 'width':
      return `a width of ${section.width.toFixed(0)} mm`
    case 'utilisation':
      return `to work at ${percentText(screening.utilisation)}, with a limit of ${percentText(limits.maxUtilisation)}`
    case 'slenderness':
      return `an Lc/r of ${screening.slenderness.toFixed(0)}`
  }
}
