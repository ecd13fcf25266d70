import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { readPriceBook } from './price-books.service.ts'

export function priceBookRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'readPriceBook', () => readPriceBook(deps.db, deps.clock()))
  return router
}
