import { sql } from 'kysely'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { DEMO_PASSWORD } from '../../seeds/demo/people.ts'
import { START, startTestApp, type TestApp } from '../support/test-app.ts'

let app: TestApp
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.stop())

const later = (minutes: number) => new Date(Date.parse(START) + minutes * 60_000).toISOString()

describe('signing in', () => {
  it('opens a session by a cookie that scripts and other sites cannot read', async () => {
    const reply = await app
      .stranger()
      .post('/api/session')
      .send({ email: 'Contractor@plumbrule.example', password: DEMO_PASSWORD })
      .expect(201)
    expect(reply.body).toMatchObject({ demo: true, person: { role: 'contractor' } })
    expect(String(reply.headers['set-cookie'])).toMatch(/HttpOnly; SameSite=Lax/)
    expect(JSON.stringify(reply.body)).not.toMatch(/hash/i)
  })

  it('keeps no token in the store', async () => {
    const agent = app.stranger()
    const reply = await agent
      .post('/api/session')
      .send({ email: 'admin@plumbrule.example', password: DEMO_PASSWORD })
    const token = /plumbrule=([^;]+)/.exec(String(reply.headers['set-cookie']))?.[1] ?? ''
    expect(token.length).toBeGreaterThan(40)
    const rows = await app.deps.db.selectFrom('sessions').selectAll().execute()
    expect(JSON.stringify(rows)).not.toContain(token)
  })

  it('says the same of a wrong password and of nobody', async () => {
    const say = async (email: string) => {
      const reply = await app.stranger().post('/api/session').send({ email, password: 'wrong' }).expect(401)
      const { type, title, detail } = reply.body as Record<string, unknown>
      return { type, title, detail }
    }
    expect(await say('nobody@plumbrule.example')).toEqual(await say('estimator@plumbrule.example'))
  })

  it('makes whoever guesses wait, longer each time, and lets the right one in after', async () => {
    const attempt = (password: string) =>
      app.stranger().post('/api/session').send({ email: 'accounts@plumbrule.example', password })
    for (let count = 0; count < 5; count += 1) await attempt('wrong').expect(401)
    const held = await attempt(DEMO_PASSWORD).expect(429)
    expect(Number(held.headers['retry-after'])).toBeGreaterThan(0)
    app.setClock(later(2))
    await attempt(DEMO_PASSWORD).expect(201)
    app.setClock(START)
  })

  it('ends when it has been idle: the shop after half an hour, a contractor after a day', async () => {
    const [shop, contractor] = await Promise.all([app.signIn('estimator'), app.signIn('contractor')])
    const roleOf = async (agent: typeof shop) => {
      const reply = await agent.get('/api/session').expect(200)
      return (reply.body as { person: { role: string } | null }).person?.role
    }
    app.setClock(later(29))
    expect(await roleOf(shop)).toBe('estimator')
    app.setClock(later(29 + 31))
    expect(await roleOf(shop)).toBeUndefined()
    expect(await roleOf(contractor)).toBe('contractor')
    app.setClock(later(60 + 25 * 60))
    expect(await roleOf(contractor)).toBeUndefined()
    app.setClock(START)
  })

  it('ends when signed out', async () => {
    const agent = await app.signIn('contractor')
    await agent.delete('/api/session').expect(204)
    const reply = await agent.get('/api/session')
    expect((reply.body as { person: unknown }).person).toBeNull()
  })
})

describe('the door', () => {
  it('answers problems as RFC 9457, with unknown fields by name', async () => {
    const reply = await app
      .stranger()
      .post('/api/session')
      .send({ email: 'x', password: 'y', colour: 'red' })
      .expect(422)
    expect(reply.headers['content-type']).toMatch('application/problem+json')
    const paths = (reply.body as { errors: { path: string }[] }).errors.map(({ path }) => path)
    expect(paths.sort()).toEqual(['colour', 'email'])
    expect((reply.body as { requestId: string }).requestId).toBe(reply.headers['x-request-id'])
  })

  it('has a code for what is no JSON, too large, or of another type', async () => {
    const post = (type: string, body: string) =>
      app.stranger().post('/api/session').set('Content-Type', type).send(body)
    expect((await post('application/json', '{').expect(400)).body).toMatchObject({ type: 'not-json' })
    expect((await post('text/plain', 'email').expect(415)).body).toMatchObject({ type: 'unsupported-type' })
    const large = JSON.stringify({ email: 'a'.repeat(3_000_000) })
    expect((await post('application/json', large).expect(413)).body).toMatchObject({ type: 'too-large' })
  })

  it('refuses writes from other sites, and takes them from its own pages and from programs without cookies', async () => {
    const agent = await app.signIn('contractor')
    const leave = () => agent.delete('/api/session')
    await leave().set('Sec-Fetch-Site', 'cross-site').expect(403)
    await leave().set('Sec-Fetch-Site', 'same-site').expect(403)
    await leave().set('Sec-Fetch-Site', '').set('Origin', 'https://elsewhere.example').expect(403)
    await leave().set('Sec-Fetch-Site', '').expect(403)
    await leave().set('Sec-Fetch-Site', '').set('Origin', app.deps.config.publicUrl).expect(204)
    const bare = app.stranger().post('/api/session').set('Sec-Fetch-Site', '')
    await bare.send({ email: 'contractor@plumbrule.example', password: DEMO_PASSWORD }).expect(201)
  })

  it('sends the headers that keep pages to themselves', async () => {
    const { headers } = await app.stranger().get('/healthz').expect(200)
    expect(headers['content-security-policy']).toContain("default-src 'none'")
    expect(headers['content-security-policy']).not.toContain('unsafe')
    expect(headers['x-content-type-options']).toBe('nosniff')
    expect((await app.stranger().get('/api/session')).headers['cache-control']).toBe('no-store')
  })

  it('answers an address that is none, and describes those that are', async () => {
    const reply = await app.stranger().get('/api/nothing').expect(404)
    expect(reply.body).toMatchObject({ type: 'not-found' })
    const api = await app.stranger().get('/api/openapi.json').expect(200)
    const paths = Object.keys((api.body as { paths: object }).paths)
    expect(paths).toContain('/api/quotes/{id}/revisions/{letter}/accept')
  })
})

describe('the audit trail', () => {
  it('cannot be changed or taken from, and shows it when somebody gets around that', async () => {
    const agent = await app.signIn('admin')
    const before = await agent.get('/api/audit').expect(200)
    expect(before.body).toMatchObject({ chain: 'whole' })
    const { db } = app.deps
    await expect(db.updateTable('audit').set({ who: 'nobody' }).execute()).rejects.toThrow(/never changed/)
    await expect(db.deleteFrom('audit').execute()).rejects.toThrow(/never deleted/)
    await sql`DROP TRIGGER audit_is_never_changed`.execute(db)
    await db.updateTable('audit').set({ who: 'somebody else' }).where('id', '=', 1).execute()
    const after = await agent.get('/api/audit').expect(200)
    expect(after.body).toMatchObject({ chain: 'broken' })
  })
})
