import express, { Router, type Response } from 'express'
import { z } from 'zod'
import type { CardFake } from './card-fake.ts'
import { intentObject, sessionObject } from './card-objects.ts'

/** A checkout as the SDK sends it: a form, every value text. */
const newSession = z.object({
  mode: z.literal('payment'),
  success_url: z.url(),
  cancel_url: z.url(),
  metadata: z.record(z.string(), z.string()).default({}),
  line_items: z
    .array(
      z.object({
        quantity: z.coerce.number().int().positive(),
        price_data: z.object({
          currency: z.string(),
          unit_amount: z.coerce.number().int().positive(),
          product_data: z.object({ name: z.string() }),
        }),
      }),
    )
    .length(1),
})

function refuse(res: Response, status: number, type: string, message: string): void {
  res.status(status).json({ error: { type, message } })
}

/** The part of the processor's API that the real SDK calls. */
export function cardApi(fake: CardFake, secretKey: string, pageUrl: string): Router {
  const router = Router()
  router.use((req, res, next) => {
    if (req.get('authorization') === `Bearer ${secretKey}`) return next()
    return refuse(res, 401, 'invalid_request_error', 'Invalid API Key provided')
  })
  router.use(express.urlencoded({ extended: true, limit: '100kb' }))
  router.get(
    '/balance',
    (_req, res) => void res.json({ object: 'balance', livemode: false, available: [], pending: [] }),
  )
  router.post('/checkout/sessions', (req, res) => {
    const parsed = newSession.safeParse(req.body)
    if (!parsed.success) return refuse(res, 400, 'invalid_request_error', z.prettifyError(parsed.error))
    const { metadata, line_items, success_url: successUrl, cancel_url: cancelUrl } = parsed.data
    const { quantity, price_data: price } = line_items[0] ?? { quantity: 0, price_data: undefined }
    if (!price) return refuse(res, 400, 'invalid_request_error', 'line_items is empty')
    const { currency, unit_amount: unitAmount, product_data: product } = price
    const wanted = { amount: unitAmount * quantity, currency, description: product.name, metadata }
    const session = fake.create({ ...wanted, successUrl, cancelUrl }, req.get('idempotency-key'))
    if (!session) {
      return refuse(
        res,
        400,
        'idempotency_error',
        'Keys for idempotent requests can only be used with the same parameters',
      )
    }
    return void res.json(sessionObject(session, pageUrl))
  })
  router.get('/checkout/sessions/:id', (req, res) => {
    const session = fake.session(req.params.id)
    if (!session) return refuse(res, 404, 'invalid_request_error', 'No such checkout session')
    return void res.json(sessionObject(session, pageUrl))
  })
  router.get('/payment_intents/:id', (req, res) => {
    const session = fake.sessionOfIntent(req.params.id)
    if (!session) return refuse(res, 404, 'invalid_request_error', 'No such payment_intent')
    return void res.json(intentObject(session))
  })
  return router
}
