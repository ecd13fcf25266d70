import type { Migration } from 'kysely'
import * as foundation from './001-foundation.ts'
import * as quoting from './002-quoting.ts'
import * as money from './003-money.ts'

/** In order. A migration that has landed is never edited: the next change is the next number. */
export const migrations: Record<string, Migration> = {
  '001-foundation': foundation,
  '002-quoting': quoting,
  '003-money': money,
}
