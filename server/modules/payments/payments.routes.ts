import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { payDeposit } from './pay-deposit.service.ts'
import { receiveEvent } from './stripe-events.service.ts'

export function paymentRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'payDeposit', ({ principal, params, once }) =>
    payDeposit(deps, principal, params.id, once),
  )
  route(router, deps, 'receiveStripeEvent', async ({ req }) => {
    await receiveEvent(deps, req.body, req.get('stripe-signature') ?? '')
    return {}
  })
  return router
}
