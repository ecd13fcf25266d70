import type { AnswerOf, QueryOf } from '../../../shared/contracts/operations.ts'
import type { PersonDto } from '../../../shared/contracts/session.ts'
import { pageFrom, readCursor } from '../../db/cursor.ts'
import type { Db, Reader, Trx } from '../../db/open-database.ts'
import { notFound } from '../../errors.ts'
import { toPerson } from './people.map.ts'
import {
  anyPerson,
  findPerson,
  findPersonByEmail,
  insertPerson,
  noteSignIn,
  peopleAfter,
  type PersonRow,
} from './people.repo.ts'

export async function listPeople(
  db: Db,
  { limit, cursor, q }: QueryOf<'listPeople'>,
): Promise<AnswerOf<'listPeople'>> {
  const rows = await peopleAfter(db, readCursor(cursor), q, limit + 1)
  return pageFrom(
    rows,
    limit,
    (row) => ({ at: row.name, id: row.id }),
    (row) => ({ ...toPerson(row), active: row.active === 1, lastSignInAt: row.lastSignInAt }),
  )
}

/** With the hash of the password: for signing in only. */
export function personToSignIn(db: Reader, email: string): Promise<PersonRow | undefined> {
  return findPersonByEmail(db, email)
}

export async function personById(db: Reader, id: string): Promise<PersonDto> {
  return toPerson((await findPerson(db, id)) ?? notFound('person'))
}

export function signedIn(trx: Trx, id: string, at: string): Promise<void> {
  return noteSignIn(trx, id, at)
}

export function addPerson(trx: Trx, row: Parameters<typeof insertPerson>[1]): Promise<void> {
  return insertPerson(trx, row)
}

export function hasPeople(db: Reader): Promise<boolean> {
  return anyPerson(db)
}
