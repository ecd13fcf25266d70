import type { Response } from 'express'

/** What a handler returns that has answered already, line by line. */
export const STREAMED = Symbol('streamed')
export type Streamed = typeof STREAMED

/** One JSON object a line (application/x-ndjson), each as soon as it is there. A reader that has gone ends the work. */
export async function streamLines(res: Response, rows: AsyncIterable<unknown>): Promise<Streamed> {
  const [first, rest] = await begin(rows)
  res.status(200).type('application/x-ndjson')
  if (first !== undefined) res.write(`${JSON.stringify(first)}\n`)
  for await (const row of rest) {
    if (res.destroyed) break
    res.write(`${JSON.stringify(row)}\n`)
    res.flush()
  }
  res.end()
  return STREAMED
}

/** What is wrong before the first line can still be answered as a problem. */
async function begin(rows: AsyncIterable<unknown>): Promise<[unknown, AsyncIterable<unknown>]> {
  const iterator = rows[Symbol.asyncIterator]()
  const { value } = (await iterator.next()) as { value: unknown }
  return [value, { [Symbol.asyncIterator]: () => iterator }]
}
