import { createServer } from 'node:http'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { listen } from '../../server/listen.ts'
import { sweepPayments } from '../../server/modules/payments/sweep-payments.service.ts'
import { createStripe } from '../../server/payments/stripe-client.ts'
import { CardDesk } from '../support/card-desk.ts'
import { freePorts } from '../support/free-ports.ts'
import { START } from '../support/test-app.ts'

/* Opening the hosted page, with the processor as it may be: away, faulty, silent. */

let desk: CardDesk
beforeAll(async () => {
  desk = await CardDesk.start()
})
afterAll(() => desk.stop())

async function paymentsOf(orderId: string) {
  return desk.app.deps.db
    .selectFrom('payments')
    .select(['id', 'status', 'sessionId'])
    .where('orderId', '=', orderId)
    .orderBy('createdAt')
    .orderBy('status')
    .execute()
}

/** The processor is at that port while `work` runs. */
async function withProcessorAt<T>(port: number, work: () => Promise<T>): Promise<T> {
  const { deps } = desk.app
  const usual = deps.stripe
  deps.stripe = createStripe({ stripe: { ...deps.config.stripe, fakeUrl: `http://127.0.0.1:${port}` } })
  try {
    return await work()
  } finally {
    deps.stripe = usual
  }
}

const minutesLater = (minutes: number) => new Date(Date.parse(START) + minutes * 60_000).toISOString()

describe('opening a checkout', () => {
  it.each([
    [49, 409],
    [50, 201],
    [99_999_999, 201],
    [100_000_000, 409],
  ])('of %i minor units answers %i', async (due, status) => {
    const order = await desk.order(due)
    const { body } = await desk.ask(order).expect(status)
    if (status === 201) return
    expect((body as { detail: string }).detail).toBe(
      'A card takes USD 0.50 to 999999.99; ask the shop for its account and pay by transfer.',
    )
    expect(await paymentsOf(order)).toEqual([])
  })

  it('is not for another company', async () => {
    const order = await desk.order()
    const other = await desk.app.signIn('other')
    await other.post(`/api/orders/${order}/deposit`).set('Idempotency-Key', 'another-company').expect(404)
  })

  it('loses nothing when the processor is away: the same payment is tried again', async () => {
    const order = await desk.order()
    const port = await freePorts()
    await withProcessorAt(port, async () => {
      const { body } = await desk.ask(order).expect(503)
      expect((body as { type: string }).type).toBe('processor-unavailable')
    })
    const [before] = await paymentsOf(order)
    expect(before?.status).toBe('pending')
    const session = await desk.pay(order)
    expect(await paymentsOf(order)).toEqual([{ id: before?.id, status: 'pending', sessionId: session }])
    expect(desk.fake.session(session)?.metadata.paymentId).toBe(before?.id)
  })

  it('starts anew after a fault of the processor, which it would repeat under the same key', async () => {
    const order = await desk.order()
    const port = await freePorts()
    const faulty = await listen(
      createServer((_req, res) => {
        // The SDK asks again by itself unless told not to.
        res.writeHead(500, { 'Content-Type': 'application/json', 'Stripe-Should-Retry': 'false' })
        res.end(JSON.stringify({ error: { type: 'api_error', message: 'no' } }))
      }),
      port,
      '127.0.0.1',
    )
    await withProcessorAt(port, () => desk.ask(order).expect(503))
    await faulty.stop()
    const session = await desk.pay(order)
    expect((await paymentsOf(order)).map(({ status, sessionId }) => [status, sessionId])).toEqual([
      ['failed', null],
      ['pending', session],
    ])
  })
})

describe('a checkout that was left open too long', () => {
  async function expire(session: string): Promise<void> {
    const kept = desk.fake.session(session)
    if (!kept) throw new Error('no such checkout')
    kept.expiresAt = 0
    desk.fake.expire()
    for (const event of desk.eventsOf(session)) await desk.deliver(event)
    await desk.settled()
  }

  it('is said to be over, and the next try gets a page that is open', async () => {
    const order = await desk.order()
    const session = await desk.pay(order)
    await expire(session)
    expect(await desk.lettersOf(order)).toEqual(['payment failed'])
    const next = await desk.pay(order)
    expect(next).not.toBe(session)
    expect(desk.fake.session(next)?.status).toBe('open')
  })

  it('worries nobody when the deposit came by then', async () => {
    const order = await desk.order()
    const session = await desk.pay(order)
    await desk.app.deps.db.updateTable('orders').set({ status: 'released' }).where('id', '=', order).execute()
    await expire(session)
    expect((await desk.read(order)).payments[0]?.status).toBe('failed')
    expect(await desk.lettersOf(order)).toEqual([])
  })
})

describe('the sweep', () => {
  async function raised(action: string, session: string): Promise<number> {
    const rows = await desk.app.deps.db
      .selectFrom('audit')
      .select('id')
      .where('action', '=', action)
      .where('after', 'like', `%${session}%`)
      .execute()
    return rows.length
  }

  it('finds a payment of which no event came, once and no sooner than events take', async () => {
    const order = await desk.order(4200)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'accept')
    await sweepPayments(desk.app.deps)
    expect((await desk.read(order)).status).toBe('awaiting deposit')
    desk.app.setClock(minutesLater(15))
    await sweepPayments(desk.app.deps)
    await sweepPayments(desk.app.deps)
    expect((await desk.read(order)).status).toBe('released')
    expect(await raised('event missed', session)).toBe(1)
    // The events come after all.
    for (const event of desk.eventsOf(session)) await desk.deliver(event)
    await desk.settled()
    expect(await desk.ledgerOf(order)).toEqual([-4200, 4200])
    expect(await desk.lettersOf(order)).toEqual(['deposit receipt'])
    desk.app.setClock(START)
  })

  it('raises what differs from what was asked for, once, and settles nothing', async () => {
    const order = await desk.order()
    const session = await desk.pay(order)
    desk.fake.pay(session, 'accept')
    await desk.app.deps.db.updateTable('payments').set({ amount: 100 }).where('orderId', '=', order).execute()
    desk.app.setClock(minutesLater(15))
    await sweepPayments(desk.app.deps)
    await sweepPayments(desk.app.deps)
    expect(await raised('event missed', session)).toBe(1)
    expect(await raised('payment differs', session)).toBe(1)
    expect((await desk.read(order)).status).toBe('awaiting deposit')
    expect(await desk.ledgerOf(order)).toEqual([])
    desk.app.setClock(START)
  })

  it('leaves a page alone that is still open', async () => {
    const order = await desk.order()
    const session = await desk.pay(order)
    desk.app.setClock(minutesLater(15))
    await sweepPayments(desk.app.deps)
    expect((await desk.read(order)).payments[0]?.status).toBe('pending')
    expect(await desk.pay(order)).toBe(session)
    desk.app.setClock(START)
  })
})
