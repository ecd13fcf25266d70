import { catalogue } from '../../seeds/reference/catalogue.ts'
import type { LineSpecDto } from '../../shared/contracts/pricing.ts'
import type { ProposalDto } from '../../shared/contracts/proposals.ts'
import type { QuoteLineDto } from '../../shared/contracts/quotes.ts'
import type { LineRequirement } from '../../shared/contracts/requirement.ts'
import { priceQuote } from '../../shared/pricing/build-up.ts'
import type { PriceBook } from '../../shared/pricing/price-book.ts'
import type { PricedQuote } from '../../shared/pricing/priced-quote.ts'
import { propose } from '../../shared/proposal/propose.ts'
import { workOutLine } from '../../shared/proposal/work-out-line.ts'
import { approvalBlockers } from '../../shared/quoting/approval.ts'
import { outlineOf } from '../../shared/sections/outline.ts'
import type { Section } from '../../shared/sections/section.ts'
import { Refusal, refuse } from '../../shared/units/refusal.ts'

export interface BegunLine {
  requirement: LineRequirement
  spec: LineSpecDto
  alternatives: ProposalDto['alternatives']
}

/** Paths of one line as the whole list has them. */
function atLine<T>(index: number, work: () => T): T {
  try {
    return work()
  } catch (error) {
    if (!(error instanceof Refusal)) throw error
    throw new Refusal(error.issues.map(({ path, message }) => ({ path: `lines.${index}.${path}`, message })))
  }
}

/** How the estimator's work begins: each line as proposed, or as the nearest shape where nothing fits. */
export function beginWork({
  requirements,
  book,
  km,
}: {
  requirements: LineRequirement[]
  book: PriceBook
  km: number
}): BegunLine[] {
  const terms = { catalogue, book, delivery: km > 0 ? { km } : null, advise: false }
  return requirements.map((requirement, index) =>
    atLine(index, () => {
      const first = propose({ ...terms, asked: requirement })
      const found = first.found ? first : propose({ ...terms, asked: requirement, section: nearestOf(first) })
      if (!found.found) return refuse('section', found.reason)
      return { requirement, spec: found.spec, alternatives: found.alternatives }
    }),
  )
}

function nearestOf({ reason, nearest }: { reason: string; nearest: { section: string } | null }): string {
  return nearest ? nearest.section : refuse('limits', reason)
}

export interface WorkedLine extends Omit<QuoteLineDto, 'mark' | 'alternatives' | 'spec'> {
  spec: LineSpecDto
}
export interface WorkedQuote {
  lines: WorkedLine[]
  price: PricedQuote
  blockers: string[]
}

export interface QuoteToWorkOut {
  lines: { requirement: LineRequirement; spec: LineSpecDto }[]
  book: PriceBook
  delivery: { km: number } | null
  tax: { rate: string; exempt: boolean }
  discount: string
}

/** A quote as the estimator has it, checked and priced. */
export function workOut({ lines, ...terms }: QuoteToWorkOut): WorkedQuote {
  const worked = lines.map((line, index) => atLine(index, () => workOne(line, terms.book)))
  const sections = worked.map(({ section, line }) => ({ section, spec: line.spec }))
  const price = priceQuote({ ...terms, lines: sections })
  const blockers = approvalBlockers({
    lines: worked.map(({ line: { spec, check, base } }) => ({
      mark: spec.mark,
      utilisation: check.utilisation,
      holds: check.verdict === 'holds',
      baseHolds: base && base.verdict === 'holds',
    })),
    steel: price.steel,
  })
  return { lines: worked.map(({ line }) => line), price, blockers }
}

function workOne(
  { requirement, spec }: QuoteToWorkOut['lines'][number],
  book: PriceBook,
): { section: Section; line: WorkedLine } {
  const section = catalogue.find(spec.section) ?? unknownSection(spec.section)
  const { check, base } = workOutLine(requirement, spec, section, book)
  const { designationSI, depth, width } = section
  // However it was typed, the shape has one name on every page.
  const named = { ...spec, section: section.designation }
  return {
    section,
    line: { requirement, spec: named, check, base, designationSI, outline: outlineOf(section), depth, width },
  }
}

function unknownSection(name: string): never {
  return refuse('section', `${name} is not in the catalogue; a designation such as W10X49`)
}
