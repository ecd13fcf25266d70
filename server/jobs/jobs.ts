import type { Deps } from '../deps.ts'
import { deliverDue } from '../modules/outbox/outbox.service.ts'
import { handleDueEvents } from '../modules/payments/stripe-events.service.ts'
import { sweepPayments } from '../modules/payments/sweep-payments.service.ts'
import { expireRevisions } from '../modules/quotes/answer-revision.service.ts'
import type { Job } from './scheduler.ts'

/** What the desk does by itself. */
export function jobsOf(deps: Deps): Job[] {
  return [
    { name: 'letters', everyMs: 1000, run: () => deliverDue(deps) },
    // Events are acted on as they come; this finds those that we died over.
    { name: 'card events', everyMs: 2000, run: () => handleDueEvents(deps) },
    { name: 'missed payments', everyMs: 10 * 60_000, run: () => sweepPayments(deps) },
    { name: 'stale prices', everyMs: 10 * 60_000, run: () => expireRevisions(deps) },
  ]
}
