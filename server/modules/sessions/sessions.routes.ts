import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { clearSessionToken, setSessionToken } from '../../http/session-cookie.ts'
import { personById } from '../people/people.service.ts'
import { signIn, signOut } from './sessions.service.ts'

export function sessionRoutes(deps: Deps): Router {
  const router = Router()
  const demo = deps.config.mode === 'demo'
  const taxRegions = deps.shop.taxRegions.map(({ region }) => region)
  route(router, deps, 'signIn', async ({ body, req, res, principal }) => {
    const { token, person } = await signIn(deps, body, req.ip ?? '')
    if (principal.kind === 'person') await signOut(deps, principal)
    setSessionToken(deps.config, res, token)
    return { person, demo, taxRegions }
  })
  route(router, deps, 'readSession', async ({ principal }) =>
    principal.kind === 'person'
      ? { person: await personById(deps.db, principal.personId), demo, taxRegions }
      : { person: null, demo, taxRegions: [] },
  )
  route(router, deps, 'signOut', async ({ principal, res }) => {
    if (principal.kind === 'person') await signOut(deps, principal)
    clearSessionToken(deps.config, res)
    return {}
  })
  return router
}
