import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import type { MoneyDto } from '../../../shared/contracts/common.ts'

type RequestRow = AnswerOf<'listRequests'>['items'][number]
type QuoteRow = AnswerOf<'listQuotes'>['items'][number]

/** Whose turn it is: nobody has begun, the shop is at it, the customer has it. */
export const STAGES = ['to take up', 'on the bench', 'with the customer'] as const
export type Stage = (typeof STAGES)[number]

/** One piece of work that waits: a request, or the quote that was made of it. */
export interface Waiting {
  id: string
  stage: Stage
  /** `R-1001`, or `Q-1001 A` once there is a quote. */
  number: string
  title: string
  company: string
  status: string
  /** Calendar day. */
  neededBy: string | null
  /** What orders those of one day, or of none: when it was asked for. Instant. */
  since: string
  pieces: number | null
  total: MoneyDto | null
  requestId: string | null
  quoteId: string | null
  validUntil: string | null
}

/**
 * One queue out of what the shop has: a request in review stands there as its quote. Oldest promise first: the day by
 * which it is needed, then the day on which it was asked for; what nobody set a day for comes after what has one.
 */
export function queueOf(requests: readonly RequestRow[], quotes: readonly QuoteRow[]): Waiting[] {
  const asked = new Map(requests.flatMap((row) => (row.quote ? [[row.quote.id, row] as const] : [])))
  const made = quotes.map((quote) => fromQuote(quote, asked.get(quote.id)))
  const quoted = new Set(quotes.map(({ id }) => id))
  const open = requests.filter(
    ({ status, quote }) =>
      status === 'submitted' || (status === 'in review' && !(quote && quoted.has(quote.id))),
  )
  return [...open.map(fromRequest), ...made].sort(byPromise)
}

function fromRequest(row: RequestRow): Waiting {
  return {
    id: row.id,
    stage: row.status === 'submitted' ? 'to take up' : 'on the bench',
    number: row.number,
    title: row.title,
    company: row.company.name,
    status: row.status,
    neededBy: row.neededBy,
    since: row.submittedAt ?? row.createdAt,
    pieces: row.pieces,
    total: row.indicativeTotal,
    requestId: row.id,
    quoteId: row.quote?.id ?? null,
    validUntil: null,
  }
}

function fromQuote(quote: QuoteRow, asked: RequestRow | undefined): Waiting {
  return {
    id: quote.id,
    stage: quote.status === 'sent' ? 'with the customer' : 'on the bench',
    number: `${quote.number} ${quote.letter}`,
    title: quote.title,
    company: quote.company.name,
    status: quote.status,
    neededBy: asked?.neededBy ?? null,
    since: asked?.submittedAt ?? quote.createdAt,
    pieces: asked?.pieces ?? null,
    total: quote.total,
    requestId: asked?.id ?? null,
    quoteId: quote.id,
    validUntil: quote.validUntil,
  }
}

const NO_DAY = '9999-12-31'
function byPromise(a: Waiting, b: Waiting): number {
  const [dayA, dayB] = [a.neededBy ?? NO_DAY, b.neededBy ?? NO_DAY]
  if (dayA !== dayB) return dayA < dayB ? -1 : 1
  return a.since === b.since ? 0 : a.since < b.since ? -1 : 1
}

/** How a day stands to today: "in 12 days", "today", "3 days ago". */
export function daysAway(day: string, now: Date): { days: number; text: string } {
  const today = Date.UTC(now.getFullYear(), now.getMonth(), now.getDate())
  const days = Math.round((Date.parse(`${day}T00:00:00Z`) - today) / 86_400_000)
  const count = `${Math.abs(days)} ${Math.abs(days) === 1 ? 'day' : 'days'}`
  return { days, text: days === 0 ? 'today' : days > 0 ? `in ${count}` : `${count} ago` }
}
