import { randomUUID } from 'node:crypto'
import type { AnswerOf, BodyOf, QueryOf } from '../../../shared/contracts/operations.ts'
import type { RequestDto } from '../../../shared/contracts/requests.ts'
import { moveFault, statusAfter } from '../../../shared/quoting/may-move.ts'
import type { ActionOf } from '../../../shared/quoting/moves.ts'
import type { Actor } from '../../../shared/quoting/statuses.ts'
import { nextNumber } from '../../db/counters.repo.ts'
import { pageFrom, readCursor } from '../../db/cursor.ts'
import { write, type Reader, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail, notFound } from '../../errors.ts'
import type { Once } from '../../http/once.ts'
import { actorOf, isShop, nameForAudit, personOf, type Principal } from '../../http/principal.ts'
import { taxRateOf } from '../../shop.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { enqueueMail } from '../outbox/outbox.service.ts'
import { currentBook } from '../price-books/price-books.service.ts'
import { linesOf, toRequest, toSummary, type KeptLine } from './requests.map.ts'
import { findRequest, findRequests, insertRequest, updateRequest, type RequestRow } from './requests.repo.ts'

type Body = BodyOf<'createRequest'>

export async function listRequests(
  { db }: Deps,
  principal: Principal,
  { limit, cursor, q, status }: QueryOf<'listRequests'>,
): Promise<AnswerOf<'listRequests'>> {
  const companyId = personOf(principal).companyId ?? undefined
  const rows = await findRequests(db, {
    companyId,
    status,
    text: q,
    cursor: readCursor(cursor),
    limit: limit + 1,
  })
  return pageFrom(rows, limit, (row) => ({ at: row.createdAt, id: row.id }), toSummary)
}

/** A request as far as the caller may know of it: a contractor of their own company's, the shop of those submitted. */
async function visible(db: Reader, principal: Principal, id: string): Promise<RequestRow> {
  const row = await findRequest(db, id)
  const own = principal.kind === 'person' && principal.companyId === row?.companyId
  if (!row || !(own || (isShop(principal) && row.status !== 'draft'))) return notFound('request')
  return row
}

export async function readRequest({ db }: Deps, principal: Principal, id: string): Promise<RequestDto> {
  return toRequest(await visible(db, principal, id))
}

/** What the engine offers for each line at today's book; null for a line that it has nothing for. */
async function offersFor(deps: Deps, body: Body): Promise<{ lines: KeptLine[]; total: number | null }> {
  const book = await currentBook(deps.db, deps.clock())
  const offers = await deps.engine.run('offer', { requirements: body.lines, book })
  const lines = body.lines.map((requirement, index): KeptLine => {
    const offered = offers[index] ?? null
    return { id: randomUUID(), position: index + 1, requirement, offered }
  })
  const prices = lines.map(
    ({ offered, requirement }) => offered && offered.unitPrice.amount * requirement.quantity,
  )
  const total = prices.reduce<number | null>(
    (sum, one) => (sum === null || one === null ? null : sum + one),
    0,
  )
  return { lines, total }
}

function bodyColumns(body: Body, { lines, total }: Awaited<ReturnType<typeof offersFor>>) {
  return {
    title: body.title,
    shipTo: JSON.stringify(body.shipTo),
    neededBy: body.neededBy,
    notes: body.notes,
    lines: JSON.stringify(lines),
    marks: lines.length,
    pieces: body.lines.reduce((sum, line) => sum + line.quantity, 0),
    indicativeTotal: total,
  }
}

function checkMarks({ lines }: Body): void {
  const issues = lines.flatMap(({ mark, height }, index) => {
    const first = lines.findIndex((other) => other.mark.toUpperCase() === mark.toUpperCase())
    return [
      ...(first < index
        ? [{ path: `lines.${index}.mark`, message: `${mark} is already another column` }]
        : []),
      ...(height === undefined ? [{ path: `lines.${index}.height`, message: 'the height in mm' }] : []),
    ]
  })
  if (issues.length > 0) fail('invalid-input', 'Some fields are not right.', { issues })
}

export async function createRequest(
  deps: Deps,
  principal: Principal,
  body: Body,
  once: Once,
): Promise<RequestDto> {
  const { personId, companyId } = personOf(principal)
  if (companyId === null) return fail('forbidden', 'A request is made by a customer.')
  checkMarks(body)
  const worked = await offersFor(deps, body)
  const { currency } = await currentBook(deps.db, deps.clock())
  const at = deps.clock().toISOString()
  return write(deps.db, async (trx) => {
    const id = randomUUID()
    const number = await nextNumber(trx, 'request')
    await insertRequest(trx, {
      ...{ id, number, companyId, contactId: personId, currency },
      ...bodyColumns(body, worked),
      ...{ version: 1, status: 'draft', reason: null, createdAt: at, submittedAt: null },
    })
    await recordAudit(trx, {
      at,
      who: nameForAudit(principal),
      action: 'request saved',
      record: number,
      after: body,
    })
    const dto = toRequest(await visible(trx, principal, id))
    await once(trx, dto)
    return dto
  })
}

export async function editRequest(
  deps: Deps,
  principal: Principal,
  id: string,
  version: number,
  body: Body,
): Promise<RequestDto> {
  checkMarks(body)
  const worked = await offersFor(deps, body)
  const at = deps.clock().toISOString()
  return write(deps.db, async (trx) => {
    const row = await visible(trx, principal, id)
    allowed(row, actorOf(principal), 'edit')
    sameVersion(row, version)
    await updateRequest(trx, id, { ...bodyColumns(body, worked), version: version + 1 })
    const before = { ...toRequest(row), lines: linesOf(row).map(({ requirement }) => requirement) }
    await recordAudit(trx, {
      at,
      who: nameForAudit(principal),
      action: 'request changed',
      record: row.number,
      before: { title: before.title, shipTo: before.shipTo, notes: before.notes, lines: before.lines },
      after: body,
    })
    return toRequest(await visible(trx, principal, id))
  })
}

function allowed(row: RequestRow, actor: Actor, action: ActionOf<'request'>): void {
  const fault = moveFault('request', actor, row.status, action)
  if (fault === 'role') fail('forbidden', 'This is not for your role.')
  if (fault) fail('not-allowed-now', `The request is ${row.status}.`)
}

function sameVersion(row: RequestRow, version: number): void {
  if (row.version === version) return
  fail('stale-version', 'Somebody changed it since you read it.', { current: toRequest(row) })
}

interface Move {
  actor: Actor
  who: string
  at: string
  reason?: string
}

/** Moves a request by the table; refuses what the table does not have. */
async function move(trx: Trx, row: RequestRow, action: ActionOf<'request'>, by: Move): Promise<void> {
  allowed(row, by.actor, action)
  const status = statusAfter('request', by.actor, row.status, action) ?? row.status
  const { reason, at } = by
  await updateRequest(trx, row.id, {
    ...{ status, version: row.version + 1 },
    ...(reason === undefined ? {} : { reason }),
    ...(action === 'submit' ? { submittedAt: at } : {}),
  })
  await recordAudit(trx, {
    at,
    who: by.who,
    action: `request ${status}`,
    record: row.number,
    before: { status: row.status },
    after: { status, ...(reason === undefined ? {} : { reason }) },
  })
}

export async function submitRequest(
  deps: Deps,
  principal: Principal,
  id: string,
  version: number,
): Promise<RequestDto> {
  const at = deps.clock().toISOString()
  const { name, email } = personOf(principal)
  return write(deps.db, async (trx) => {
    const row = await visible(trx, principal, id)
    allowed(row, actorOf(principal), 'submit')
    sameVersion(row, version)
    const { shipTo } = toRequest(row)
    if (taxRateOf(deps.shop, shipTo.region) === undefined) {
      const known = deps.shop.taxRegions.map(({ region }) => region).join(', ')
      const message = `the shop has no tax rate for it; it delivers to ${known}`
      fail('invalid-input', 'The ship-to address is not one that the shop can tax.', {
        issues: [{ path: 'shipTo.region', message }],
      })
    }
    await move(trx, row, 'submit', { actor: 'contractor', who: nameForAudit(principal), at })
    await enqueueMail(trx, {
      to: email,
      at,
      letter: {
        kind: 'request received',
        data: {
          name,
          shop: deps.shop.name,
          number: row.number,
          title: row.title,
          marks: row.marks,
          pieces: row.pieces,
          url: `${deps.config.publicUrl}/requests/${id}`,
        },
      },
    })
    return toRequest(await visible(trx, principal, id))
  })
}

export async function withdrawRequest(deps: Deps, principal: Principal, id: string): Promise<RequestDto> {
  return moveVisible(deps, principal, id, 'withdraw')
}

export async function declineRequest(
  deps: Deps,
  principal: Principal,
  id: string,
  reason: string,
): Promise<RequestDto> {
  return moveVisible(deps, principal, id, 'decline', reason)
}

async function moveVisible(
  { db, clock }: Deps,
  principal: Principal,
  id: string,
  action: ActionOf<'request'>,
  reason?: string,
): Promise<RequestDto> {
  const by = { actor: actorOf(principal), who: nameForAudit(principal), at: clock().toISOString() }
  return write(db, async (trx) => {
    const row = await visible(trx, principal, id)
    await move(trx, row, action, reason === undefined ? by : { ...by, reason })
    return toRequest(await visible(trx, principal, id))
  })
}

/** For the quote that answers it: the request as the shop sees it. */
export async function requestForQuote(db: Reader, principal: Principal, id: string): Promise<RequestDto> {
  return toRequest(await visible(db, principal, id))
}

/** The request itself, whoever asks: for a quote of it that they may see. */
export async function requestOfQuote(db: Reader, id: string): Promise<RequestDto & { contactId: string }> {
  const row = (await findRequest(db, id)) ?? notFound('request')
  return { ...toRequest(row), contactId: row.contactId }
}

/** Taken into review, quoted and closed as its quote goes on. A later revision finds it quoted already. */
export async function followQuote(
  trx: Trx,
  id: string,
  action: 'review' | 'markQuoted' | 'close',
  by: Move,
): Promise<void> {
  const row = (await findRequest(trx, id)) ?? notFound('request')
  if (action === 'markQuoted' && row.status === 'quoted') return
  await move(trx, row, action, by)
}
