import type { PriceBook } from '../pricing/price-book.ts'
import { barPriceOf } from '../pricing/price-book.ts'
import { limitsBroken, type Candidate, type LimitName } from './candidates.ts'
import type { LineAsked } from './line-asked.ts'
import { percentText } from './words.ts'

export interface NoProposal {
  found: false
  reason: string
  nearest: { section: string; utilisation: number; needs: string } | null
}

const WAYS: Record<LimitName, string> = {
  depth: 'the limit of depth',
  width: 'the limit of width',
  utilisation: 'strength: every shape that keeps the other limits is too weak',
  slenderness: 'the limit of slenderness',
}

/** Which limit stands in the way, and what the nearest shape would need. */
export function nothingFits(
  asked: LineAsked,
  screened: readonly Candidate[],
  holding: readonly Candidate[],
  book: PriceBook,
): NoProposal {
  const first = holding[0]
  if (first) return { found: false, reason: whyNotMade(asked, first, book), nearest: nearestOf(first, asked) }
  const broken = screened.map((one) => ({ one, limits: limitsBroken(one, asked.limits) }))
  const fewest = Math.min(...broken.map(({ limits }) => limits.length))
  const close = broken.filter(({ limits }) => limits.length === fewest)
  // Strength first: of shapes that miss one limit each, the one that works least hard over it is the nearest.
  const ways = new Set(close.flatMap(({ limits }) => limits))
  const nearest = close.reduce<(typeof close)[number] | undefined>(
    (best, next) => (!best || next.one.screening.utilisation < best.one.screening.utilisation ? next : best),
    undefined,
  )
  const alone = ways.size === 1 && ways.has('utilisation')
  const stands = [...ways].map((way) => WAYS[way]).join(', or ')
  return {
    found: false,
    reason: alone
      ? 'No shape that the shop buys is strong enough: add a brace, hold an end, or share the load over more columns.'
      : `What stands in the way is ${stands}.`,
    nearest: nearest ? nearestOf(nearest.one, asked) : null,
  }
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

function nearestOf({ section, screening }: Candidate, { limits }: LineAsked): NoProposal['nearest'] {
  const needs: string[] = []
  const { utilisation, slenderness } = screening
  if (section.depth > (limits.maxDepth ?? Infinity)) needs.push(`a depth of ${section.depth.toFixed(0)} mm`)
  if (section.width > (limits.maxWidth ?? Infinity)) needs.push(`a width of ${section.width.toFixed(0)} mm`)
  if (utilisation > limits.maxUtilisation) {
    needs.push(`to work at ${percentText(utilisation)} of its strength`)
  }
  if (slenderness > (limits.maxSlenderness ?? Infinity)) needs.push(`an Lc/r of ${slenderness.toFixed(0)}`)
  const wanted = needs.length > 0 ? needs.join(' and ') : 'a base or a bar that the shop does not have'
  return { section: section.designation, utilisation, needs: wanted }
}
