import { Migrator } from 'kysely'
import { migrations } from '../../migrations/index.ts'
import type { Db } from './open-database.ts'

/** Brings the file to the newest form; forward only. Throws the first fault. */
export async function migrate(db: Db): Promise<void> {
  const migrator = new Migrator({ db, provider: { getMigrations: () => Promise.resolve(migrations) } })
  const { error } = await migrator.migrateToLatest()
  if (error) throw error
}
