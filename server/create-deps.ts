import { join } from 'node:path'
import { catalogue } from '../seeds/reference/catalogue.ts'
import type { Config } from './config.ts'
import { openDatabase } from './db/open-database.ts'
import type { Deps } from './deps.ts'
import { createEngine } from './engine/engine.ts'
import { createLinks } from './http/links.ts'
import { createLogger } from './logger.ts'
import { createMailer } from './mail/mailer.ts'
import { createPasswords } from './passwords/passwords.ts'
import { createStripe } from './payments/stripe-client.ts'
import { createDocumentPress } from './pdf/document-press.ts'
import { readShop } from './shop.ts'
import { createStorage } from './storage/storage.ts'
import { workerFile } from './worker-file.ts'

/** The real things, as the configuration says. */
export function createDeps(config: Config, clock: () => Date = () => new Date()): Deps {
  return {
    config,
    clock,
    logger: createLogger(config.logLevel),
    db: openDatabase(join(config.dataDir, 'plumbrule.db')),
    links: createLinks(config.linkKey),
    passwords: createPasswords(workerFile('passwords', 'passwords')),
    storage: createStorage(join(config.dataDir, 'files')),
    press: createDocumentPress(workerFile('pdf', 'quote-document')),
    engine: createEngine(workerFile('engine', 'engine')),
    mailer: createMailer(config),
    stripe: createStripe(config),
    shop: readShop(config),
    catalogue,
  }
}

export async function closeDeps({ db, engine, passwords, press, mailer }: Deps): Promise<void> {
  mailer.close()
  await Promise.all([engine.close(), passwords.close(), press.close()])
  await db.destroy()
}
