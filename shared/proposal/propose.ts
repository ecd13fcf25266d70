import type { BaseDesign } from '../base/base-design.ts'
import { steelFor } from '../materials/steel-for.ts'
import { priceQuote } from '../pricing/build-up.ts'
import type { LineSpec } from '../pricing/line-spec.ts'
import type { CandidatePrice } from '../pricing/candidate.ts'
import type { Money } from '../pricing/money.ts'
import type { PriceBook } from '../pricing/price-book.ts'
import type { PricedQuote } from '../pricing/priced-quote.ts'
import type { Catalogue } from '../sections/catalogue.ts'
import { outlineOf, type Rings } from '../sections/outline.ts'
import type { Section } from '../sections/section.ts'
import { checkColumn, type ColumnCheck } from '../standards/check-column.ts'
import { checkFamily } from '../standards/families.ts'
import { prepareColumn, type PreparedColumn } from '../standards/prepare-column.ts'
import { screenColumn } from '../standards/screen-column.ts'
import { Refusal, refuse, type Issue } from '../units/refusal.ts'
import { adviceFor, type Advice } from './advice.ts'
import { familiesFor, limitsBroken, screenStock, stockOf, type Candidate } from './candidates.ts'
import { leastBy } from './least-by.ts'
import type { LineAsked } from './line-asked.ts'
import { nextLighter, type NextLighter } from './next-lighter.ts'
import { nothingFits, type NoProposal } from './nothing-fits.ts'
import { baseOf, cheapest, leastPriced, priceOne, specOf, type PricedCandidate } from './price-candidates.ts'
import type { PriceTerms } from './price-terms.ts'

export interface Alternative {
  section: string
  designationSI: string
  family: string
  because: ('cheapest' | 'lightest' | 'slimmest')[]
  utilisation: number
  mass: number
  depth: number
  width: number
  unitPrice: Money
}

export interface Proposal {
  found: true
  section: string
  designationSI: string
  outline: Rings
  depth: number
  width: number
  check: ColumnCheck
  base: BaseDesign | null
  spec: LineSpec
  alternatives: Alternative[]
  nextLighter: NextLighter | null
  advice: Advice[]
  price: PricedQuote
}

export interface ProposalInput {
  asked: LineAsked
  catalogue: Catalogue
  book: PriceBook
  /** null: collected. */
  delivery: { km: number } | null
  /** Left out: none. */
  tax?: { rate: string; exempt: boolean } | undefined
  /** false: leave out what would make it cheaper, which takes as long as all the rest. */
  advise?: boolean | undefined
  /** Another shape than the cheapest: the one to propose, whether it holds or not. */
  section?: string | undefined
}

/** Of the cheapest, this many are shown beside the lightest and the slimmest. */
const SHOWN = 6

/** What keeps a line from being made, beyond what the checks themselves refuse. */
function lineIssues({ height, quantity }: LineAsked): Issue[] {
  const issues: Issue[] = []
  if (height === undefined) issues.push({ path: 'height', message: 'give the height of the column in mm' })
  if (!(Number.isInteger(quantity) && quantity >= 1)) {
    issues.push({ path: 'quantity', message: 'a whole number of at least 1' })
  }
  return issues
}

/**
 * The cheapest shape as delivered that holds and keeps the limits, with what else would do: at least the lightest, the
 * slimmest and five more where there are as many. When nothing fits, what stands in the way. Refuses by field.
 */
export function propose(input: ProposalInput): Proposal | NoProposal {
  const { asked, catalogue, book, delivery } = input
  const issues = lineIssues(asked)
  if (issues.length > 0) throw new Refusal(issues)
  const prepared = prepareColumn(asked)
  const families = familiesFor(asked, book)
  if (families.length === 0) {
    refuse('limits.families', `at least one family that the shop buys and ${prepared.terms.standard} is for`)
  }
  const screened = screenStock(prepared, stockOf(catalogue.ofFamilies(families), asked.grade))
  const holding = screened.filter((candidate) => limitsBroken(candidate, asked.limits).length === 0)
  const terms = { book, delivery }
  const ranked = rank(asked, holding, terms)
  const chosen = input.section === undefined ? ranked[0] : chooseByName(input, prepared, terms)
  if (!chosen) return nothingFits(asked, screened, holding, book)
  const { section, steel, spec } = chosen
  const base = baseOf(asked, chosen, book)
  const { designation, designationSI, depth, width } = section
  return {
    found: true,
    section: designation,
    ...{ designationSI, outline: outlineOf(section), depth, width },
    check: checkColumn(prepared, section, steel),
    ...{ base, spec },
    alternatives: alternativesOf(ranked),
    nextLighter: nextLighter(asked, chosen, screened, terms),
    advice: ranked[0] && input.advise !== false ? adviceOf(input, ranked[0]) : [],
    price: priceQuote({
      ...{ book, delivery, lines: [{ spec, section }], discount: '0' },
      tax: input.tax ?? { rate: '0', exempt: false },
    }),
  }
}

/** Changes are weighed against the cheapest, whatever shape is looked at. */
function adviceOf({ catalogue, book, delivery, asked }: ProposalInput, best: PricedCandidate): Advice[] {
  const terms = { book, delivery }
  return adviceFor(asked, best.price.delivered, terms, (changed) => {
    const prepared = prepareColumn(changed)
    const screened = screenStock(
      prepared,
      stockOf(catalogue.ofFamilies(familiesFor(changed, book)), changed.grade),
    )
    const holding = screened.filter((candidate) => limitsBroken(candidate, changed.limits).length === 0)
    const [cheaper] = cheapest(changed, holding, terms, 1)
    return cheaper && { section: cheaper.section.designation, ...cheaper.price }
  })
}

/** The cheapest, and among them in their place the lightest and the slimmest. */
function rank(asked: LineAsked, holding: readonly Candidate[], terms: PriceTerms): PricedCandidate[] {
  const ranked = cheapest(asked, holding, terms, SHOWN)
  // Where nothing can be made, these cannot either.
  if (ranked.length === 0) return []
  for (const measure of [shaftMass, planArea]) {
    const least = leastPriced(asked, holding, terms, measure)
    if (least && !ranked.some(({ section }) => section === least.section)) ranked.push(least)
  }
  return ranked.sort((a, b) => a.price.delivered.amount - b.price.delivered.amount)
}

const shaftMass = ({ section }: { section: Section }) => section.mass
const planArea = ({ section }: { section: Section }) => section.depth * section.width

function alternativesOf(ranked: readonly PricedCandidate[]): Alternative[] {
  const lightest = leastBy(ranked, shaftMass)
  const slimmest = leastBy(ranked, planArea)
  return ranked.map((one, index) => {
    const { designation, designationSI, family, mass, depth, width } = one.section
    const because: Alternative['because'] = index === 0 ? ['cheapest'] : []
    if (one.section === lightest?.section) because.push('lightest')
    if (one.section === slimmest?.section) because.push('slimmest')
    const { utilisation } = one.screening
    return {
      section: designation,
      ...{ designationSI, family, because, utilisation, mass, depth, width },
      unitPrice: one.price.unitPrice,
    }
  })
}

type Chosen = Candidate & { spec: LineSpec; price?: CandidatePrice }

/** A shape by its name, of any family that the shop buys: its verdict is the answer, whatever it is. */
function chooseByName(
  { asked, catalogue, book, section: name = '' }: ProposalInput,
  prepared: PreparedColumn,
  terms: PriceTerms,
): Chosen {
  const section = catalogue.find(name)
  if (!section) return refuse('section', `${name} is not in the catalogue; a designation such as W10X49`)
  checkFamily(section, prepared.terms.standard)
  const steel = steelFor(asked.grade, section)
  const candidate = { section, steel, screening: screenColumn(prepared, section, steel) }
  const priced = priceOne(asked, candidate, terms)
  if (priced) return priced
  return { ...candidate, spec: specOf(asked, candidate, baseOf(asked, candidate, book)) }
}
