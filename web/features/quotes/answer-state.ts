import { dayText } from '../../format/dates.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'

/** Whether the quote can still be answered, and what there is to say when it cannot. */
export function answerState({ current }: QuoteDto, now: Date): { open: boolean; text: string } {
  const { status, validUntil, answeredBy, answeredAt, answerReason } = current
  const by = answeredBy ? ` by ${answeredBy}` : ''
  const on = answeredAt ? ` on ${dayText(answeredAt)}` : ''
  switch (status) {
    case 'sent':
      return validUntil && new Date(validUntil) < now
        ? {
            open: false,
            text: `The price held until ${dayText(validUntil)}. Ask the shop to price it anew.`,
          }
        : { open: true, text: '' }
    case 'accepted':
      return { open: false, text: `Accepted${by}${on}.` }
    case 'declined':
      return { open: false, text: `Declined${by}${on}${answerReason ? `: ${answerReason}` : '.'}` }
    case 'expired':
      return { open: false, text: 'The price has gone stale. Ask the shop to price it anew.' }
    case 'withdrawn':
      return { open: false, text: 'The shop has taken this revision back.' }
    case 'superseded':
      return { open: false, text: 'A later revision has taken its place.' }
    case 'draft':
    case 'approved':
      return { open: false, text: 'The shop is still working on it.' }
  }
}
