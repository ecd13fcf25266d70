import { createHash } from 'node:crypto'
import type { Db, Trx } from '../db/open-database.ts'
import { fail } from '../errors.ts'
import { findAnswer, keepAnswer } from './idempotency.repo.ts'
import type { Principal } from './principal.ts'

/** Keeps the answer of an act in the transaction that did it, so that a repeated call is answered and not done again. */
export type Once = (trx: Trx, answer: unknown) => Promise<void>

export interface Repeatable {
  owner: string
  key: string
  fingerprint: string
}

const KEY = /^[\w-]{8,100}$/

/** What makes two calls the same; undefined when the caller sent no key. */
export function repeatable(
  operation: string,
  principal: Principal,
  key: string | undefined,
  asked: { params: unknown; body: unknown },
): Repeatable | undefined {
  if (key === undefined) return undefined
  if (!KEY.test(key)) {
    fail('invalid-input', 'The Idempotency-Key is not one.', {
      issues: [{ path: 'Idempotency-Key', message: '8 to 100 letters, digits, - and _' }],
    })
  }
  const owner =
    principal.kind === 'person'
      ? `person ${principal.personId}`
      : principal.kind === 'link'
        ? `link ${principal.quoteId}`
        : 'nobody'
  const fingerprint = createHash('sha256')
    .update(JSON.stringify([operation, asked.params, asked.body]))
    .digest('hex')
  return { owner, key, fingerprint }
}

/** Does it, or answers as before; a call that runs beside its twin gets the answer of whichever came first. */
export async function answerOnce(db: Db, call: Repeatable, doIt: () => Promise<unknown>): Promise<unknown> {
  const before = await answeredBefore(db, call)
  if (before) return before.answer
  try {
    return await doIt()
  } catch (error) {
    const meanwhile = await answeredBefore(db, call)
    if (meanwhile) return meanwhile.answer
    throw error
  }
}

/** The answer that was given before to the same call; undefined when it is new. */
async function answeredBefore(db: Db, call: Repeatable): Promise<{ answer: unknown } | undefined> {
  const row = await findAnswer(db, call.owner, call.key)
  if (!row) return undefined
  if (row.fingerprint !== call.fingerprint) {
    fail('idempotency-reuse', 'This Idempotency-Key was used for another call; take a new one.')
  }
  return { answer: JSON.parse(row.answer) }
}

export function onceFor(call: Repeatable | undefined, now: () => Date): Once {
  return async (trx, answer) => {
    if (!call) return
    // Somebody was quicker with the same key: all of this is undone, and theirs is answered.
    if (await findAnswer(trx, call.owner, call.key)) fail('conflict', 'This was just done by another call.')
    await keepAnswer(trx, { ...call, answer: JSON.stringify(answer), createdAt: now().toISOString() })
  }
}
