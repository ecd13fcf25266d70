import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { listPeople } from './people.service.ts'

export function peopleRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'listPeople', ({ query }) => listPeople(deps.db, query))
  return router
}
