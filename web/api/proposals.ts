import type { BodyInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

/** One line; a schedule is a list of them. */
export type ProposalInput = Exclude<BodyInputOf<'propose'>, unknown[]>

export function propose(body: ProposalInput, signal: AbortSignal) {
  return call('propose', { body, signal })
}
