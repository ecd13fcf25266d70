import type { Reader } from '../../db/open-database.ts'

export async function storeAnswers(db: Reader): Promise<void> {
  await db.selectFrom('counters').select('kind').limit(1).execute()
}
