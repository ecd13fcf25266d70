import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { simpleParser, type ParsedMail } from 'mailparser'

const FILE = /^[\w-]+\.eml$/

/** Mails that the demo has "sent", each a file as it came over the wire. */
export class MailStore {
  readonly #folder: string
  #last = 0

  constructor(dataDir: string) {
    this.#folder = join(dataDir, 'mail')
    mkdirSync(this.#folder, { recursive: true })
  }

  keep(raw: Buffer): void {
    // Names sort as the mails came, also within one millisecond.
    this.#last = Math.max(Date.now(), this.#last + 1)
    const file = join(this.#folder, `${this.#last}.eml`)
    writeFileSync(`${file}.part`, raw)
    renameSync(`${file}.part`, file)
  }

  /** Newest first. */
  ids(): string[] {
    return readdirSync(this.#folder)
      .filter((name) => FILE.test(name))
      .map((name) => name.replace('.eml', ''))
      .sort((a, b) => Number(b) - Number(a))
  }

  async read(id: string): Promise<ParsedMail | undefined> {
    return this.ids().includes(id) ? simpleParser(readFileSync(join(this.#folder, `${id}.eml`))) : undefined
  }
}
