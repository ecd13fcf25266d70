import fc from 'fast-check'
import { sql } from 'kysely'
import Stripe from 'stripe'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { postToLedger } from '../../server/modules/accounts/ledger.service.ts'
import { handleDueEvents } from '../../server/modules/payments/stripe-events.service.ts'
import { write } from '../../server/db/open-database.ts'
import { accept, key, sentQuote } from '../support/round.ts'
import { startTestApp, type Agent, type TestApp } from '../support/test-app.ts'

/* The desk, Stripe's own SDK, and the local fake of the processor over real HTTP. */

let app: TestApp
let contractor: Agent
let estimator: Agent
let accounts: Agent
beforeAll(async () => {
  app = await startTestApp({ outside: true })
  contractor = await app.signIn('contractor')
  estimator = await app.signIn('estimator')
  accounts = await app.signIn('accounts')
})
afterAll(() => app.stop())

type Order = AnswerOf<'readOrder'>

async function acceptedOrder(): Promise<string> {
  return (await accept(contractor, await sentQuote(contractor, estimator))).id
}

async function pay(orderId: string, idempotencyKey = key()): Promise<string> {
  const reply = await contractor
    .post(`/api/orders/${orderId}/deposit`)
    .set('Idempotency-Key', idempotencyKey)
    .expect(201)
  return (reply.body as AnswerOf<'payDeposit'>).url
}

/** What a payer does on the hosted page; where it sends them. */
async function choose(url: string, outcome: string): Promise<string> {
  const reply = await fetch(url, {
    method: 'POST',
    body: new URLSearchParams({ outcome }),
    redirect: 'manual',
  })
  return reply.headers.get('location') ?? ''
}

async function order(id: string): Promise<Order> {
  return (await contractor.get(`/api/orders/${id}`).expect(200)).body as Order
}

async function until(id: string, holds: (order: Order) => boolean): Promise<Order> {
  for (let tries = 0; tries < 100; tries += 1) {
    const now = await order(id)
    if (holds(now)) return now
    await new Promise((resolve) => setTimeout(resolve, 50))
  }
  throw new Error('it did not come to that in 5 s')
}

async function ledgerOf(orderId: string) {
  return app.deps.db.selectFrom('ledger').selectAll().where('orderId', '=', orderId).execute()
}

async function lettersOf(orderId: string, kind: string): Promise<number> {
  const rows = await app.deps.db
    .selectFrom('outbox')
    .select('id')
    .where('orderId', '=', orderId)
    .where('kind', '=', kind)
    .execute()
  return rows.length
}

/** An event of ours, signed as the processor signs. */
function signed(
  event: object,
  secret = app.deps.config.stripe.webhookSecret,
  at = Math.floor(Date.now() / 1000),
) {
  const payload = JSON.stringify(event)
  const stripe = new Stripe('sk_test_local')
  const header = stripe.webhooks.generateTestHeaderString({ payload, secret, timestamp: at })
  return { payload, header }
}

async function deliver({ payload, header }: { payload: string; header: string }): Promise<number> {
  const reply = await app
    .stranger()
    .post('/api/stripe/events')
    .set('Content-Type', 'application/json')
    .set('Sec-Fetch-Site', 'cross-site')
    .set('Stripe-Signature', header)
    .send(payload)
  return reply.status
}

describe('paying a deposit', () => {
  it('takes a declined card, then one that goes through: one payment, a balanced ledger, a receipt, the order released', async () => {
    const id = await acceptedOrder()
    const url = await pay(id)
    expect(await choose(url, 'decline')).toMatch(/^\/pay\//)
    const failed = await until(id, ({ payments }) => payments[0]?.status === 'failed')
    expect(failed.payments[0]?.failure).toBe('Your card was declined.')
    expect(failed.status).toBe('awaiting deposit')
    // The page is still open: the same checkout, not a second one.
    expect(await pay(id)).toBe(url)
    expect(await choose(url, 'accept')).toBe(`${app.deps.config.publicUrl}/orders/${id}?paid=yes`)
    const paid = await until(id, ({ status }) => status === 'released')
    expect(paid.deposit.paid).toEqual(paid.deposit.due)
    expect(paid.payments).toHaveLength(1)
    const entries = await ledgerOf(id)
    expect(entries.map(({ account, amount }) => [account, amount]).sort()).toEqual([
      ['card clearing', paid.deposit.due.amount],
      ['customer deposits', -paid.deposit.due.amount],
    ])
    expect(await lettersOf(id, 'deposit receipt')).toBe(1)
    expect(await lettersOf(id, 'payment failed')).toBe(1)
    await contractor.post(`/api/orders/${id}/deposit`).set('Idempotency-Key', key()).expect(409)
  })

  it('opens one checkout however often it is asked for', async () => {
    const id = await acceptedOrder()
    const once = key()
    const urls = await Promise.all([pay(id, once), pay(id, once), pay(id), pay(id)])
    expect(new Set(urls).size).toBe(1)
    const rows = await app.deps.db.selectFrom('payments').select('id').where('orderId', '=', id).execute()
    expect(rows).toHaveLength(1)
    await Promise.all([choose(urls[0] ?? '', 'accept'), choose(urls[0] ?? '', 'accept')])
    await until(id, ({ status }) => status === 'released')
    expect(await ledgerOf(id)).toHaveLength(2)
  })

  it('is not believed from the way back alone', async () => {
    const id = await acceptedOrder()
    await pay(id)
    await contractor.get(`/api/orders/${id}?paid=yes`)
    expect((await order(id)).status).toBe('awaiting deposit')
  })
})

describe('events of the processor', () => {
  const event = (type: string, object: string) => ({
    ...{ object: 'event', id: `evt_${key()}`, type, livemode: false, created: 1 },
    data: { object: { id: object } },
  })

  it('count only when signed, of late, and not from the future', async () => {
    const now = Math.floor(Date.now() / 1000)
    const one = event('checkout.session.completed', 'cs_none')
    expect(await deliver(signed(one, 'whsec_wrong'))).toBe(422)
    expect(await deliver(signed(one, undefined, now - 3600))).toBe(422)
    expect(await deliver(signed(one, undefined, now + 3600))).toBe(422)
    expect(await deliver({ payload: JSON.stringify(one), header: '' })).toBe(422)
    const rows = await app.deps.db.selectFrom('stripeEvents').select('id').where('id', '=', one.id).execute()
    expect(rows).toEqual([])
  })

  it('that were kept and not acted on are acted on later', async () => {
    const id = await acceptedOrder()
    const sessionId = (await pay(id)).split('/').at(-1) ?? ''
    const at = new Date().toISOString()
    // As if we had died right after the inbox was written.
    await app.deps.db
      .insertInto('stripeEvents')
      .values({
        ...{ id: `evt_${key()}`, type: 'checkout.session.completed', objectId: sessionId, receivedAt: at },
        ...{ handledAt: null, attempts: 1, nextAt: at, outcome: null },
      })
      .execute()
    await choose(`${app.deps.config.stripe.fakeUrl}/pay/${sessionId}`, 'accept')
    await handleDueEvents(app.deps)
    await until(id, ({ status }) => status === 'released')
    expect(await ledgerOf(id)).toHaveLength(2)
  })

  it('that say less than was asked for settle nothing, and are raised', async () => {
    const id = await acceptedOrder()
    const url = await pay(id)
    await app.deps.db.updateTable('payments').set({ amount: 100 }).where('orderId', '=', id).execute()
    await choose(url, 'accept')
    await new Promise((resolve) => setTimeout(resolve, 1500))
    expect((await order(id)).status).toBe('awaiting deposit')
    const rows = await app.deps.db
      .selectFrom('audit')
      .select('action')
      .where('action', '=', 'payment differs')
      .execute()
    expect(rows.length).toBeGreaterThan(0)
  })

  it('have one effect in whatever order and however often they come', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(
          fc.constantFrom(
            'checkout.session.completed',
            'payment_intent.payment_failed',
            'payment_intent.succeeded',
          ),
          {
            minLength: 1,
            maxLength: 6,
          },
        ),
        async (types) => {
          const id = await acceptedOrder()
          const url = await pay(id)
          const sessionId = url.split('/').at(-1) ?? ''
          const session = await app.deps.stripe.checkout.sessions.retrieve(sessionId)
          await choose(url, 'decline')
          await choose(url, 'accept')
          const about = (type: string) =>
            type.startsWith('payment_intent') ? String(session.payment_intent) : sessionId
          const events = types.map((type) => signed(event(type, about(type))))
          await Promise.all([...events, ...events].map(deliver))
          const paid = await until(id, ({ status }) => status === 'released')
          expect(paid.payments.map(({ status }) => status)).toEqual(['succeeded'])
          expect((await ledgerOf(id)).reduce((sum, { amount }) => sum + amount, 0)).toBe(0)
          expect(await ledgerOf(id)).toHaveLength(2)
          expect(await lettersOf(id, 'deposit receipt')).toBe(1)
        },
      ),
      { numRuns: 8 },
    )
  }, 60_000)
})

describe('accounts', () => {
  it('sees what is held, and a ledger that balances', async () => {
    const id = await acceptedOrder()
    await choose(await pay(id), 'accept')
    await until(id, ({ status }) => status === 'released')
    const { body } = await accounts.get('/api/accounts/summary').expect(200)
    const summary = body as AnswerOf<'readAccounts'>
    expect(summary.sum.amount).toBe(0)
    expect(summary.depositsHeld).toEqual(summary.depositsPaid)
    const deposits = (await accounts.get('/api/accounts/deposits?limit=50').expect(200))
      .body as AnswerOf<'listDeposits'>
    const mine = deposits.items.find((row) => row.order.id === id)
    expect(mine?.paid).toEqual(mine?.due)
    const ledger = (await accounts.get('/api/ledger?account=customer%20deposits').expect(200))
      .body as AnswerOf<'listLedger'>
    expect(ledger.items.every(({ account }) => account === 'customer deposits')).toBe(true)
  })

  it('takes the whole ledger as CSV whose debits equal its credits', async () => {
    const csv = await accounts.get('/api/ledger.csv').expect(200)
    expect(csv.headers['content-type']).toMatch('text/csv')
    const [header, ...rows] = csv.text.trimEnd().split('\r\n')
    expect(header).toBe('date,transaction,account,debit,credit,currency,memo,order')
    const sum = (column: number) =>
      rows.reduce((total, row) => total + Math.round(Number(row.split(',')[column]) * 100), 0)
    expect(sum(3)).toBe(sum(4))
    expect(sum(3)).toBeGreaterThan(0)
  })

  it('keeps a ledger that takes no booking out of balance, no change and no deletion', async () => {
    const { db } = app.deps
    const booking = {
      at: new Date().toISOString(),
      memo: 'x',
      currency: 'USD',
      orderId: null,
      paymentId: null,
    }
    const unbalanced = [
      { account: 'bank', amount: 100 },
      { account: 'revenue', amount: -99 },
    ] as const
    await expect(
      write(db, (trx) => postToLedger(trx, { ...booking, entries: [...unbalanced] })),
    ).rejects.toThrow(/balance/)
    await expect(db.updateTable('ledger').set({ amount: 1 }).execute()).rejects.toThrow(/never changed/)
    await expect(db.deleteFrom('ledger').execute()).rejects.toThrow(/never deleted/)
    const overwrite = sql`INSERT OR REPLACE INTO ledger SELECT * FROM ledger LIMIT 1`.execute(db)
    await expect(overwrite).rejects.toThrow(/never deleted/)
  })
})
