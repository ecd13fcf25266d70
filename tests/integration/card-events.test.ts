import fc from 'fast-check'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Deps } from '../../server/deps.ts'
import { handleDueEvents } from '../../server/modules/payments/stripe-events.service.ts'
import { CardDesk } from '../support/card-desk.ts'
import { START } from '../support/test-app.ts'

/* Events of the processor as they may come: twice, late, out of order, and with a crash in between. */

let desk: CardDesk
beforeAll(async () => {
  desk = await CardDesk.start()
})
afterAll(() => desk.stop())

const DUE = 116_000

async function expectPaidOnce(orderId: string): Promise<void> {
  const order = await desk.read(orderId)
  expect(order.status).toBe('released')
  expect(order.payments.map(({ status }) => status)).toEqual(['succeeded'])
  expect(order.deposit.paid.amount).toBe(DUE)
  expect(order.progress.filter(({ status }) => status === 'released')).toHaveLength(1)
  expect(await desk.ledgerOf(orderId)).toEqual([-DUE, DUE])
  expect((await desk.lettersOf(orderId)).filter((kind) => kind === 'deposit receipt')).toHaveLength(1)
}

/** The processor answers how a card fared, and meanwhile something else happens. */
function whileAsking(meanwhile: () => Promise<void>): Deps {
  const { deps } = desk.app
  const intents = deps.stripe.paymentIntents
  const slow = Object.assign(Object.create(intents) as typeof intents, {
    async retrieve(id: string) {
      const asItWas = await intents.retrieve(id)
      await meanwhile()
      return asItWas
    },
  })
  const stripe = Object.assign(Object.create(deps.stripe) as typeof deps.stripe, { paymentIntents: slow })
  return { ...deps, stripe }
}

describe('an event of the processor', () => {
  it('that comes three times has one effect', async () => {
    const order = await desk.order(DUE)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'accept')
    const paid = desk.eventsOf(session).find(({ type }) => type === 'checkout.session.completed')
    if (!paid) throw new Error('the fake told nothing')
    await desk.deliver(paid)
    await desk.settled()
    await Promise.all([desk.deliver(paid), desk.deliver(paid)])
    await desk.settled()
    await expectPaidOnce(order)
  })

  it('of a card that was refused, coming after the one that went through, leaves the payment as it is', async () => {
    const order = await desk.order(DUE)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'decline')
    desk.fake.pay(session, 'accept')
    for (const event of desk.eventsOf(session).reverse()) {
      await desk.deliver(event)
      await desk.settled()
    }
    await expectPaidOnce(order)
    expect(await desk.lettersOf(order)).toEqual(['deposit receipt'])
  })

  it('tells the payer of a refused card once, and leaves the same page open', async () => {
    const order = await desk.order(DUE)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'no funds')
    for (const event of desk.eventsOf(session)) {
      await desk.deliver(event)
      await desk.deliver(event)
    }
    await desk.settled()
    expect((await desk.read(order)).payments.map(({ status, failure }) => [status, failure])).toEqual([
      ['failed', 'Your card has insufficient funds.'],
    ])
    expect(await desk.lettersOf(order)).toEqual(['payment failed'])
    expect(await desk.ledgerOf(order)).toEqual([])
    expect(await desk.pay(order)).toBe(session)
  })

  it('of a refused card, looked into while the next card went through, does not undo that', async () => {
    const { deps } = desk.app
    const order = await desk.order(DUE)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'decline')
    for (const event of desk.eventsOf(session)) await desk.deliverAndDie(event)
    await handleDueEvents(
      whileAsking(async () => {
        desk.fake.pay(session, 'accept')
        for (const event of desk.eventsOf(session)) await desk.deliverAndDie(event)
        await handleDueEvents(deps)
      }),
    )
    await expectPaidOnce(order)
    expect(await desk.lettersOf(order)).toEqual(['deposit receipt'])
  })

  it('that two are at, because the first took too long, has one effect', async () => {
    const { deps } = desk.app
    const order = await desk.order(DUE)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'decline')
    for (const event of desk.eventsOf(session)) await desk.deliverAndDie(event)
    await handleDueEvents(
      whileAsking(async () => {
        desk.app.setClock(new Date(Date.parse(START) + 60_000).toISOString())
        await handleDueEvents(deps)
      }),
    )
    desk.app.setClock(START)
    expect(await desk.lettersOf(order)).toEqual(['payment failed'])
  })

  it('kept before a crash is acted on after it, once', async () => {
    const order = await desk.order(DUE)
    const session = await desk.pay(order)
    desk.fake.pay(session, 'accept')
    for (const event of desk.eventsOf(session)) await desk.deliverAndDie(event)
    expect((await desk.read(order)).status).toBe('awaiting deposit')
    await desk.settled()
    await expectPaidOnce(order)
  })

  it('has one effect whatever the payer did and however the events came', async () => {
    const step = fc.oneof(
      fc.record({ payer: fc.constantFrom('accept' as const, 'decline' as const, 'no funds' as const) }),
      fc.record({ event: fc.nat(20), how: fc.constantFrom('deliver' as const, 'deliverAndDie' as const) }),
      fc.constant('the job runs' as const),
    )
    await fc.assert(
      fc.asyncProperty(
        fc.array(step, { maxLength: 12 }),
        fc.array(fc.nat(), { minLength: 40, maxLength: 40 }),
        async (steps, ranks) => {
          const order = await desk.order(DUE)
          const session = await desk.pay(order)
          for (const one of steps) {
            const told = desk.eventsOf(session)
            if (one === 'the job runs') await desk.settled()
            else if ('payer' in one) desk.fake.pay(session, one.payer)
            else {
              const event = told[one.event % Math.max(told.length, 1)]
              if (event) await desk[one.how](event)
            }
            const ledger = await desk.ledgerOf(order)
            expect(ledger.reduce((sum, amount) => sum + amount, 0)).toBe(0)
          }
          desk.fake.pay(session, 'accept')
          // All of them, twice, in an order drawn by lot.
          const all = desk.eventsOf(session).flatMap((event) => [event, event])
          const drawn = all.map((event, at) => ({ event, rank: ranks[at] ?? at }))
          drawn.sort((a, b) => a.rank - b.rank)
          for (const { event } of drawn) await desk.deliver(event)
          await desk.settled()
          await expectPaidOnce(order)
        },
      ),
      { numRuns: 60 },
    )
  }, 120_000)
})
