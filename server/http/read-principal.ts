import type { Request } from 'express'
import type { OperationId } from '../../shared/contracts/operations.ts'
import type { Deps } from '../deps.ts'
import { fail } from '../errors.ts'
import { sessionOf } from '../modules/sessions/sessions.service.ts'
import { allows } from './policy.ts'
import type { LinkPrincipal, PersonPrincipal, Principal } from './principal.ts'
import { readSessionToken } from './session-cookie.ts'

/** Who calls, and whether they may. */
export async function principalFor(deps: Deps, id: OperationId, req: Request): Promise<Principal> {
  const person = await personIn(deps, req)
  const link = allows(id, 'link') && !allows(id, 'anyone') ? await linkIn(deps, req) : undefined
  const chosen = choose(id, person, link)
  if (chosen) return chosen
  if (person) return fail('forbidden', 'This is not for your role.')
  if (allows(id, 'anyone')) return { kind: 'nobody' }
  return fail('not-signed-in', 'Sign in first; or open the link in the e-mail once more.')
}

/** A person acts as themselves; but the link to another company's quote is all that opens that one. */
function choose(
  id: OperationId,
  person: PersonPrincipal | undefined,
  link: LinkPrincipal | undefined,
): Principal | undefined {
  const may = person && allows(id, person.role) ? person : undefined
  if (link && may?.companyId !== link.companyId && may?.role === 'contractor') return link
  return may ?? link
}

async function personIn(deps: Deps, req: Request): Promise<PersonPrincipal | undefined> {
  const token = readSessionToken(deps.config, req)
  return token === undefined ? undefined : sessionOf(deps, token)
}

async function linkIn({ links, clock }: Deps, req: Request): Promise<LinkPrincipal | undefined> {
  const token = req.get('quote-link')
  return token === undefined ? undefined : links.readQuoteLink(token, clock())
}
