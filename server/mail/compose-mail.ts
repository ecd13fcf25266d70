import { CAUTIONS } from '../../shared/quoting/cautions.ts'
import { dateText } from '../money-and-dates.ts'
import type { Letter } from './letters.ts'
import { renderMail, type Mail, type MailParts } from './render-mail.ts'

/** A letter in words, as HTML and as the plain text that says the same. */
export function composeMail(letter: Letter): Mail {
  return renderMail(partsOf(letter))
}

const plural = (count: number, one: string) => `${count} ${one}${count === 1 ? '' : 's'}`

function partsOf(letter: Letter): MailParts {
  switch (letter.kind) {
    case 'request received': {
      const { name, shop, number, title, marks, pieces, url } = letter.data
      return {
        shop,
        subject: `We have your request ${number}`,
        greeting: name,
        paragraphs: [
          `Your request ${number} is with our estimator. You will have the firm quote by e-mail; until then the request can still be withdrawn.`,
        ],
        facts: [
          ['Job', title],
          ['Columns', `${plural(marks, 'mark')}, ${plural(pieces, 'piece')}`],
        ],
        action: { label: 'See the request', url },
      }
    }
    case 'quote sent': {
      const { name, shop, quote, title, total, validUntil, note, url } = letter.data
      return {
        shop,
        subject: `Quote ${quote}: ${title}`,
        greeting: name,
        paragraphs: [
          `Our quote ${quote} is attached: drawings, price, what it is based on, and the calculation of every column.`,
          ...(note ? [note] : []),
          'Open it with the link below to accept or decline it. The link is yours alone: whoever has it can answer for you.',
        ],
        facts: [
          ['Job', title],
          ['Total', total],
          ['Holds until', dateText(validUntil)],
        ],
        action: { label: 'Open the quote', url },
        listTitle: 'Before you accept',
        list: CAUTIONS.map(({ text }) => text),
      }
    }
    case 'quote accepted': {
      const { name, shop, quote, title, order, acceptedBy, deposit, url } = letter.data
      return {
        shop,
        subject: `Order ${order} from quote ${quote}`,
        greeting: name,
        paragraphs: [
          `${acceptedBy} accepted quote ${quote}; it is now order ${order}. The deposit is due: no steel is ordered before it is in.`,
        ],
        facts: [
          ['Job', title],
          ['Deposit', deposit],
        ],
        action: { label: 'Pay the deposit', url },
      }
    }
    case 'quote accepted for shop': {
      const { shop, quote, title, order, acceptedBy, company, deposit, url } = letter.data
      return {
        shop,
        subject: `${quote} accepted: order ${order}`,
        greeting: 'estimating',
        paragraphs: [
          `${acceptedBy} of ${company} accepted quote ${quote}. Order ${order} waits for its deposit.`,
        ],
        facts: [
          ['Job', title],
          ['Deposit', deposit],
        ],
        action: { label: 'See the order', url },
      }
    }
    case 'deposit receipt': {
      const { name, shop, order, title, amount, at, url } = letter.data
      return {
        shop,
        subject: `Receipt: deposit for order ${order}`,
        greeting: name,
        paragraphs: [
          `We have your deposit for order ${order}. The order is released, and its steel is bought next.`,
        ],
        facts: [
          ['Job', title],
          ['Received', amount],
          ['On', dateText(at)],
        ],
        action: { label: 'See the order', url },
      }
    }
    case 'payment failed': {
      const { name, shop, order, title, amount, reason, url } = letter.data
      return {
        shop,
        subject: `The deposit for order ${order} did not go through`,
        greeting: name,
        paragraphs: [
          `The card was not charged: ${reason} Nothing was taken. Try again or use another card; the order waits.`,
        ],
        facts: [
          ['Job', title],
          ['Deposit', amount],
        ],
        action: { label: 'Try again', url },
      }
    }
  }
}
