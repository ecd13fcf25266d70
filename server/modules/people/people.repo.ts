import type { Insertable } from 'kysely'
import type { Cursor } from '../../db/cursor.ts'
import { containsText } from '../../db/list-conditions.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import type { PeopleTable } from './people.table.ts'

function people(db: Reader) {
  return db
    .selectFrom('people')
    .leftJoin('companies', 'companies.id', 'people.companyId')
    .selectAll('people')
    .select('companies.name as companyName')
}
export type PersonRow = Awaited<ReturnType<ReturnType<typeof people>['executeTakeFirstOrThrow']>>

export function findPersonByEmail(db: Reader, email: string): Promise<PersonRow | undefined> {
  return people(db).where('people.email', '=', email).executeTakeFirst()
}

export function findPerson(db: Reader, id: string): Promise<PersonRow | undefined> {
  return people(db).where('people.id', '=', id).executeTakeFirst()
}

export function peopleAfter(
  db: Reader,
  cursor: Cursor | undefined,
  text: string | undefined,
  limit: number,
): Promise<PersonRow[]> {
  return people(db)
    .$if(cursor !== undefined, (query) =>
      query.where((is) =>
        is.or([
          is('people.name', '>', cursor?.at ?? ''),
          is.and([is('people.name', '=', cursor?.at ?? ''), is('people.id', '>', cursor?.id ?? '')]),
        ]),
      ),
    )
    .$if(!!text, (query) => query.where(containsText(text ?? '', 'people.name', 'people.email')))
    .orderBy('people.name')
    .orderBy('people.id')
    .limit(limit)
    .execute()
}

export async function insertPerson(trx: Trx, row: Insertable<PeopleTable>): Promise<void> {
  await trx.insertInto('people').values(row).execute()
}

export async function noteSignIn(trx: Trx, id: string, at: string): Promise<void> {
  await trx.updateTable('people').set({ lastSignInAt: at }).where('id', '=', id).execute()
}

export async function anyPerson(db: Reader): Promise<boolean> {
  return (await db.selectFrom('people').select('id').limit(1).executeTakeFirst()) !== undefined
}
