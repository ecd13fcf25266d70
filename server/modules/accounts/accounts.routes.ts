import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { route } from '../../http/route.ts'
import { ledgerCsv, listDeposits, listLedger, readAccounts } from './accounts.service.ts'

export function accountRoutes(deps: Deps): Router {
  const router = Router()
  route(router, deps, 'readAccounts', () => readAccounts(deps))
  route(router, deps, 'listDeposits', ({ query }) => listDeposits(deps.db, query))
  route(router, deps, 'listLedger', ({ query }) => listLedger(deps.db, query))
  route(router, deps, 'readLedgerCsv', () => ledgerCsv(deps))
  return router
}
