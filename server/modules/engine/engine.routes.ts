import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { checkColumn, designBasePlate, listSections, propose, readSection } from './engine.service.ts'

export function engineRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'checkColumn', ({ principal, body }) => checkColumn(deps, principal, body))
  route(router, deps, 'designBasePlate', ({ body }) => designBasePlate(deps, body))
  route(router, deps, 'propose', ({ principal, body }) => propose(deps, principal, body))
  route(router, deps, 'listSections', ({ query }) => listSections(deps, query))
  route(router, deps, 'readSection', ({ params }) => readSection(deps, params.designation))
  return router
}
