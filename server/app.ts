import compression from 'compression'
import cookieParser from 'cookie-parser'
import express, { type Express } from 'express'
import { randomUUID } from 'node:crypto'
import { pinoHttp } from 'pino-http'
import { operations } from '../shared/contracts/operations.ts'
import type { Deps } from './deps.ts'
import { ownSiteOnly } from './http/cross-site.ts'
import { pages } from './http/pages.ts'
import { noSuchOperation, problems } from './http/problem.ts'
import { neverStored, securityHeaders } from './http/security-headers.ts'
import { accountRoutes } from './modules/accounts/accounts.routes.ts'
import { apiDescriptionRoutes } from './modules/api-description/api-description.routes.ts'
import { auditRoutes } from './modules/audit/audit.routes.ts'
import { healthRoutes } from './modules/health/health.routes.ts'
import { engineRoutes } from './modules/engine/engine.routes.ts'
import { requestRoutes } from './modules/requests/requests.routes.ts'
import { quoteRoutes } from './modules/quotes/quotes.routes.ts'
import { orderRoutes } from './modules/orders/orders.routes.ts'
import { paymentRoutes } from './modules/payments/payments.routes.ts'
import { peopleRoutes } from './modules/people/people.routes.ts'
import { priceBookRoutes } from './modules/price-books/price-books.routes.ts'
import { sessionRoutes } from './modules/sessions/sessions.routes.ts'

const MODULES = [
  sessionRoutes,
  engineRoutes,
  requestRoutes,
  quoteRoutes,
  orderRoutes,
  paymentRoutes,
  accountRoutes,
  peopleRoutes,
  priceBookRoutes,
  auditRoutes,
  healthRoutes,
  apiDescriptionRoutes,
]

const EVENTS = operations.receiveStripeEvent.path

/** The whole application behind one door. `pagesFolder`: the built pages, or left out where there are none. */
export function createApp(deps: Deps, pagesFolder?: string): Express {
  const { config, logger } = deps
  const app = express()
  app.set('trust proxy', config.trustProxy)
  app.disable('x-powered-by')
  app.use(pinoHttp({ logger, genReqId: () => randomUUID(), useLevel: 'debug' }))
  app.use((req, res, next) => {
    res.set('X-Request-Id', String(req.id))
    next()
  })
  app.use(securityHeaders(config.publicUrl.startsWith('https:')))
  app.use(compression())
  app.use('/api', neverStored)
  // The processor signs the very bytes that it sends.
  app.use(EVENTS, express.raw({ type: 'application/json', limit: '1mb' }))
  app.use(ownSiteOnly(config.publicUrl, [EVENTS]))
  app.use(cookieParser())
  app.use(express.json({ limit: '2mb', strict: false }))
  for (const routes of MODULES) app.use(routes(deps))
  app.use('/api', noSuchOperation)
  if (pagesFolder) app.use(pages(pagesFolder))
  app.use(problems(logger))
  return app
}
