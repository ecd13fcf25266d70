import { randomUUID } from 'node:crypto'
import type { ParamsOf } from '../../../shared/contracts/operations.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { mayMove } from '../../../shared/quoting/may-move.ts'
import { FIRST_LETTER, nextLetter, revisionName } from '../../../shared/quoting/numbering.ts'
import { nextNumber } from '../../db/counters.repo.ts'
import { write, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import type { Once } from '../../http/once.ts'
import { actorOf, nameForAudit, personOf, type Principal } from '../../http/principal.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { companyOf } from '../companies/companies.service.ts'
import { currentBook } from '../price-books/price-books.service.ts'
import { followQuote, requestForQuote } from '../requests/requests.service.ts'
import { linesOf } from './quotes.map.ts'
import { insertQuote, insertRevision } from './quotes.repo.ts'
import { readQuote, visibleQuote } from './quotes.service.ts'
import { checkMove } from './revision-moves.ts'
import { workOut, type WorkColumns } from './work-out.ts'

/** Takes a request into review: a quote whose revision A is what the engine proposes for each line. */
export async function openQuote(
  deps: Deps,
  principal: Principal,
  requestId: string,
  once: Once,
): Promise<QuoteDto> {
  const request = await requestForQuote(deps.db, principal, requestId)
  if (!mayMove('request', actorOf(principal), request.status, 'review')) {
    fail('not-allowed-now', `The request is ${request.status}.`)
  }
  const book = await currentBook(deps.db, deps.clock())
  const company = await companyOf(deps.db, request.company.id)
  const requirements = request.lines.map(({ requirement }) => requirement)
  const lines = await deps.engine.run('beginWork', { requirements, book, km: request.shipTo.km })
  const job = { shipTo: JSON.stringify(request.shipTo), taxCertificate: company.taxCertificate }
  const columns = await workOut(deps, job, book, { lines, discount: '0', note: '' })
  const by = { actor: actorOf(principal), who: nameForAudit(principal), at: deps.clock().toISOString() }
  return write(deps.db, async (trx) => {
    await followQuote(trx, requestId, 'review', by)
    const id = randomUUID()
    const number = await nextNumber(trx, 'quote')
    await insertQuote(trx, { id, number, requestId, companyId: company.id, createdAt: by.at })
    await addRevision(
      trx,
      principal,
      { quoteId: id, number, position: 1, letter: FIRST_LETTER, at: by.at },
      columns,
    )
    const dto = await readQuote(trx, principal, id)
    await once(trx, dto)
    return dto
  })
}

interface NewRevision {
  quoteId: string
  number: string
  position: number
  letter: string
  at: string
}

async function addRevision(
  trx: Trx,
  principal: Principal,
  { number, at, ...of }: NewRevision,
  columns: WorkColumns,
): Promise<void> {
  await insertRevision(trx, {
    ...of,
    ...columns,
    id: randomUUID(),
    status: 'draft',
    version: 1,
    preparedBy: personOf(principal).personId,
    ...{ approvedBy: null, approvedAt: null, sentAt: null, validUntil: null },
    ...{ documentKey: null, documentSha256: null },
    ...{ answeredBy: null, answeredAt: null, answerReason: null },
  })
  await recordAudit(trx, {
    at,
    who: nameForAudit(principal),
    action: 'revision begun',
    record: revisionName(number, of.letter),
    after: { total: columns.total, priceBookVersion: columns.priceBookVersion },
  })
}

/** The next revision: the same work, worked out again with today's price book. The one before stays as it is. */
export async function reviseQuote(
  deps: Deps,
  principal: Principal,
  { id }: ParamsOf<'reviseQuote'>,
  once: Once,
): Promise<QuoteDto> {
  const before = await visibleQuote(deps.db, principal, id)
  checkMove(before.current, actorOf(principal), 'revise')
  const { discount, note } = before.current
  const lines = linesOf(before.current).map(({ requirement, spec, alternatives }) => ({
    requirement,
    alternatives,
    spec: {
      ...spec,
      extras: spec.extras.map((extra) => ({ ...extra, unitCost: extra.unitCost ?? '0' })),
      overrides: spec.overrides ?? [],
    },
  }))
  const book = await currentBook(deps.db, deps.clock())
  const columns = await workOut(deps, before.quote, book, { lines, discount, note })
  return write(deps.db, async (trx) => {
    const { quote, current } = await visibleQuote(trx, principal, id)
    checkMove(current, actorOf(principal), 'revise')
    const next = {
      quoteId: id,
      number: quote.number,
      position: current.position + 1,
      letter: nextLetter(current.letter),
      at: deps.clock().toISOString(),
    }
    await addRevision(trx, principal, next, columns)
    const dto = await readQuote(trx, principal, id)
    await once(trx, dto)
    return dto
  })
}
