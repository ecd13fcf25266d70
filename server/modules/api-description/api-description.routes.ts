import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { describeApi } from './openapi.ts'

export function apiDescriptionRoutes(deps: Deps): Router {
  const router = Router()
  let description: string | undefined
  route(router, deps, 'readOpenApi', () => {
    description ??= JSON.stringify(describeApi())
    return Promise.resolve({
      contentType: 'application/json',
      fileName: 'openapi.json',
      body: description,
      inline: true,
    })
  })
  return router
}
