import type { BodyInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

export type ProposalInput = BodyInputOf<'propose'>

export function propose(body: ProposalInput, signal: AbortSignal) {
  return call('propose', { body, signal })
}
