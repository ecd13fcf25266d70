import type { BodyOf, ParamsOf } from '../../../shared/contracts/operations.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { revisionName } from '../../../shared/quoting/numbering.ts'
import { write } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { actorOf, nameForAudit, personOf, type Principal } from '../../http/principal.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { lettersOfQuote } from '../outbox/outbox.service.ts'
import { bookVersion } from '../price-books/price-books.service.ts'
import { linesOf, toQuote } from './quotes.map.ts'
import { updateRevision } from './quotes.repo.ts'
import { readQuote, visibleQuote } from './quotes.service.ts'
import { checkMove, checkVersion, latestRevision } from './revision-moves.ts'
import { editedWork, workOut } from './work-out.ts'

type At = ParamsOf<'editRevision'>
type Body = BodyOf<'editRevision'>

async function workedEdit(deps: Deps, principal: Principal, { id, letter }: At, body: Body) {
  const parts = await visibleQuote(deps.db, principal, id)
  const row = latestRevision(parts, letter)
  checkMove(row, actorOf(principal), 'edit')
  const book = await bookVersion(deps.db, row.priceBookVersion)
  const columns = await workOut(deps, parts.quote, book, editedWork(linesOf(row), body))
  return { parts, row, columns }
}

/** What an edit would come to: verdict and price move, nothing is kept. */
export async function tryRevision(deps: Deps, principal: Principal, at: At, body: Body): Promise<QuoteDto> {
  const { parts, row, columns } = await workedEdit(deps, principal, at, body)
  const letters = await lettersOfQuote(deps.db, at.id)
  return { ...toQuote({ ...parts, current: { ...row, ...columns } }), letters }
}

export async function editRevision(
  deps: Deps,
  principal: Principal,
  at: At,
  version: number,
  body: Body,
): Promise<QuoteDto> {
  const { columns } = await workedEdit(deps, principal, at, body)
  return write(deps.db, async (trx) => {
    const parts = await visibleQuote(trx, principal, at.id)
    const row = latestRevision(parts, at.letter)
    checkMove(row, actorOf(principal), 'edit')
    checkVersion(parts, row, version)
    await updateRevision(trx, row.id, {
      ...columns,
      version: version + 1,
      preparedBy: personOf(principal).personId,
    })
    await recordAudit(trx, {
      at: deps.clock().toISOString(),
      who: nameForAudit(principal),
      action: 'revision changed',
      record: revisionName(parts.quote.number, row.letter),
      before: { total: row.total, specs: linesOf(row).map(({ spec }) => spec) },
      after: { total: columns.total, specs: body.lines },
    })
    return readQuote(trx, principal, at.id)
  })
}
