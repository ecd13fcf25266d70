import { createServer } from 'node:net'

/** Four free ports in a row: application, card page, mailbox, SMTP. */
export async function freePorts(): Promise<number> {
  const isFree = (port: number) =>
    new Promise<boolean>((resolve) => {
      const probe = createServer()
      probe.once('error', () => resolve(false))
      probe.listen(port, '127.0.0.1', () => probe.close(() => resolve(true)))
    })
  for (let attempt = 0; attempt < 50; attempt += 1) {
    const first = 20_000 + Math.floor(Math.random() * 20_000)
    const free = await Promise.all([0, 1, 2, 3].map((offset) => isFree(first + offset)))
    if (free.every(Boolean)) return first
  }
  throw new Error('no four free ports in a row')
}
