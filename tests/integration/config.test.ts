import { mkdtempSync, rmSync, statSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, describe, expect, it } from 'vitest'
import { ConfigFault, readConfig } from '../../server/config.ts'
import { startFakes } from '../../server/fakes.ts'
import { createLogger } from '../../server/logger.ts'
import { readShop } from '../../server/shop.ts'

const dataDir = mkdtempSync(join(tmpdir(), 'plumbrule-config-'))
afterAll(() => rmSync(dataDir, { recursive: true, force: true }))

const REAL = {
  DATA_DIR: dataDir,
  PUBLIC_URL: 'https://desk.example/',
  STRIPE_SECRET_KEY: 'sk_live_x',
  STRIPE_WEBHOOK_SECRET: 'whsec_x',
  SMTP_URL: 'smtps://mail.example',
  MAIL_FROM: 'Shop <quotes@desk.example>',
}

describe('settings', () => {
  it('make the demo when nothing is said, with secrets of its own that only its owner reads', () => {
    const config = readConfig({ DATA_DIR: dataDir })
    expect(config).toMatchObject({ mode: 'demo', port: 4600, host: '127.0.0.1' })
    expect(readConfig({ DATA_DIR: dataDir }).linkKey).toBe(config.linkKey)
    expect(statSync(join(dataDir, 'link.key')).mode & 0o077).toBe(0)
  })

  it('name everything that real work is missing', () => {
    expect(() => readConfig({ DATA_DIR: dataDir, NODE_ENV: 'production' })).toThrow(
      /STRIPE_SECRET_KEY.*SMTP_URL/,
    )
    const { MAIL_FROM: _, ...part } = REAL
    expect(() => readConfig(part)).toThrow(/Missing: MAIL_FROM/)
    expect(() => readConfig({ DATA_DIR: dataDir, PORT: 'many' })).toThrow(ConfigFault)
  })

  it('never bring a fake, a demo shop or a fake’s address into real work', async () => {
    const config = readConfig({ ...REAL, NODE_ENV: 'production' })
    expect(config).toMatchObject({ mode: 'real', publicUrl: 'https://desk.example' })
    expect([config.stripe.fakeUrl, config.mail.fakeUrl]).toEqual([undefined, undefined])
    await expect(startFakes(config, createLogger('silent'))).rejects.toThrow(/for the demo alone/)
    expect(() => readShop({ ...config, dataDir: join(dataDir, 'elsewhere') })).toThrow(/shop\.json/)
  })
})
