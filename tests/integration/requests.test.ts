import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { columnLine, key, requestBody, submittedRequest } from '../support/round.ts'
import { startTestApp, type Agent, type TestApp } from '../support/test-app.ts'

let app: TestApp
let contractor: Agent
let other: Agent
let estimator: Agent
beforeAll(async () => {
  app = await startTestApp()
  contractor = await app.signIn('contractor')
  other = await app.signIn('other')
  estimator = await app.signIn('estimator')
})
afterAll(() => app.stop())

describe('a request', () => {
  it('is kept as a draft that the shop does not see, edited, and submitted', async () => {
    const made = await contractor
      .post('/api/requests')
      .set('Idempotency-Key', key())
      .send(requestBody())
      .expect(201)
    const draft = made.body as AnswerOf<'createRequest'>
    expect(draft.status).toBe('draft')
    expect(draft.lines[0]?.offered?.section).toBeTruthy()
    expect(draft.indicativeTotal?.amount).toBeGreaterThan(0)
    await estimator.get(`/api/requests/${draft.id}`).expect(404)
    const changed = await contractor
      .put(`/api/requests/${draft.id}`)
      .set('If-Match', `"${draft.version}"`)
      .send({ ...requestBody([columnLine('A1', 8)]), title: 'Ferry hall' })
      .expect(200)
    expect(changed.body).toMatchObject({ title: 'Ferry hall', version: 2 })
    const stale = await contractor
      .put(`/api/requests/${draft.id}`)
      .set('If-Match', `"${draft.version}"`)
      .send(requestBody())
      .expect(412)
    expect(stale.body).toMatchObject({ type: 'stale-version', current: { title: 'Ferry hall' } })
    await contractor.put(`/api/requests/${draft.id}`).send(requestBody()).expect(428)
    await contractor.post(`/api/requests/${draft.id}/submit`).set('If-Match', '"2"').expect(200)
    await estimator.get(`/api/requests/${draft.id}`).expect(200)
    await contractor.put(`/api/requests/${draft.id}`).set('If-Match', '"3"').send(requestBody()).expect(409)
  })

  it('of another company is not there', async () => {
    const { id } = await submittedRequest(contractor)
    await other.get(`/api/requests/${id}`).expect(404)
    await other.post(`/api/requests/${id}/withdraw`).expect(404)
    const mine = await other.get('/api/requests').expect(200)
    expect((mine.body as { items: unknown[] }).items).toEqual([])
  })

  it('is made once however often it is sent with one key, and another body is refused', async () => {
    const once = key()
    const first = await contractor
      .post('/api/requests')
      .set('Idempotency-Key', once)
      .send(requestBody())
      .expect(201)
    const again = await contractor
      .post('/api/requests')
      .set('Idempotency-Key', once)
      .send(requestBody())
      .expect(201)
    expect(again.body).toEqual(first.body)
    const reuse = await contractor
      .post('/api/requests')
      .set('Idempotency-Key', once)
      .send(requestBody([columnLine('B1')]))
      .expect(409)
    expect(reuse.body).toMatchObject({ type: 'idempotency-reuse' })
    const twins = key()
    const both = await Promise.all(
      [1, 2].map(() => contractor.post('/api/requests').set('Idempotency-Key', twins).send(requestBody())),
    )
    expect(both.map(({ status }) => status)).toEqual([201, 201])
    expect((both[0]?.body as { id: string }).id).toBe((both[1]?.body as { id: string }).id)
  })

  it('names every field that is wrong', async () => {
    const reply = await contractor
      .post('/api/requests')
      .set('Idempotency-Key', key())
      .send({ ...requestBody([{ ...columnLine(), quantity: 0 }]), colour: 'red' })
      .expect(422)
    const paths = (reply.body as { errors: { path: string }[] }).errors.map(({ path }) => path)
    expect(paths).toEqual(expect.arrayContaining(['lines.0.quantity', 'colour']))
    const region = { ...requestBody(), shipTo: { address: 'Far', region: 'Nowhere', km: 10 } }
    const made = await contractor.post('/api/requests').set('Idempotency-Key', key()).send(region).expect(201)
    const { id } = made.body as { id: string }
    const refused = await contractor.post(`/api/requests/${id}/submit`).set('If-Match', '"1"').expect(422)
    expect(refused.body).toMatchObject({ errors: [{ path: 'shipTo.region' }] })
  })

  it('is listed newest first, page by page, and found by a part of its words', async () => {
    type Page = AnswerOf<'listRequests'>
    for (const title of ['Granary', 'Boathouse 100%', 'Boathouse']) {
      await contractor
        .post('/api/requests')
        .set('Idempotency-Key', key())
        .send({ ...requestBody(), title })
        .expect(201)
    }
    const first = (await contractor.get('/api/requests?limit=2').expect(200)).body as Page
    expect(first.items.map(({ title }) => title)).toEqual(['Boathouse', 'Boathouse 100%'])
    const rest = (await contractor.get(`/api/requests?limit=50&cursor=${first.nextCursor}`).expect(200))
      .body as Page
    expect(rest.items[0]?.title).toBe('Granary')
    const ids = [...first.items, ...rest.items].map(({ id }) => id)
    expect(new Set(ids).size).toBe(ids.length)
    const found = (await contractor.get('/api/requests?q=boathouse').expect(200)).body as Page
    expect(found.items).toHaveLength(2)
    const literal = (await contractor.get(`/api/requests?q=${encodeURIComponent('100%')}`).expect(200))
      .body as Page
    expect(literal.items.map(({ title }) => title)).toEqual(['Boathouse 100%'])
    await contractor.get('/api/requests?cursor=nonsense').expect(422)
  })
})
