import { z } from 'zod'
import { requestLine, shipTo, type RequestDto } from '../../../shared/contracts/requests.ts'
import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import { money } from '../../../shared/pricing/money.ts'
import type { RequestRow } from './requests.repo.ts'

const keptLines = z.array(requestLine)
export type KeptLine = z.infer<typeof requestLine>

export function linesOf(row: Pick<RequestRow, 'lines'>): KeptLine[] {
  return keptLines.parse(JSON.parse(row.lines))
}

function common(row: RequestRow) {
  const { id, number, status, title, neededBy, createdAt, submittedAt } = row
  return {
    ...{ id, number, status, title, neededBy, createdAt, submittedAt },
    company: { id: row.companyId, name: row.companyName },
    indicativeTotal: row.indicativeTotal === null ? null : money(row.indicativeTotal, row.currency),
    quote: row.quoteId && row.quoteNumber ? { id: row.quoteId, number: row.quoteNumber } : null,
  }
}

export function toRequest(row: RequestRow): RequestDto {
  const { version, notes, reason } = row
  return {
    ...common(row),
    ...{ version, notes, reason },
    contact: { id: row.contactId, name: row.contactName },
    shipTo: shipTo.parse(JSON.parse(row.shipTo)),
    lines: linesOf(row),
  }
}

export function toSummary(row: RequestRow): AnswerOf<'listRequests'>['items'][number] {
  return { ...common(row), marks: row.marks, pieces: row.pieces }
}
