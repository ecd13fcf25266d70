import { sql, type RawBuilder, type SqlBool } from 'kysely'
import type { Cursor } from './cursor.ts'

/** In a list that is newest first: what comes after the row of a cursor. */
export function olderThan(at: string, id: string, cursor: Cursor): RawBuilder<SqlBool> {
  return sql<SqlBool>`(${sql.ref(at)}, ${sql.ref(id)}) < (${cursor.at}, ${cursor.id})`
}

/** Whether one of these columns has a text in it; what a person types has no wildcards. */
export function containsText(text: string, ...columns: string[]): RawBuilder<SqlBool> {
  const pattern = `%${text.replaceAll(/[\\%_]/g, (sign) => `\\${sign}`)}%`
  const each = columns.map((column) => sql`${sql.ref(column)} like ${pattern} escape '\\'`)
  return sql<SqlBool>`(${sql.join(each, sql` or `)})`
}
