import { fail } from '../errors.ts'

/** Lists are walked by key: the sort value of the last row and, where two rows share it, its id. */
export interface Cursor {
  at: string
  id: string
}

export function writeCursor(cursor: Cursor): string {
  return Buffer.from(JSON.stringify([cursor.at, cursor.id])).toString('base64url')
}

export function readCursor(text: string | undefined): Cursor | undefined {
  if (text === undefined) return undefined
  try {
    const [at, id] = JSON.parse(Buffer.from(text, 'base64url').toString()) as unknown[]
    if (typeof at === 'string' && typeof id === 'string') return { at, id }
  } catch {
    // Falls to the refusal below: whatever it was, it is no cursor of ours.
  }
  return fail('invalid-input', 'This list cannot be continued.', {
    issues: [{ path: 'cursor', message: 'the nextCursor of the answer before, or left out' }],
  })
}

/** A page of `limit` rows out of the `limit + 1` that were asked for. */
export function pageFrom<Row, Item>(
  rows: readonly Row[],
  limit: number,
  cursorOf: (row: Row) => Cursor,
  toItem: (row: Row) => Item,
): { items: Item[]; nextCursor: string | null } {
  const shown = rows.slice(0, limit)
  const last = shown.at(-1)
  return {
    items: shown.map(toItem),
    nextCursor: rows.length > limit && last ? writeCursor(cursorOf(last)) : null,
  }
}
