import { moveFault, statusAfter } from '../../../shared/quoting/may-move.ts'
import type { ActionOf } from '../../../shared/quoting/moves.ts'
import { revisionName } from '../../../shared/quoting/numbering.ts'
import type { Actor, RevisionStatus } from '../../../shared/quoting/statuses.ts'
import type { Trx } from '../../db/open-database.ts'
import { fail, notFound } from '../../errors.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { toQuote, type QuoteParts } from './quotes.map.ts'
import { updateRevision, type RevisionRow } from './quotes.repo.ts'

/** The latest revision is the one that things are done to; an older one stands as it is. */
export function latestRevision({ current }: QuoteParts, letter: string): RevisionRow {
  if (current.letter === letter) return current
  return fail('not-allowed-now', `Revision ${current.letter} has taken the place of ${letter}.`)
}

export function revisionOf({ revisions }: QuoteParts, letter: string): RevisionRow {
  return revisions.find((row) => row.letter === letter) ?? notFound('revision')
}

export function checkMove(row: RevisionRow, actor: Actor, action: ActionOf<'revision'>): RevisionStatus {
  const fault = moveFault('revision', actor, row.status, action)
  if (fault === 'role') fail('forbidden', 'This is not for your role.')
  if (fault) fail('not-allowed-now', `Revision ${row.letter} is ${row.status}.`)
  return statusAfter('revision', actor, row.status, action) ?? row.status
}

/** A write names the version that it read. */
export function checkVersion(parts: QuoteParts, row: RevisionRow, version: number): void {
  if (row.version === version) return
  fail('stale-version', 'Somebody changed it since you read it.', { current: toQuote(parts) })
}

interface By {
  who: string
  at: string
}

type Change = Partial<Omit<RevisionRow, 'id' | 'quoteId' | 'version' | 'status'>>

/** Writes a move of a revision and its place in the audit trail. */
export async function moveRevision(
  trx: Trx,
  number: string,
  row: RevisionRow,
  status: RevisionStatus,
  by: By,
  change: Change = {},
): Promise<void> {
  await updateRevision(trx, row.id, { ...change, status, version: row.version + 1 })
  const { lines: _, price: __, blockers: ___, ...shown } = change
  await recordAudit(trx, {
    ...by,
    action: `revision ${status}`,
    record: revisionName(number, row.letter),
    before: { status: row.status, total: row.total },
    after: { status, ...shown },
  })
}
