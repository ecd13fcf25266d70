import type { CookieOptions, Request, Response } from 'express'
import type { Config } from '../config.ts'

type At = Pick<Config, 'publicUrl'>

const isSecure = ({ publicUrl }: At) => publicUrl.startsWith('https:')
/** A `__Host-` cookie cannot be set by a neighbour; browsers take it over https alone. */
const nameOf = (config: At) => (isSecure(config) ? '__Host-plumbrule' : 'plumbrule')

function options(config: At): CookieOptions {
  return { secure: isSecure(config), httpOnly: true, sameSite: 'lax', path: '/' }
}

export function readSessionToken(config: At, req: Request): string | undefined {
  const cookies = req.cookies as Record<string, unknown>
  const token = cookies[nameOf(config)]
  return typeof token === 'string' ? token : undefined
}

export function setSessionToken(config: At, res: Response, token: string): void {
  res.cookie(nameOf(config), token, options(config))
}

export function clearSessionToken(config: At, res: Response): void {
  res.clearCookie(nameOf(config), options(config))
}
