import { createHash, randomUUID } from 'node:crypto'
import { mkdir, open, readFile, rename } from 'node:fs/promises'
import { join } from 'node:path'

export interface StoredFile {
  key: string
  sha256: string
  size: number
}

/** Where documents and uploads are kept: a folder now. A file is never changed. */
export interface Storage {
  put: (bytes: Uint8Array) => Promise<StoredFile>
  /** Throws when it is not there. */
  get: (key: string) => Promise<Buffer>
}

const KEY = /^[0-9a-f-]{36}$/

export function createStorage(folder: string): Storage {
  return {
    async put(bytes) {
      await mkdir(folder, { recursive: true, mode: 0o700 })
      const key = randomUUID()
      const temporary = join(folder, `${key}.part`)
      const file = await open(temporary, 'wx', 0o600)
      try {
        await file.writeFile(bytes)
        await file.sync()
      } finally {
        await file.close()
      }
      await rename(temporary, join(folder, key))
      await syncFolder(folder)
      const sha256 = createHash('sha256').update(bytes).digest('hex')
      return { key, sha256, size: bytes.byteLength }
    },
    get(key) {
      if (!KEY.test(key)) throw new Error('not a key of the store')
      return readFile(join(folder, key))
    },
  }
}

/** The name of a new file is safe only when its folder is. */
async function syncFolder(folder: string): Promise<void> {
  const handle = await open(folder, 'r')
  try {
    await handle.sync()
  } finally {
    await handle.close()
  }
}
