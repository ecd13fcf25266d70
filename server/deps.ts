import type { Transporter } from 'nodemailer'
import type { Logger } from 'pino'
import type Stripe from 'stripe'
import type { Catalogue } from '../shared/sections/catalogue.ts'
import type { Config } from './config.ts'
import type { Db } from './db/open-database.ts'
import type { Engine } from './engine/engine.ts'
import type { Links } from './http/links.ts'
import type { Passwords } from './passwords/passwords.ts'
import type { DocumentPress } from './pdf/document-press.ts'
import type { Shop } from './shop.ts'
import type { Storage } from './storage/storage.ts'

/** Everything that the modules are given: no module reaches for the outside by itself. */
export interface Deps {
  config: Config
  logger: Logger
  db: Db
  clock: () => Date
  links: Links
  passwords: Passwords
  storage: Storage
  press: DocumentPress
  engine: Engine
  mailer: Transporter
  stripe: Stripe
  catalogue: Catalogue
  shop: Shop
}
