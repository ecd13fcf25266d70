import { Piscina } from 'piscina'
import { createHash } from 'node:crypto'
import type { PasswordTask } from './passwords.worker.ts'

export interface Passwords {
  hash: (password: string) => Promise<string>
  /** Takes as long for an unknown person (`undefined`) as for a known one. */
  verify: (password: string, hash: string | undefined) => Promise<boolean>
  close: () => Promise<void>
}

/** Of no password at all. */
const NOBODY = '$2b$12$ewHdifCWdvr65xhONr89Y.zIanPisW1M254t7D8qKTu5Fawafyfji'

/** bcrypt stops at 72 bytes: it is given a digest, so that every letter of a long password counts. */
function digestOf(password: string): string {
  return createHash('sha384').update(password.normalize('NFKC')).digest('base64')
}

export function createPasswords(workerFile: string): Passwords {
  const pool = new Piscina<PasswordTask, string | boolean>({
    filename: workerFile,
    execArgv: workerFile.endsWith('.ts') ? ['--import', 'tsx'] : [],
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: 60_000,
  })
  return {
    hash: async (password) => String(await pool.run({ do: 'hash', digest: digestOf(password) })),
    async verify(password, hash) {
      const same = await pool.run({ do: 'verify', digest: digestOf(password), hash: hash ?? NOBODY })
      return same === true && hash !== undefined
    },
    close: () => pool.destroy(),
  }
}
