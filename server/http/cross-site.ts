import type { RequestHandler } from 'express'
import { fail } from '../errors.ts'

/**
 * A write must come from our own pages. Browsers say so themselves; an older one names its origin. A program that
 * sends no cookie has nothing that another site could borrow. `except`: paths whose messages prove themselves.
 */
export function ownSiteOnly(publicUrl: string, except: readonly string[]): RequestHandler {
  const origin = new URL(publicUrl).origin
  return (req, _res, next) => {
    if (req.method === 'GET' || req.method === 'HEAD' || except.includes(req.path)) return next()
    const site = req.get('sec-fetch-site')
    const from = req.get('origin')
    const hasCookie = req.get('cookie') !== undefined
    const ours = site ? site === 'same-origin' : from ? from === origin : !hasCookie
    if (!ours) fail('cross-site', 'This can only be asked from the desk itself.')
    return next()
  }
}
