import { z } from 'zod'
import type { ParamsOf } from '../../../shared/contracts/operations.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { exact } from '../../../shared/pricing/exact.ts'
import { money, roundToMoney } from '../../../shared/pricing/money.ts'
import { approvalFault } from '../../../shared/quoting/approval.ts'
import { write } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import { actorOf, nameForAudit, personOf, type Principal } from '../../http/principal.ts'
import { readQuote, visibleQuote } from './quotes.service.ts'
import { checkMove, checkVersion, latestRevision, moveRevision } from './revision-moves.ts'
import type { RevisionRow } from './quotes.repo.ts'

type At = ParamsOf<'approveRevision'>
const blockersIn = z.array(z.string())

/** Approves what holds; above the limit by somebody else than who prepared it. */
export async function approveRevision(
  { db, clock, shop }: Deps,
  principal: Principal,
  { id, letter }: At,
  version: number,
): Promise<QuoteDto> {
  const { personId, name } = personOf(principal)
  const at = clock().toISOString()
  return write(db, async (trx) => {
    const parts = await visibleQuote(trx, principal, id)
    const row = latestRevision(parts, letter)
    const status = checkMove(row, actorOf(principal), 'approve')
    checkVersion(parts, row, version)
    const faults = faultsOf(row, shop.approvalLimit, personId)
    if (faults.length > 0) fail('not-allowed-now', `It cannot be approved: ${faults.join('; ')}.`)
    await moveRevision(
      trx,
      parts.quote.number,
      row,
      status,
      { who: nameForAudit(principal), at },
      {
        approvedBy: name,
        approvedAt: at,
      },
    )
    return readQuote(trx, principal, id)
  })
}

function faultsOf(row: RevisionRow, limit: string | null, approver: string): string[] {
  const fault = approvalFault({
    total: money(row.total, row.currency),
    limit: limit === null ? null : roundToMoney(exact(limit), row.currency),
    preparedBy: row.preparedBy,
    approver,
  })
  return [...blockersIn.parse(JSON.parse(row.blockers)), ...(fault ? [fault] : [])]
}

/** Takes a revision back; what was sent of it can no longer be accepted. */
export async function withdrawRevision(
  { db, clock }: Deps,
  principal: Principal,
  { id, letter }: At,
): Promise<QuoteDto> {
  const by = { who: nameForAudit(principal), at: clock().toISOString() }
  return write(db, async (trx) => {
    const parts = await visibleQuote(trx, principal, id)
    const row = latestRevision(parts, letter)
    const status = checkMove(row, actorOf(principal), 'withdraw')
    await moveRevision(trx, parts.quote.number, row, status, by)
    return readQuote(trx, principal, id)
  })
}
