import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { listAudit } from './audit.service.ts'

export function auditRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'listAudit', ({ query }) => listAudit(deps.db, query))
  return router
}
