import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import type { Deps } from '../../deps.ts'
import { storeAnswers } from './health.repo.ts'

const PATIENCE_MS = 3000

/** Whether what the desk leans on can be reached; each is given three seconds. */
export async function readiness({ db, mailer, stripe }: Deps): Promise<AnswerOf<'ready'>> {
  const [store, mail, payments] = await Promise.all([
    answers(storeAnswers(db)),
    answers(mailer.verify()),
    answers(stripe.balance.retrieve({}, { timeout: PATIENCE_MS, maxNetworkRetries: 0 })),
  ])
  return { store, mail, payments }
}

function answers(attempt: Promise<unknown>): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined
  const late = new Promise<boolean>((resolve) => {
    timer = setTimeout(() => resolve(false), PATIENCE_MS)
  })
  const tried = attempt.then(
    () => true,
    () => false,
  )
  return Promise.race([tried, late]).finally(() => clearTimeout(timer))
}
