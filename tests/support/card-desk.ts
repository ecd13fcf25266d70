import Stripe from 'stripe'
import { write } from '../../server/db/open-database.ts'
import { createOrder } from '../../server/modules/orders/orders.service.ts'
import { handleDueEvents } from '../../server/modules/payments/stripe-events.service.ts'
import type { CardFake } from '../../server/payments/fake/card-fake.ts'
import { eventObject } from '../../server/payments/fake/card-objects.ts'
import type { CardEvent } from '../../server/payments/fake/card-store.ts'
import { startCardFake } from '../../server/payments/fake/start-card-fake.ts'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { money } from '../../shared/pricing/money.ts'
import { key, sentQuote } from './round.ts'
import { startTestApp, type Agent, type TestApp } from './test-app.ts'

/**
 * The desk with the local fake of the card processor, cut off from its events: the desk does not listen, so that a
 * test says which event comes when and how often.
 */
export class CardDesk {
  readonly #template: { requestId: string; quoteId: string; companyId: string; contactId: string }
  readonly #stopFake: () => Promise<void>

  private constructor(
    readonly app: TestApp,
    readonly fake: CardFake,
    readonly contractor: Agent,
    stopFake: () => Promise<void>,
    template: { requestId: string; quoteId: string; companyId: string; contactId: string },
  ) {
    this.#stopFake = stopFake
    this.#template = template
  }

  static async start(): Promise<CardDesk> {
    const app = await startTestApp()
    const { fake, stop } = await startCardFake(app.deps.config, app.deps.logger)
    const contractor = await app.signIn('contractor')
    const quote = await sentQuote(contractor, await app.signIn('estimator'))
    const request = await app.deps.db
      .selectFrom('requests')
      .selectAll()
      .where('id', '=', quote.request.id)
      .executeTakeFirstOrThrow()
    const { companyId, contactId } = request
    return new CardDesk(app, fake, contractor, stop, {
      ...{ requestId: request.id, quoteId: quote.id, companyId, contactId },
    })
  }

  async stop(): Promise<void> {
    await this.settled()
    await this.#stopFake()
    await this.app.stop()
  }

  /** One more order, as acceptance makes it; the quote is the first one's again. */
  async order(due = 116_000): Promise<string> {
    const { db, clock } = this.app.deps
    const { companyId, contactId } = this.#template
    return write(db, async (trx) => {
      const request = await trx
        .selectFrom('requests')
        .selectAll()
        .where('id', '=', this.#template.requestId)
        .executeTakeFirstOrThrow()
      const copy = key()
      await trx
        .insertInto('requests')
        .values({ ...request, id: copy, number: copy })
        .execute()
      const quote = { id: key(), number: key(), requestId: copy, companyId, createdAt: request.createdAt }
      await trx.insertInto('quotes').values(quote).execute()
      const order = await createOrder(trx, {
        ...{ quoteId: quote.id, letter: 'A', companyId, contactId, title: request.title },
        ...{ total: money(due * 2, 'USD'), deposit: money(due, 'USD'), acceptedBy: 'Maren Tessell' },
        at: clock().toISOString(),
      })
      return order.id
    })
  }

  ask(orderId: string, idempotencyKey = key()) {
    return this.contractor.post(`/api/orders/${orderId}/deposit`).set('Idempotency-Key', idempotencyKey)
  }

  /** The checkout that the payer is sent to. */
  async pay(orderId: string): Promise<string> {
    const { url } = (await this.ask(orderId).expect(201)).body as AnswerOf<'payDeposit'>
    return url.split('/').at(-1) ?? ''
  }

  async read(orderId: string): Promise<AnswerOf<'readOrder'>> {
    return (await this.contractor.get(`/api/orders/${orderId}`).expect(200)).body as AnswerOf<'readOrder'>
  }

  /** What the processor has to tell of a checkout, in the order in which it came about. */
  eventsOf(sessionId: string): CardEvent[] {
    return this.fake.store.state.events.filter((event) => event.sessionId === sessionId)
  }

  async deliver(event: CardEvent): Promise<void> {
    const { config, clock } = this.app.deps
    const session = this.fake.session(event.sessionId)
    if (!session) throw new Error('an event about nothing')
    const payload = JSON.stringify(eventObject(event, session, config.stripe.fakeUrl ?? ''))
    const header = new Stripe('sk_test_local').webhooks.generateTestHeaderString({
      ...{ payload, secret: config.stripe.webhookSecret, timestamp: Math.floor(clock().getTime() / 1000) },
    })
    await this.app
      .stranger()
      .post('/api/stripe/events')
      .set('Content-Type', 'application/json')
      .set('Stripe-Signature', header)
      .send(payload)
      .expect(200)
  }

  /** As if the desk died when the event was in the inbox and nothing more had happened. */
  async deliverAndDie({ id, type, sessionId }: CardEvent): Promise<void> {
    const session = this.fake.session(sessionId)
    const objectId = type.startsWith('payment_intent.') ? (session?.intentId ?? '') : sessionId
    const at = this.app.deps.clock().toISOString()
    await this.app.deps.db
      .insertInto('stripeEvents')
      .values({
        ...{ id, type, objectId, receivedAt: at, handledAt: null, attempts: 0, nextAt: at, outcome: null },
      })
      .onConflict((conflict) => conflict.doNothing())
      .execute()
  }

  /** Waits until everything in the inbox is acted on. */
  async settled(): Promise<void> {
    for (let tries = 0; tries < 200; tries += 1) {
      await handleDueEvents(this.app.deps)
      const waiting = await this.app.deps.db
        .selectFrom('stripeEvents')
        .select('id')
        .where('handledAt', 'is', null)
        .execute()
      if (waiting.length === 0) return
      await new Promise((resolve) => setTimeout(resolve, 10))
    }
    throw new Error('the inbox was not empty after 2 s')
  }

  async ledgerOf(orderId: string): Promise<number[]> {
    const rows = await this.app.deps.db
      .selectFrom('ledger')
      .select('amount')
      .where('orderId', '=', orderId)
      .execute()
    return rows.map(({ amount }) => amount).sort((a, b) => a - b)
  }

  async lettersOf(orderId: string): Promise<string[]> {
    const rows = await this.app.deps.db
      .selectFrom('outbox')
      .select('kind')
      .where('orderId', '=', orderId)
      .execute()
    return rows.map(({ kind }) => kind).sort()
  }
}
