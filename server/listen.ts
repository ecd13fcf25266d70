import type { Server } from 'node:http'

export interface Running {
  stop: () => Promise<void>
}

/** Requests under way are given this long when the server is told to end. */
const GRACE_MS = 8000

/** Listens; rejects when it cannot. `stop` lets requests under way finish. */
export async function listen(server: Server, port: number, host: string | undefined): Promise<Running> {
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, host, () => resolve())
  })
  return {
    stop: () =>
      new Promise((resolve) => {
        const late = setTimeout(() => server.closeAllConnections(), GRACE_MS)
        server.close(() => {
          clearTimeout(late)
          resolve()
        })
        server.closeIdleConnections()
      }),
  }
}
