import { mkdtempSync, rmSync } from 'node:fs'
import { createServer } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import Stripe from 'stripe'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { readConfig, type Config } from '../../server/config.ts'
import { startFakes } from '../../server/fakes.ts'
import { listen } from '../../server/listen.ts'
import { createLogger } from '../../server/logger.ts'
import { startMailFake } from '../../server/mail/fake/start-mail-fake.ts'
import { startCardFake } from '../../server/payments/fake/start-card-fake.ts'
import { createStripe } from '../../server/payments/stripe-client.ts'
import { freePorts } from '../support/free-ports.ts'

/* The local fake of the processor against Stripe's own SDK; what it does is what Stripe's API reference says. */

const logger = createLogger('silent')
let config: Config
let fake: Awaited<ReturnType<typeof startCardFake>>
let stripe: Stripe
beforeEach(async () => {
  const dataDir = mkdtempSync(join(tmpdir(), 'plumbrule-cards-'))
  config = readConfig({ DATA_DIR: dataDir, PORT: String(await freePorts()) })
  fake = await startCardFake(config, logger)
  stripe = createStripe(config)
})
afterEach(async () => {
  await fake.stop()
  rmSync(config.dataDir, { recursive: true, force: true })
})

function create(amount: number, idempotencyKey: string) {
  return stripe.checkout.sessions.create(
    {
      mode: 'payment',
      metadata: { paymentId: 'p', orderId: 'o' },
      line_items: [
        {
          quantity: 1,
          price_data: {
            currency: 'usd',
            unit_amount: amount,
            product_data: { name: 'Deposit, <order> O-1' },
          },
        },
      ],
      success_url: 'http://localhost/orders/o?paid=yes',
      cancel_url: 'http://localhost/orders/o?paid=no',
    },
    { idempotencyKey },
  )
}

async function choose(url: string | null, outcome: string): Promise<Response> {
  return fetch(url ?? '', { method: 'POST', body: new URLSearchParams({ outcome }), redirect: 'manual' })
}

/** Takes events on the desk's port: refuses some, then keeps the bodies of the rest with their signatures. */
async function takeEvents(refuse: number) {
  const taken: { body: string; signature: string; ok: boolean }[] = []
  const server = createServer((req, res) => {
    const chunks: Buffer[] = []
    req.on('data', (chunk: Buffer) => chunks.push(chunk))
    req.on('end', () => {
      const ok = taken.length >= refuse
      const signature = String(req.headers['stripe-signature'])
      taken.push({ body: Buffer.concat(chunks).toString(), signature, ok })
      res.writeHead(ok ? 200 : 500).end()
    })
  })
  const running = await listen(server, config.port, '127.0.0.1')
  return {
    taken,
    stop: () => running.stop(),
    async until(count: number): Promise<void> {
      for (let tries = 0; tries < 300 && taken.length < count; tries += 1) {
        await new Promise((resolve) => setTimeout(resolve, 50))
      }
    },
  }
}

describe('the fake of the processor', () => {
  it('answers the same question under the same key with the same checkout', async () => {
    const [one, other] = await Promise.all([create(5000, 'key-1'), create(5000, 'key-1')])
    expect(other.id).toBe(one.id)
    expect((await create(5000, 'key-2')).id).not.toBe(one.id)
  })

  it('refuses another question under the same key', async () => {
    await create(5000, 'key-1')
    await expect(create(5001, 'key-1')).rejects.toBeInstanceOf(Stripe.errors.StripeIdempotencyError)
  })

  it('knows its own key, its balance, and nothing of what it did not make', async () => {
    expect((await stripe.balance.retrieve()).object).toBe('balance')
    await expect(stripe.checkout.sessions.retrieve('cs_none')).rejects.toMatchObject({ statusCode: 404 })
    await expect(stripe.paymentIntents.retrieve('pi_none')).rejects.toMatchObject({ statusCode: 404 })
    const stranger = createStripe({ stripe: { ...config.stripe, secretKey: 'sk_test_other' } })
    await expect(stranger.balance.retrieve()).rejects.toBeInstanceOf(Stripe.errors.StripeAuthenticationError)
  })

  it('shows a page with amount and purpose, keeps it open after a decline, and takes the money once', async () => {
    const { id, url, payment_intent: intent } = await create(512_345, 'key-1')
    const page = await (await fetch(url ?? '')).text()
    expect(page).toMatch(/USD\s5,123\.45/)
    expect(page).toContain('Deposit, &lt;order&gt; O-1')
    expect((await choose(url, 'decline')).headers.get('location')).toBe(`/pay/${id}`)
    expect(await (await fetch(url ?? '')).text()).toContain('Your card was declined.')
    const refused = await stripe.paymentIntents.retrieve(String(intent))
    expect(refused.last_payment_error?.message).toBe('Your card was declined.')
    const twice = await Promise.all([choose(url, 'accept'), choose(url, 'accept')])
    expect(twice.map((reply) => reply.headers.get('location'))).toEqual(
      Array(2).fill('http://localhost/orders/o?paid=yes'),
    )
    expect(await stripe.checkout.sessions.retrieve(id)).toMatchObject({
      ...{ status: 'complete', payment_status: 'paid', amount_total: 512_345, url: null },
    })
    const told = fake.fake.store.state.events.map(({ type }) => type)
    expect(told).toEqual([
      'payment_intent.payment_failed',
      'payment_intent.succeeded',
      'checkout.session.completed',
    ])
  })

  it('sends a payer who leaves back, and closes what is left open too long', async () => {
    const { id, url } = await create(5000, 'key-1')
    const left = await fetch(`${url}/leave`, { redirect: 'manual' })
    expect(left.headers.get('location')).toBe('http://localhost/orders/o?paid=no')
    const kept = fake.fake.session(id)
    if (kept) kept.expiresAt = 0
    fake.fake.expire()
    expect((await choose(url, 'accept')).headers.get('location')).not.toBe(
      'http://localhost/orders/o?paid=yes',
    )
    expect(await stripe.checkout.sessions.retrieve(id)).toMatchObject({
      ...{ status: 'expired', payment_status: 'unpaid' },
    })
  })

  it('tells again what was not taken, signed each time, also after it was stopped in between', async () => {
    const { url } = await create(5000, 'key-1')
    await choose(url, 'accept')
    await fake.stop()
    fake = await startCardFake(config, logger)
    const desk = await takeEvents(2)
    await desk.until(4)
    await desk.stop()
    const events = desk.taken.map(({ body, signature, ok }) => {
      const event = stripe.webhooks.constructEvent(body, signature, config.stripe.webhookSecret)
      return { id: event.id, type: event.type, ok }
    })
    const took = events.filter(({ ok }) => ok)
    expect(took.map(({ type }) => type).sort()).toEqual([
      'checkout.session.completed',
      'payment_intent.succeeded',
    ])
    const refused = events.filter(({ ok }) => !ok).map(({ id }) => id)
    expect(refused).toHaveLength(2)
    expect(took.map(({ id }) => id)).toEqual(expect.arrayContaining(refused))
  })
})

describe('the local fakes', () => {
  const REAL = {
    ...{ STRIPE_SECRET_KEY: 'sk_live_x', STRIPE_WEBHOOK_SECRET: 'whsec_x', SMTP_URL: 'smtp://mail.test' },
    ...{ MAIL_FROM: 'a@example.test', PUBLIC_URL: 'https://desk.example.test' },
  }

  it.each([
    ['in production', { ...REAL, NODE_ENV: 'production' }],
    ['with real services elsewhere', REAL],
  ])('never start %s', async (_where, env) => {
    const real = readConfig({ ...env, DATA_DIR: config.dataDir, PORT: String(config.port + 10) })
    for (const start of [startFakes, startCardFake, startMailFake]) {
      await expect(start(real, logger)).rejects.toThrow(/demo alone/)
      // Not even when somebody names a place for them.
      const named = {
        ...real,
        stripe: { ...real.stripe, fakeUrl: 'http://localhost:1' },
        mail: { ...real.mail, fakeUrl: 'http://localhost:2' },
      }
      await expect(start(named, logger)).rejects.toThrow(/demo alone/)
    }
  })
})
