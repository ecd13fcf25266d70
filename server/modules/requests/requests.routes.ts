import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import {
  createRequest,
  declineRequest,
  editRequest,
  listRequests,
  readRequest,
  submitRequest,
  withdrawRequest,
} from './requests.service.ts'

export function requestRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'listRequests', ({ principal, query }) => listRequests(deps, principal, query))
  route(router, deps, 'createRequest', ({ principal, body, once }) =>
    createRequest(deps, principal, body, once),
  )
  route(router, deps, 'readRequest', ({ principal, params }) => readRequest(deps, principal, params.id))
  route(router, deps, 'editRequest', ({ principal, params, ifMatch, body }) =>
    editRequest(deps, principal, params.id, ifMatch, body),
  )
  route(router, deps, 'submitRequest', ({ principal, params, ifMatch }) =>
    submitRequest(deps, principal, params.id, ifMatch),
  )
  route(router, deps, 'withdrawRequest', ({ principal, params }) =>
    withdrawRequest(deps, principal, params.id),
  )
  route(router, deps, 'declineRequest', ({ principal, params, body }) =>
    declineRequest(deps, principal, params.id, body.reason),
  )
  return router
}
