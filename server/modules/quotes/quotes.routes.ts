import { Router } from 'express'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import { route } from '../../http/route.ts'
import { acceptRevision, declineRevision } from './answer-revision.service.ts'
import { approveRevision, withdrawRevision } from './approve-revision.service.ts'
import { editRevision, tryRevision } from './edit-revision.service.ts'
import { openQuote, reviseQuote } from './open-quote.service.ts'
import { readQuoteDocument } from './quote-document.service.ts'
import { listQuotes, readQuote } from './quotes.service.ts'
import { sendRevision } from './send-revision.service.ts'

export function quoteRoutes(deps: Deps): Router {
  const router = Router()
  const { db } = deps
  route(router, deps, 'openQuote', ({ principal, params, once }) =>
    openQuote(deps, principal, params.id, once),
  )
  route(router, deps, 'listQuotes', ({ principal, query }) => listQuotes(db, principal, query))
  route(router, deps, 'readQuote', ({ principal, params }) => readQuote(db, principal, params.id))
  route(router, deps, 'readLinkedQuote', ({ principal }) =>
    principal.kind === 'link'
      ? readQuote(db, principal, principal.quoteId)
      : fail('not-signed-in', 'Open the link in the e-mail once more.'),
  )
  route(router, deps, 'tryRevision', ({ principal, params, body }) =>
    tryRevision(deps, principal, params, body),
  )
  route(router, deps, 'editRevision', ({ principal, params, ifMatch, body }) =>
    editRevision(deps, principal, params, ifMatch, body),
  )
  route(router, deps, 'approveRevision', ({ principal, params, ifMatch }) =>
    approveRevision(deps, principal, params, ifMatch),
  )
  route(router, deps, 'sendRevision', ({ principal, params, ifMatch, once }) =>
    sendRevision(deps, principal, params, ifMatch, once),
  )
  route(router, deps, 'withdrawRevision', ({ principal, params }) =>
    withdrawRevision(deps, principal, params),
  )
  route(router, deps, 'reviseQuote', ({ principal, params, once }) =>
    reviseQuote(deps, principal, params, once),
  )
  route(router, deps, 'readQuoteDocument', ({ principal, params }) =>
    readQuoteDocument(deps, principal, params),
  )
  route(router, deps, 'acceptRevision', ({ principal, params, body, once }) =>
    acceptRevision(deps, principal, params, body, once),
  )
  route(router, deps, 'declineRevision', ({ principal, params, body }) =>
    declineRevision(deps, principal, params, body),
  )
  return router
}
