import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join, resolve } from 'node:path'
import { z } from 'zod'

const port = z.coerce.number().int().min(1).max(65_000)
const environment = z.object({
  NODE_ENV: z.string().default('development'),
  PORT: port.default(4600),
  HOST: z.string().optional(),
  DATA_DIR: z.string().min(1).default('data'),
  PUBLIC_URL: z.url().optional(),
  STRIPE_SECRET_KEY: z.string().min(1).optional(),
  STRIPE_WEBHOOK_SECRET: z.string().min(1).optional(),
  SMTP_URL: z.url().optional(),
  MAIL_FROM: z.string().min(3).optional(),
  LINK_KEY: z.string().min(32, 'at least 32 characters').optional(),
  TRUST_PROXY: z.coerce.number().int().min(0).max(10).default(0),
  FIRST_ADMIN_EMAIL: z.email().toLowerCase().optional(),
  FIRST_ADMIN_PASSWORD: z.string().min(12, 'at least 12 characters').optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
})

export interface Config {
  /** `demo`: invented people, and local fakes in place of the card processor and the mail server. */
  mode: 'demo' | 'real'
  port: number
  host: string | undefined
  dataDir: string
  publicUrl: string
  stripe: {
    secretKey: string
    webhookSecret: string
    /** Where its API is, when it is the local fake. */
    fakeUrl: string | undefined
  }
  mail: { smtpUrl: string; from: string; fakeUrl: string | undefined }
  linkKey: string
  trustProxy: number
  logLevel: string
  /** Made at the first start where there are no demo people. */
  firstAdmin: { email: string; password: string } | undefined
}

/** What is needed where there is real money and real mail. */
const NEEDED = ['STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET', 'SMTP_URL', 'MAIL_FROM', 'PUBLIC_URL'] as const

export class ConfigFault extends Error {}

/** A secret that is made once and kept beside the data. */
function keptSecret(dataDir: string, name: string): string {
  const file = join(dataDir, name)
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 })
  return readFileSync(file, 'utf8').trim()
}

function firstAdminIn(vars: z.infer<typeof environment>): Config['firstAdmin'] {
  const { FIRST_ADMIN_EMAIL: email, FIRST_ADMIN_PASSWORD: password } = vars
  return email && password ? { email, password } : undefined
}

/** Reads the environment once. Throws `ConfigFault` naming each variable that is wrong or missing. */
export function readConfig(env: Record<string, string | undefined> = process.env): Config {
  const given = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''))
  const parsed = environment.safeParse(given)
  if (!parsed.success) {
    const faults = parsed.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
    throw new ConfigFault(faults.join('\n'))
  }
  const vars = parsed.data
  const mode = vars.NODE_ENV === 'production' || vars.STRIPE_SECRET_KEY || vars.SMTP_URL ? 'real' : 'demo'
  const missing = mode === 'real' ? NEEDED.filter((name) => vars[name] === undefined) : []
  if (missing.length > 0) {
    throw new ConfigFault(
      `Missing: ${missing.join(', ')}. With all of them unset, and NODE_ENV not production, the demo runs.`,
    )
  }
  const dataDir = resolve(vars.DATA_DIR)
  mkdirSync(dataDir, { recursive: true, mode: 0o700 })
  const demo = mode === 'demo'
  return {
    mode,
    port: vars.PORT,
    host: vars.HOST ?? (demo ? '127.0.0.1' : undefined),
    dataDir,
    publicUrl: (vars.PUBLIC_URL ?? `http://localhost:${vars.PORT}`).replace(/\/$/, ''),
    stripe: {
      secretKey: vars.STRIPE_SECRET_KEY ?? 'sk_test_local',
      webhookSecret: vars.STRIPE_WEBHOOK_SECRET ?? `whsec_${keptSecret(dataDir, 'webhook.key')}`,
      fakeUrl: demo ? `http://localhost:${vars.PORT + 1}` : undefined,
    },
    mail: {
      smtpUrl: vars.SMTP_URL ?? `smtp://localhost:${vars.PORT + 3}`,
      from: vars.MAIL_FROM ?? 'Larkfield Steelworks <quotes@larkfield.example>',
      fakeUrl: demo ? `http://localhost:${vars.PORT + 2}` : undefined,
    },
    linkKey: vars.LINK_KEY ?? keptSecret(dataDir, 'link.key'),
    trustProxy: vars.TRUST_PROXY,
    logLevel: vars.LOG_LEVEL,
    firstAdmin: firstAdminIn(vars),
  }
}
