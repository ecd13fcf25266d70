import { createHash } from 'node:crypto'

/** What failures are counted by, each with how many are free before waiting begins. */
const FREE = { both: 5, account: 10, address: 30 } as const
const LONGEST_MS = 60_000
/** After this without a failure the count begins anew. */
export const FORGOTTEN_MS = 3_600_000

export interface Watched {
  key: string
  free: number
}

export function watchedKeys(email: string, address: string): Watched[] {
  const hashed = (text: string) => createHash('sha256').update(text).digest('base64url')
  return [
    { key: `both ${hashed(`${email} ${address}`)}`, free: FREE.both },
    { key: `account ${hashed(email)}`, free: FREE.account },
    { key: `address ${hashed(address)}`, free: FREE.address },
  ]
}

/** The wait doubles with every failure over what is free, to a minute: never a lock that keeps its owner out. */
export function waitAfter(failures: number, free: number): number {
  return failures < free ? 0 : Math.min(1000 * 2 ** Math.min(failures - free, 10), LONGEST_MS)
}
