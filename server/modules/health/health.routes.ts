import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { readiness } from './health.service.ts'

export function healthRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'health', () => Promise.resolve({ status: 'ok' as const }))
  route(router, deps, 'ready', () => readiness(deps))
  return router
}
