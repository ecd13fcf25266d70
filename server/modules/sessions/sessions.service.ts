import { createHash, randomBytes } from 'node:crypto'
import type { BodyOf } from '../../../shared/contracts/operations.ts'
import type { PersonDto } from '../../../shared/contracts/session.ts'
import { write, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { fail } from '../../errors.ts'
import type { PersonPrincipal } from '../../http/principal.ts'
import { recordAudit } from '../audit/audit.service.ts'
import { personById, personToSignIn, signedIn } from '../people/people.service.ts'
import {
  attemptsOf,
  deleteSession,
  findSession,
  forgetFailures,
  insertSession,
  noteFailure,
  touchSession,
  type SessionRow,
} from './sessions.repo.ts'
import { FORGOTTEN_MS, waitAfter, watchedKeys, type Watched } from './throttle.ts'

const MINUTE = 60_000
const HOUR = 60 * MINUTE
/** The shop's own see cost and move money: theirs end sooner. */
const ENDS = {
  shop: { idle: 30 * MINUTE, absolute: 12 * HOUR },
  contractor: { idle: 24 * HOUR, absolute: 7 * 24 * HOUR },
}
/** A session is written to at most this often. */
const TOUCH_AFTER = MINUTE

function hashOf(token: string): string {
  return createHash('sha256').update(token).digest('hex')
}

function hasEnded({ role, createdAt, seenAt }: SessionRow, now: number): boolean {
  const { idle, absolute } = role === 'contractor' ? ENDS.contractor : ENDS.shop
  return now - Date.parse(seenAt) > idle || now - Date.parse(createdAt) > absolute
}

/** Whose session a token is; undefined when it is none, or has ended. */
export async function sessionOf({ db, clock }: Deps, token: string): Promise<PersonPrincipal | undefined> {
  const tokenHash = hashOf(token)
  const row = await findSession(db, tokenHash)
  const now = clock()
  if (!row) return undefined
  if (hasEnded(row, now.getTime())) {
    await write(db, (trx) => deleteSession(trx, tokenHash))
    return undefined
  }
  if (now.getTime() - Date.parse(row.seenAt) > TOUCH_AFTER) {
    await write(db, (trx) => touchSession(trx, tokenHash, now.toISOString()))
  }
  const { id, name, email, role, companyId } = row
  return { kind: 'person', personId: id, name, email, role, companyId, sessionHash: tokenHash }
}

/** A new session for a right password, with its token. The same words for an unknown e-mail and a wrong password. */
export async function signIn(
  deps: Deps,
  { email, password }: BodyOf<'signIn'>,
  address: string,
): Promise<{ token: string; person: PersonDto }> {
  const { db, clock, passwords } = deps
  const watched = watchedKeys(email, address)
  await holdBack(deps, watched)
  const row = await personToSignIn(db, email)
  const right = await passwords.verify(password, row?.active === 1 ? row.passwordHash : undefined)
  if (!row || !right) {
    await write(db, (trx) => countFailures(trx, watched, clock()))
    return fail('wrong-credentials', 'Check both and try again.')
  }
  const token = randomBytes(32).toString('base64url')
  const at = clock().toISOString()
  return write(db, async (trx) => {
    await forgetFailures(
      trx,
      watched.map(({ key }) => key),
    )
    await insertSession(trx, { tokenHash: hashOf(token), personId: row.id, createdAt: at, seenAt: at })
    await signedIn(trx, row.id, at)
    await recordAudit(trx, { at, who: `${row.name} <${row.email}>`, action: 'signed in', record: row.email })
    return { token, person: await personById(trx, row.id) }
  })
}

async function holdBack({ db, clock }: Deps, watched: readonly Watched[]): Promise<void> {
  const rows = await attemptsOf(
    db,
    watched.map(({ key }) => key),
  )
  const now = clock().getTime()
  const waits = rows.map(({ key, failures, lastAt }) => {
    const wait = waitAfter(failures, watched.find((one) => one.key === key)?.free ?? 0)
    return wait && Date.parse(lastAt) + wait - now
  })
  const wait = Math.max(0, ...waits)
  if (wait === 0) return
  const seconds = Math.ceil(wait / 1000)
  fail('too-many-attempts', `Try again in ${seconds} s.`, { retryAfter: seconds })
}

async function countFailures(trx: Trx, watched: readonly Watched[], now: Date): Promise<void> {
  const rows = await attemptsOf(
    trx,
    watched.map(({ key }) => key),
  )
  for (const { key } of watched) {
    const before = rows.find((row) => row.key === key)
    const fresh = before && now.getTime() - Date.parse(before.lastAt) < FORGOTTEN_MS
    await noteFailure(trx, key, (fresh ? before.failures : 0) + 1, now.toISOString())
  }
}

export async function signOut({ db }: Deps, { sessionHash }: PersonPrincipal): Promise<void> {
  await write(db, (trx) => deleteSession(trx, sessionHash))
}
