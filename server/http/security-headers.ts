import type { RequestHandler } from 'express'
import helmet from 'helmet'

/** Nothing but our own files; no page of another's may frame ours. `secure`: served over https. */
export function securityHeaders(secure: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        connectSrc: ["'self'"],
        fontSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        manifestSrc: ["'self'"],
        baseUri: ["'none'"],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        formAction: ["'self'"],
      },
    },
    referrerPolicy: { policy: 'no-referrer' },
    strictTransportSecurity: secure ? { maxAge: 31_536_000 } : false,
  })
}

export const neverStored: RequestHandler = (_req, res, next) => {
  res.set('Cache-Control', 'no-store')
  next()
}
