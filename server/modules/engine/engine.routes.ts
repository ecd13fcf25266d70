import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { streamLines } from '../../http/stream-lines.ts'
import {
  checkColumn,
  designBasePlate,
  listSections,
  propose,
  proposeSchedule,
  readCapacity,
  readSection,
} from './engine.service.ts'

export function engineRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'checkColumn', ({ principal, body }) => checkColumn(deps, principal, body))
  route(router, deps, 'designBasePlate', ({ body }) => designBasePlate(deps, body))
  route(router, deps, 'propose', ({ principal, body, res }) =>
    Array.isArray(body)
      ? streamLines(res, proposeSchedule(deps, principal, body))
      : propose(deps, principal, body),
  )
  route(router, deps, 'listSections', ({ query }) => listSections(deps, query))
  route(router, deps, 'readCapacity', ({ params, query }) => readCapacity(deps, params.designation, query))
  route(router, deps, 'readSection', ({ params }) => readSection(deps, params.designation))
  return router
}
