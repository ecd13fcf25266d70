import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { listOrders, readOrder } from './read-orders.service.ts'

export function orderRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'listOrders', ({ principal, query }) => listOrders(deps.db, principal, query))
  route(router, deps, 'readOrder', ({ principal, params }) => readOrder(deps.db, principal, params.id))
  return router
}
