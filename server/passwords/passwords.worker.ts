import { compare, hash } from 'bcryptjs'

const COST = 12

export type PasswordTask = { do: 'hash'; digest: string } | { do: 'verify'; digest: string; hash: string }

/** Piscina's task. It takes a tenth of a second or so: in the main thread it would hold up everybody. */
export default function work(task: PasswordTask): Promise<string | boolean> {
  return task.do === 'hash' ? hash(task.digest, COST) : compare(task.digest, task.hash)
}
