import type { ParamsOf } from '../../../shared/contracts/operations.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { money } from '../../../shared/pricing/money.ts'
import { mayMove } from '../../../shared/quoting/may-move.ts'
import { revisionName } from '../../../shared/quoting/numbering.ts'
import { holdsUntil } from '../../../shared/quoting/revisions.ts'
import { write, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import type { Once } from '../../http/once.ts'
import { actorOf, nameForAudit, type Principal } from '../../http/principal.ts'
import { moneyText } from '../../money-and-dates.ts'
import { enqueueMail } from '../outbox/outbox.service.ts'
import { followQuote } from '../requests/requests.service.ts'
import { quoteForCustomer, toQuote, type QuoteParts } from './quotes.map.ts'
import type { RevisionRow } from './quotes.repo.ts'
import { readQuote, visibleQuote } from './quotes.service.ts'
import { checkMove, checkVersion, latestRevision, moveRevision } from './revision-moves.ts'

/** A private link outlives the price, so that the order and its deposit can be seen by it. */
const LINK_DAYS_AFTER = 90
const DAY_MS = 86_400_000

/**
 * Sends an approved revision: from here it never changes. The document is written before the transaction, from the
 * very row that the transaction then finds unchanged.
 */
export async function sendRevision(
  deps: Deps,
  principal: Principal,
  { id, letter }: ParamsOf<'sendRevision'>,
  version: number,
  once: Once,
): Promise<QuoteDto> {
  const parts = await visibleQuote(deps.db, principal, id)
  const row = latestRevision(parts, letter)
  checkMove(row, actorOf(principal), 'send')
  checkVersion(parts, row, version)
  const at = deps.clock().toISOString()
  const validUntil = holdsUntil(at, parts.holdsDays)
  const document = await writeDocument(deps, parts, { ...row, status: 'sent', sentAt: at, validUntil })
  const expires = new Date(Date.parse(validUntil) + LINK_DAYS_AFTER * DAY_MS)
  const token = await deps.links.signQuoteLink(id, parts.quote.companyId, expires)
  const by = { who: nameForAudit(principal), at }
  return write(deps.db, async (trx) => {
    const now = await visibleQuote(trx, principal, id)
    const same = latestRevision(now, letter)
    const status = checkMove(same, actorOf(principal), 'send')
    checkVersion(now, same, version)
    await supersedeOthers(trx, now, by.at)
    await moveRevision(trx, now.quote.number, same, status, by, {
      sentAt: at,
      validUntil,
      documentKey: document.key,
      documentSha256: document.sha256,
    })
    await followQuote(trx, now.quote.requestId, 'markQuoted', { actor: 'system', ...by })
    await mailQuote(trx, deps, now, { ...same, validUntil }, document.key, token, at)
    const dto = await readQuote(trx, principal, id)
    await once(trx, dto)
    return dto
  })
}

async function writeDocument({ press, shop, storage }: Deps, parts: QuoteParts, sent: RevisionRow) {
  const quote = quoteForCustomer(toQuote({ ...parts, current: sent }))
  const { name, address, phone, email, paper, system } = shop
  const details = { name, address, phone, email, paper, system }
  const issuedOn = sent.sentAt ?? ''
  return storage.put(await press.renderQuoteDocument({ quote, shop: details, issuedOn }))
}

async function supersedeOthers(
  trx: Trx,
  { quote, revisions, current }: QuoteParts,
  at: string,
): Promise<void> {
  for (const row of revisions) {
    if (row.id === current.id || !mayMove('revision', 'system', row.status, 'supersede')) continue
    await moveRevision(trx, quote.number, row, 'superseded', { who: 'the desk', at })
  }
}

async function mailQuote(
  trx: Trx,
  { config, shop }: Deps,
  { quote }: QuoteParts,
  row: RevisionRow,
  documentKey: string,
  token: string,
  at: string,
): Promise<void> {
  const name = revisionName(quote.number, row.letter)
  const total = money(row.total, row.currency)
  await enqueueMail(trx, {
    to: quote.contactEmail,
    at,
    quoteId: quote.id,
    attachment: { key: documentKey, fileName: `${name}.pdf`, contentType: 'application/pdf' },
    letter: {
      kind: 'quote sent',
      data: {
        name: quote.contactName,
        shop: shop.name,
        quote: name,
        title: quote.title,
        total: moneyText(total),
        validUntil: row.validUntil ?? '',
        note: row.note,
        url: `${config.publicUrl}/q#${token}`,
      },
    },
  })
}
