import type { ParamsOf } from '../../../shared/contracts/operations.ts'
import { revisionName } from '../../../shared/quoting/numbering.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import type { FileAnswer } from '../../http/file-answer.ts'
import type { Principal } from '../../http/principal.ts'
import { visibleQuote } from './quotes.service.ts'
import { revisionOf } from './revision-moves.ts'

/** The very document that was sent. */
export async function readQuoteDocument(
  { db, storage }: Deps,
  principal: Principal,
  { id, letter }: ParamsOf<'readQuoteDocument'>,
): Promise<FileAnswer> {
  const parts = await visibleQuote(db, principal, id)
  const { documentKey } = revisionOf(parts, letter)
  if (documentKey === null) return fail('not-allowed-now', 'Its document is written when it is sent.')
  return {
    contentType: 'application/pdf',
    fileName: `${revisionName(parts.quote.number, letter)}.pdf`,
    body: await storage.get(documentKey),
  }
}
