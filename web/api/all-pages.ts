interface Page<Item> {
  items: Item[]
  nextCursor: string | null
}

/** A queue is sorted over all that waits: its pages are read one after the other, as far as a person could work off. */
const MOST_PAGES = 10

/** Everything that a list holds; `whole` is false when there is more than ten pages of it. */
export async function allPages<Item>(
  read: (query: { limit: number; cursor?: string }) => Promise<Page<Item>>,
): Promise<{ items: Item[]; whole: boolean }> {
  const items: Item[] = []
  let cursor: string | null = null
  for (let page = 0; page < MOST_PAGES; page += 1) {
    const found: Page<Item> = await read({ limit: 50, ...(cursor === null ? {} : { cursor }) })
    items.push(...found.items)
    cursor = found.nextCursor
    if (cursor === null) return { items, whole: true }
  }
  return { items, whole: false }
}
