import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

/** The file of a worker: built beside us, or the source under tsx and in tests. */
export function workerFile(folder: string, name: string): string {
  const built = fileURLToPath(new URL(`./${name}.worker.js`, import.meta.url))
  return existsSync(built) ? built : fileURLToPath(new URL(`./${folder}/${name}.worker.ts`, import.meta.url))
}
