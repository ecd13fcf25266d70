import type { BodyInputOf } from '../../shared/contracts/operations.ts'
import { call } from './client.ts'

export function readSession() {
  return call('readSession', {})
}
export function signIn(body: BodyInputOf<'signIn'>) {
  return call('signIn', { body })
}
export function signOut() {
  return call('signOut', {})
}
