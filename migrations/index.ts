import type { Migration } from 'kysely'
import * as foundation from './001-foundation.ts'

/** In order. A migration that has landed is never edited: the next change is the next number. */
export const migrations: Record<string, Migration> = {
  '001-foundation': foundation,
}
