import { jwtVerify, SignJWT } from 'jose'
import type { LinkPrincipal } from './principal.ts'

/** Signs and reads the short-lived, single-purpose links that open one quote. */
export interface Links {
  signQuoteLink: (quoteId: string, companyId: string, expiresAt: Date) => Promise<string>
  /** Undefined for anything that is not a link of ours, or no longer. */
  readQuoteLink: (token: string, now: Date) => Promise<LinkPrincipal | undefined>
}

const ALGORITHM = 'HS256'
const AUDIENCE = 'quote'
const TYPE = 'quote-link+jwt'

export function createLinks(key: string): Links {
  const secret = new TextEncoder().encode(key)
  return {
    signQuoteLink: (quoteId, companyId, expiresAt) =>
      new SignJWT({ company: companyId })
        .setProtectedHeader({ alg: ALGORITHM, typ: TYPE })
        .setSubject(quoteId)
        .setAudience(AUDIENCE)
        .setExpirationTime(expiresAt)
        .sign(secret),
    async readQuoteLink(token, now) {
      try {
        const { payload } = await jwtVerify(token, secret, {
          algorithms: [ALGORITHM],
          audience: AUDIENCE,
          typ: TYPE,
          requiredClaims: ['exp', 'sub'],
          currentDate: now,
        })
        const { sub, company } = payload
        if (typeof sub !== 'string' || typeof company !== 'string') return undefined
        return { kind: 'link', quoteId: sub, companyId: company }
      } catch {
        return undefined
      }
    },
  }
}
