import type { AnswerOf, BodyOf, ParamsOf } from '../../../shared/contracts/operations.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { pricedQuote } from '../../../shared/contracts/pricing.ts'
import { revisionName } from '../../../shared/quoting/numbering.ts'
import { answerFault } from '../../../shared/quoting/revisions.ts'
import { write, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import type { Once } from '../../http/once.ts'
import { actorOf, nameForAudit, type Principal } from '../../http/principal.ts'
import { moneyText } from '../../money-and-dates.ts'
import { createOrder } from '../orders/orders.service.ts'
import { enqueueMail } from '../outbox/outbox.service.ts'
import { followQuote } from '../requests/requests.service.ts'
import type { QuoteParts } from './quotes.map.ts'
import { staleRevisions, type RevisionRow } from './quotes.repo.ts'
import { readQuote, visibleQuote } from './quotes.service.ts'
import { checkMove, moveRevision, revisionOf } from './revision-moves.ts'

type At = ParamsOf<'acceptRevision'>

/** The revision, when it can still be answered; the customer is told why not. */
function answerable(parts: QuoteParts, letter: string, now: string): RevisionRow {
  const row = revisionOf(parts, letter)
  const fault = answerFault(row, now)
  return fault ? fail('not-allowed-now', `It cannot be answered: ${fault}.`) : row
}

/** Accepted under own name: an order, letters to both sides, and the request is closed. */
export async function acceptRevision(
  deps: Deps,
  principal: Principal,
  { id, letter }: At,
  { name }: BodyOf<'acceptRevision'>,
  once: Once,
): Promise<AnswerOf<'acceptRevision'>> {
  const at = deps.clock().toISOString()
  const who = principal.kind === 'link' ? `${name} (by the private link)` : nameForAudit(principal)
  return write(deps.db, async (trx) => {
    const parts = await visibleQuote(trx, principal, id)
    const row = answerable(parts, letter, at)
    const status = checkMove(row, actorOf(principal), 'accept')
    const { quote } = parts
    await moveRevision(trx, quote.number, row, status, { who, at }, { answeredBy: name, answeredAt: at })
    const price = pricedQuote.parse(JSON.parse(row.price))
    const order = await createOrder(trx, {
      ...{ quoteId: id, letter, companyId: quote.companyId, contactId: quote.contactId, title: quote.title },
      ...{ total: price.total, deposit: price.deposit, acceptedBy: name, at },
    })
    await followQuote(trx, quote.requestId, 'close', { actor: 'system', who: 'the desk', at })
    const deposit = moneyText(price.deposit)
    await tellBoth(trx, deps, parts, { letter, acceptedBy: name, order, deposit, at })
    const answer = { order }
    await once(trx, answer)
    return answer
  })
}

interface Accepted {
  letter: string
  acceptedBy: string
  order: { id: string; number: string }
  deposit: string
  at: string
}

async function tellBoth(
  trx: Trx,
  { config, shop }: Deps,
  { quote }: QuoteParts,
  { letter, acceptedBy, order, deposit, at }: Accepted,
): Promise<void> {
  const common = {
    ...{ shop: shop.name, quote: revisionName(quote.number, letter), title: quote.title },
    ...{ order: order.number, acceptedBy, deposit, url: `${config.publicUrl}/orders/${order.id}` },
  }
  const about = { at, quoteId: quote.id, orderId: order.id }
  await enqueueMail(trx, {
    ...about,
    to: quote.contactEmail,
    letter: { kind: 'quote accepted', data: { ...common, name: quote.contactName } },
  })
  await enqueueMail(trx, {
    ...about,
    to: shop.email,
    letter: { kind: 'quote accepted for shop', data: { ...common, company: quote.companyName } },
  })
}

export async function declineRevision(
  { db, clock }: Deps,
  principal: Principal,
  { id, letter }: At,
  { name, reason }: BodyOf<'declineRevision'>,
): Promise<QuoteDto> {
  const at = clock().toISOString()
  return write(db, async (trx) => {
    const parts = await visibleQuote(trx, principal, id)
    const row = answerable(parts, letter, at)
    const status = checkMove(row, actorOf(principal), 'decline')
    await moveRevision(
      trx,
      parts.quote.number,
      row,
      status,
      { who: name, at },
      {
        ...{ answeredBy: name, answeredAt: at, answerReason: reason },
      },
    )
    return readQuote(trx, principal, id)
  })
}

/** Past its day a price has gone stale. */
export async function expireRevisions({ db, clock }: Deps): Promise<void> {
  const at = clock().toISOString()
  const stale = await staleRevisions(db, at)
  if (stale.length === 0) return
  await write(db, async (trx) => {
    for (const { number, ...row } of await staleRevisions(trx, at)) {
      const status = checkMove(row, 'system', 'expire')
      await moveRevision(trx, number, row, status, { who: 'the desk', at })
    }
  })
}
