import type { RoleName } from '../../shared/contracts/common.ts'
import { fail } from '../errors.ts'

export interface PersonPrincipal {
  kind: 'person'
  personId: string
  name: string
  email: string
  role: RoleName
  /** Of a contractor; null for the shop's people. */
  companyId: string | null
  sessionHash: string
}
/** Whoever holds the private link of one quote. */
export interface LinkPrincipal {
  kind: 'link'
  quoteId: string
  companyId: string
}
export type Principal = { kind: 'nobody' } | PersonPrincipal | LinkPrincipal

export function isShop(principal: Principal): boolean {
  return principal.kind === 'person' && principal.role !== 'contractor'
}

/** Who acts, for the table of moves. */
export function actorOf(principal: Principal): RoleName | 'link' {
  if (principal.kind === 'nobody') fail('not-signed-in', 'Sign in first.')
  return principal.kind === 'link' ? 'link' : principal.role
}

export function personOf(principal: Principal): PersonPrincipal {
  return principal.kind === 'person' ? principal : fail('not-signed-in', 'Sign in first.')
}

/** How the audit trail names them. */
export function nameForAudit(principal: Principal): string {
  if (principal.kind === 'person') return `${principal.name} <${principal.email}>`
  return principal.kind === 'link' ? 'holder of the private link' : 'nobody'
}
