import { quoteTitle, type QuoteDocument } from './quote-document.ts'
import { dateText } from '../money-and-dates.ts'
import { factColumns, type Fact } from './fact-columns.ts'
import type { Sheet } from './sheet.ts'
import { INK } from './type-style.ts'

/** The shop, the quote's number and dates, and whom it is for. */
export function letterhead(sheet: Sheet, document: QuoteDocument): void {
  const { shop, quote, issuedOn } = document
  const top = sheet.y
  sheet.tag('P', () => sheet.put('heading', shop.name, { y: top }))
  sheet.tag('P', () =>
    sheet.put('small', [...shop.address, shop.phone, shop.email].join(' · '), { y: top + 19 }),
  )
  sheet.down(8)
  sheet.rule(INK.ink, 0.8)
  sheet.down(22)
  sheet.heading(`Quote ${quoteTitle(document)}`, 1)
  if (quote.request.title) sheet.paragraph(quote.request.title)
  sheet.down(8)

  const { current, company, contact, shipTo } = quote
  const facts: Fact[] = [
    ['Issued', dateText(issuedOn)],
    ['Valid until', current.validUntil ? dateText(current.validUntil) : 'not yet sent'],
    ['Revision', revisionText(document)],
    ['Your request', quote.request.number],
    ['For', company.name],
    ['Attention', `${contact.name}, ${contact.email}`],
    ['Ship to', [shipTo.address, shipTo.region].filter(Boolean).join(', ')],
  ]
  factColumns(sheet, facts)
  if (current.note) {
    sheet.down(4)
    sheet.paragraph(current.note)
  }
}

function revisionText({ quote }: QuoteDocument): string {
  const { letter } = quote.current
  const letters = quote.revisions.map((entry) => entry.letter)
  const earlier = letters.filter(
    (other) => other.length < letter.length || (other.length === letter.length && other < letter),
  )
  return earlier.length === 0 ? `${letter}, the first` : `${letter}, in place of ${earlier.join(', ')}`
}
