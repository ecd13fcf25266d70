import type { AnswerOf, BodyInputOf } from '../../shared/contracts/operations.ts'
import type { Agent } from './test-app.ts'

type Request = AnswerOf<'createRequest'>
type Quote = AnswerOf<'readQuote'>

export const key = () => crypto.randomUUID()

/** A column as a contractor would describe it. */
export function columnLine(mark = 'A1', quantity = 4): BodyInputOf<'createRequest'>['lines'][number] {
  return {
    mark,
    quantity,
    method: 'LRFD',
    height: 6000,
    ends: { strong: { bottom: 'pinned', top: 'pinned' }, weak: { bottom: 'pinned', top: 'pinned' } },
    braces: [{ height: 3000, holds: 'weak', stopsTwist: true }],
    loads: { dead: 180_000, live: 260_000 },
  }
}

export function requestBody(lines = [columnLine()]): BodyInputOf<'createRequest'> {
  return {
    title: 'Ferry hall, north wing',
    shipTo: { address: '3 Quay Road, Easthaven', region: 'Eastmark', km: 60 },
    neededBy: '2026-05-04',
    notes: '',
    lines,
  }
}

export async function submittedRequest(contractor: Agent, body = requestBody()): Promise<Request> {
  const made = await contractor.post('/api/requests').set('Idempotency-Key', key()).send(body).expect(201)
  const { id, version } = made.body as Request
  const sent = await contractor.post(`/api/requests/${id}/submit`).set('If-Match', `"${version}"`).expect(200)
  return sent.body as Request
}

export async function openedQuote(contractor: Agent, estimator: Agent, body = requestBody()): Promise<Quote> {
  const { id } = await submittedRequest(contractor, body)
  const quote = await estimator.post(`/api/requests/${id}/quote`).set('Idempotency-Key', key()).expect(201)
  return quote.body as Quote
}

export async function approve(estimator: Agent, { id, current }: Quote): Promise<Quote> {
  const reply = await estimator
    .post(`/api/quotes/${id}/revisions/${current.letter}/approve`)
    .set('If-Match', `"${current.version}"`)
    .expect(200)
  return reply.body as Quote
}

export async function send(estimator: Agent, { id, current }: Quote): Promise<Quote> {
  const reply = await estimator
    .post(`/api/quotes/${id}/revisions/${current.letter}/send`)
    .set('If-Match', `"${current.version}"`)
    .set('Idempotency-Key', key())
    .expect(200)
  return reply.body as Quote
}

export async function sentQuote(contractor: Agent, estimator: Agent, body = requestBody()): Promise<Quote> {
  return send(estimator, await approve(estimator, await openedQuote(contractor, estimator, body)))
}

export async function accept(
  caller: Agent,
  { id, current }: Quote,
  name = 'Maren Tessell',
): Promise<{ id: string }> {
  const reply = await caller
    .post(`/api/quotes/${id}/revisions/${current.letter}/accept`)
    .set('Idempotency-Key', key())
    .send({ name, cautionsRead: true })
    .expect(201)
  return (reply.body as AnswerOf<'acceptRevision'>).order
}
