import type { Insertable } from 'kysely'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { SessionsTable, SignInAttemptsTable } from './sessions.table.ts'

function sessions(db: Reader) {
  return db
    .selectFrom('sessions')
    .innerJoin('people', 'people.id', 'sessions.personId')
    .select(['sessions.tokenHash', 'sessions.createdAt', 'sessions.seenAt'])
    .select(['people.id', 'people.name', 'people.email', 'people.role', 'people.companyId'])
    .where('people.active', '=', 1)
}
export type SessionRow = Awaited<ReturnType<ReturnType<typeof sessions>['executeTakeFirstOrThrow']>>

export function findSession(db: Reader, tokenHash: string): Promise<SessionRow | undefined> {
  return sessions(db).where('sessions.tokenHash', '=', tokenHash).executeTakeFirst()
}

export async function insertSession(trx: Trx, row: Insertable<SessionsTable>): Promise<void> {
  await trx.insertInto('sessions').values(row).execute()
}

export async function touchSession(trx: Trx, tokenHash: string, at: string): Promise<void> {
  await trx.updateTable('sessions').set({ seenAt: at }).where('tokenHash', '=', tokenHash).execute()
}

export async function deleteSession(trx: Trx, tokenHash: string): Promise<void> {
  await trx.deleteFrom('sessions').where('tokenHash', '=', tokenHash).execute()
}

export function attemptsOf(db: Reader, keys: readonly string[]): Promise<SignInAttemptsTable[]> {
  return db.selectFrom('signInAttempts').selectAll().where('key', 'in', keys).execute()
}

export async function noteFailure(trx: Trx, key: string, failures: number, at: string): Promise<void> {
  await trx
    .insertInto('signInAttempts')
    .values({ key, failures, lastAt: at })
    .onConflict((conflict) => conflict.column('key').doUpdateSet({ failures, lastAt: at }))
    .execute()
}

export async function forgetFailures(trx: Trx, keys: readonly string[]): Promise<void> {
  await trx.deleteFrom('signInAttempts').where('key', 'in', keys).execute()
}
