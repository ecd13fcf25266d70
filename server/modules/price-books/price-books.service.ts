import { priceBookSheet } from '../../../shared/pricing/price-book-sheet.ts'
import type { PriceBook } from '../../../shared/pricing/price-book.ts'
import type { AnswerOf } from '../../../shared/contracts/operations.ts'
import type { Reader, Trx } from '../../db/open-database.ts'
import { fail } from '../../errors.ts'
import { bookInForce, bookOfVersion, insertBook } from './price-books.repo.ts'
import type { PriceBooksTable } from './price-books.table.ts'

/** Books are written by us alone and never changed: what comes out is what went in. */
function toBook({ book }: PriceBooksTable): PriceBook {
  return JSON.parse(book) as PriceBook
}

export async function currentBook(db: Reader, now: Date): Promise<PriceBook> {
  const row = await bookInForce(db, now.toISOString().slice(0, 10))
  return row ? toBook(row) : fail('not-allowed-now', 'No price book is in force yet.')
}

/** The book that a quote was priced with. */
export async function bookVersion(db: Reader, version: number): Promise<PriceBook> {
  const row = await bookOfVersion(db, version)
  return row ? toBook(row) : fail('not-found', `There is no price book of version ${version}.`)
}

export async function readPriceBook(db: Reader, now: Date): Promise<AnswerOf<'readPriceBook'>> {
  const book = await currentBook(db, now)
  const { version, firstDay, currency } = book
  return { version, firstDay, currency, groups: priceBookSheet(book) }
}

/** The book that a new shop starts from; nothing when there is one. */
export async function seedPriceBook(trx: Trx, book: PriceBook, at: string): Promise<void> {
  if (await bookOfVersion(trx, book.version)) return
  const { version, firstDay } = book
  await insertBook(trx, { version, firstDay, book: JSON.stringify(book), createdAt: at })
}
