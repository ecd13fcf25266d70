import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import {
  accept,
  approve,
  columnLine,
  key,
  openedQuote,
  requestBody,
  send,
  sentQuote,
  submittedRequest,
} from '../support/round.ts'
import { START, startTestApp, type Agent, type TestApp } from '../support/test-app.ts'

type Quote = AnswerOf<'readQuote'>

let app: TestApp
let contractor: Agent
let other: Agent
let estimator: Agent
let admin: Agent
beforeAll(async () => {
  app = await startTestApp()
  contractor = await app.signIn('contractor')
  other = await app.signIn('other')
  estimator = await app.signIn('estimator')
  admin = await app.signIn('admin')
})
afterAll(() => app.stop())

/** Every key of an answer, however deep. */
function keysOf(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(keysOf)
  if (value === null || typeof value !== 'object') return []
  return Object.entries(value).flatMap(([name, inner]) => [name, ...keysOf(inner)])
}
const INTERNAL = /cost|margin|contingency|override|blockers|alternatives$|letters|warnings|basisOfPrice/i

describe('a quote', () => {
  it('opens with what the engine proposes, checked and priced to the last cost line', async () => {
    const quote = await openedQuote(contractor, estimator)
    const { current } = quote
    expect(quote.number).toMatch(/^Q-\d+$/)
    expect(current).toMatchObject({ letter: 'A', status: 'draft', blockers: [] })
    expect(current.lines[0]?.check.verdict).toBe('holds')
    expect(current.lines[0]?.alternatives?.length).toBeGreaterThanOrEqual(5)
    const cost = current.price.lines[0]?.cost
    expect(cost?.lines.length).toBeGreaterThan(5)
    const { subtotal, delivery, tax, total } = current.price
    expect(subtotal.amount + delivery.price.amount + tax.amount.amount).toBe(total.amount)
    // Not sent: for its customer it is not there.
    await contractor.get(`/api/quotes/${quote.id}`).expect(404)
  })

  it('is opened once', async () => {
    const { id } = await submittedRequest(contractor)
    const replies = await Promise.all(
      [1, 2].map(() => estimator.post(`/api/requests/${id}/quote`).set('Idempotency-Key', key())),
    )
    expect(replies.map(({ status }) => status).sort()).toEqual([201, 409])
  })

  it('moves as the estimator edits, and a shape that does not hold cannot be approved', async () => {
    const quote = await openedQuote(contractor, estimator)
    const at = `/api/quotes/${quote.id}/revisions/A`
    const spec = quote.current.lines[0]?.spec
    const edit = (change: object) => ({ lines: [{ ...spec, ...change }], discount: '0', note: '' })
    const tried = await estimator
      .post(`${at}/try`)
      .send(edit({ section: 'w4x13' }))
      .expect(200)
    const weak = (tried.body as Quote).current
    expect(weak.lines[0]).toMatchObject({ spec: { section: 'W4X13' }, check: { verdict: 'fails' } })
    expect(weak.blockers?.join()).toMatch(/A1 does not hold/)
    // Trying keeps nothing.
    const kept = await estimator.get(`/api/quotes/${quote.id}`).expect(200)
    expect((kept.body as Quote).current).toEqual(quote.current)
    const version = `"${quote.current.version}"`
    const put = await estimator
      .put(at)
      .set('If-Match', version)
      .send(edit({ section: 'W4X13' }))
      .expect(200)
    const next = `"${(put.body as Quote).current.version}"`
    const refused = await estimator.post(`${at}/approve`).set('If-Match', next).expect(409)
    expect((refused.body as { detail: string }).detail).toMatch(/does not hold/)
    await estimator.put(at).set('If-Match', version).send(edit({})).expect(412)
    const unknown = await estimator
      .post(`${at}/try`)
      .send(edit({ section: 'W99X1' }))
      .expect(422)
    expect(unknown.body).toMatchObject({ errors: [{ path: 'lines.0.section' }] })
    const dearer = await estimator
      .post(`${at}/try`)
      .send(edit({ overrides: [{ item: 'margin', value: '0.3', reason: 'rush' }], section: 'W8X31' }))
      .expect(200)
    const { current } = dearer.body as Quote
    expect(current.price.lines[0]?.cost?.marginOverridden).toMatchObject({ computed: '0.18', reason: 'rush' })
  })

  it('is sent with a document, and from then on never changes', async () => {
    const quote = await sentQuote(contractor, estimator)
    expect(quote.current).toMatchObject({ status: 'sent' })
    expect(quote.letters?.map(({ subject }) => subject)).toEqual([expect.stringContaining(quote.number)])
    const document = await contractor
      .get(`/api/quotes/${quote.id}/revisions/A/document.pdf`)
      .buffer(true)
      .parse((res, done) => {
        const chunks: Buffer[] = []
        res.on('data', (chunk: Buffer) => chunks.push(chunk))
        res.on('end', () => done(null, Buffer.concat(chunks)))
      })
      .expect(200)
    expect((document.body as Buffer).subarray(0, 5).toString()).toBe('%PDF-')
    expect(document.headers['content-disposition']).toMatch(/^attachment; filename="Q-\d+_A.pdf"/)
    const { db } = app.deps
    const change = (set: object) =>
      db.updateTable('revisions').set(set).where('quoteId', '=', quote.id).execute()
    await expect(change({ total: 1 })).rejects.toThrow(/never changes/)
    await expect(change({ price: '{}' })).rejects.toThrow(/never changes/)
    await expect(db.deleteFrom('revisions').where('quoteId', '=', quote.id).execute()).rejects.toThrow(
      /never deleted/,
    )
    const edit = { lines: [quote.current.lines[0]?.spec], discount: '0', note: '' }
    await estimator.put(`/api/quotes/${quote.id}/revisions/A`).set('If-Match', '"3"').send(edit).expect(409)
  })

  it('never shows its customer cost, margin or what the shop keeps to itself', async () => {
    const quote = await sentQuote(contractor, estimator)
    const seen = await contractor.get(`/api/quotes/${quote.id}`).expect(200)
    const allowed = new Set(['warnings'])
    const leaked = keysOf((seen.body as Quote).current.price).filter((name) => INTERNAL.test(name))
    expect(leaked).toEqual([])
    const all = keysOf(seen.body).filter((name) => INTERNAL.test(name) && !allowed.has(name))
    expect(all).toEqual([])
    expect((seen.body as Quote).current.approvedBy).toBeNull()
    const proposed = await contractor.post('/api/proposals').send(columnLine()).expect(200)
    expect(keysOf((proposed.body as { price: unknown }).price).filter((name) => INTERNAL.test(name))).toEqual(
      [],
    )
    const shown = await estimator.post('/api/proposals').send(columnLine()).expect(200)
    expect(keysOf((shown.body as { price: unknown }).price)).toContain('margin')
    await other.get(`/api/quotes/${quote.id}`).expect(404)
    await other.get(`/api/quotes/${quote.id}/revisions/A/document.pdf`).expect(404)
  })

  it('is revised: B is sent, A is superseded and cannot be accepted', async () => {
    const first = await sentQuote(contractor, estimator)
    const revised = await estimator
      .post(`/api/quotes/${first.id}/revisions`)
      .set('Idempotency-Key', key())
      .expect(201)
    const draft = revised.body as Quote
    expect(draft.current).toMatchObject({ letter: 'B', status: 'draft' })
    const seen = await contractor.get(`/api/quotes/${first.id}`).expect(200)
    expect((seen.body as Quote).current.letter).toBe('A')
    const second = await send(estimator, await approve(estimator, draft))
    expect(second.revisions.map(({ status }) => status)).toEqual(['superseded', 'sent'])
    const late = await contractor
      .post(`/api/quotes/${first.id}/revisions/A/accept`)
      .set('Idempotency-Key', key())
      .send({ name: 'Maren Tessell', cautionsRead: true })
      .expect(409)
    expect((late.body as { detail: string }).detail).toMatch(/newer revision/)
    await accept(contractor, second)
  })

  it('is accepted under own name with the cautions read, once, while its price holds', async () => {
    const quote = await sentQuote(contractor, estimator)
    const at = `/api/quotes/${quote.id}/revisions/A/accept`
    const unread = await contractor
      .post(at)
      .set('Idempotency-Key', key())
      .send({ name: 'M', cautionsRead: false })
      .expect(422)
    expect(unread.body).toMatchObject({ errors: [{ path: 'cautionsRead' }] })
    await other.post(at).set('Idempotency-Key', key()).send({ name: 'Bram', cautionsRead: true }).expect(404)
    await estimator
      .post(at)
      .set('Idempotency-Key', key())
      .send({ name: 'Idris', cautionsRead: true })
      .expect(403)
    app.setClock('2026-03-24T00:00:01.000Z')
    const again = await app.signIn('contractor')
    const stale = await again
      .post(at)
      .set('Idempotency-Key', key())
      .send({ name: 'Maren', cautionsRead: true })
      .expect(409)
    expect((stale.body as { detail: string }).detail).toMatch(/stale/)
    app.setClock(START)
    const { id } = await accept(contractor, quote)
    await contractor
      .post(at)
      .set('Idempotency-Key', key())
      .send({ name: 'Maren', cautionsRead: true })
      .expect(409)
    const order = await contractor.get(`/api/orders/${id}`).expect(200)
    expect(order.body).toMatchObject({ status: 'awaiting deposit', acceptedBy: 'Maren Tessell' })
    expect((order.body as AnswerOf<'readOrder'>).deposit.due).toEqual(quote.current.price.deposit)
    await other.get(`/api/orders/${id}`).expect(404)
    const request = await contractor.get(`/api/requests/${quote.request.id}`).expect(200)
    expect(request.body).toMatchObject({ status: 'closed' })
  })

  it('opens by its private link alone, and is accepted by whoever holds it', async () => {
    const quote = await sentQuote(contractor, estimator)
    const elsewhere = await sentQuote(contractor, estimator)
    const letters = await app.deps.db
      .selectFrom('outbox')
      .select('text')
      .where('quoteId', '=', quote.id)
      .execute()
    const token = /\/q#(\S+)/.exec(letters[0]?.text ?? '')?.[1] ?? ''
    const holder = app.stranger().set('Quote-Link', token)
    const seen = await holder.get('/api/quote-link').expect(200)
    expect(seen.body).toMatchObject({ id: quote.id, number: quote.number })
    await holder.get(`/api/quotes/${quote.id}/revisions/A/document.pdf`).expect(200)
    await holder.get(`/api/quotes/${elsewhere.id}/revisions/A/document.pdf`).expect(404)
    await holder.get('/api/requests').expect(401)
    const { id } = await accept(holder, quote, 'Tam Tessell')
    const order = await holder.get(`/api/orders/${id}`).expect(200)
    expect(order.body).toMatchObject({ acceptedBy: 'Tam Tessell' })
  })

  it('above the limit is approved by a second person', async () => {
    const quote = await openedQuote(contractor, estimator, requestBody([columnLine('A1', 120)]))
    expect(quote.current.price.total.amount).toBeGreaterThan(60_000_00)
    const at = `/api/quotes/${quote.id}/revisions/A/approve`
    const refused = await estimator.post(at).set('If-Match', '"1"').expect(409)
    expect((refused.body as { detail: string }).detail).toMatch(/somebody other than who prepared it/)
    await admin.post(at).set('If-Match', '"1"').expect(200)
  })

  it('leaves a trail of who did what', async () => {
    const quote = await sentQuote(contractor, estimator)
    const reply = await admin.get('/api/audit?limit=10').expect(200)
    const { items, chain } = reply.body as AnswerOf<'listAudit'>
    expect(chain).toBe('whole')
    expect(items.map(({ action, record }) => `${record} ${action}`)).toEqual(
      expect.arrayContaining([`${quote.number} A revision sent`, `${quote.number} A revision approved`]),
    )
    expect(items.find(({ action }) => action === 'revision approved')?.who).toMatch(/estimator@/)
  })
})
