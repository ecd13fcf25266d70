import express from 'express'
import { createServer } from 'node:http'
import type { Logger } from 'pino'
import { SMTPServer } from 'smtp-server'
import type { Config } from '../../config.ts'
import { listen, type Running } from '../../listen.ts'
import { MailStore } from './mail-store.ts'
import { mailboxPage } from './mailbox-page.ts'

/** A mail server that keeps what it is given, and a page to read it. Never outside demo mode. */
export async function startMailFake(config: Config, logger: Logger): Promise<Running> {
  const { fakeUrl, smtpUrl } = config.mail
  if (config.mode !== 'demo' || fakeUrl === undefined) throw new Error('the mail fake is for the demo alone')
  const store = new MailStore(config.dataDir)
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    onData(stream, _session, callback) {
      const chunks: Buffer[] = []
      stream.on('data', (chunk: Buffer) => chunks.push(chunk))
      stream.on('end', () => {
        try {
          store.keep(Buffer.concat(chunks))
          callback()
        } catch (error) {
          callback(error instanceof Error ? error : new Error('could not be kept'))
        }
      })
    },
  })
  smtp.on('error', (error: Error) => logger.warn({ err: error }, 'the mail fake'))
  await new Promise<void>((resolve, reject) => {
    smtp.once('error', reject)
    smtp.listen(Number(new URL(smtpUrl).port), config.host, () => resolve())
  })
  const app = express()
  app.disable('x-powered-by')
  app.use(mailboxPage(store))
  const page = await listen(createServer(app), Number(new URL(fakeUrl).port), config.host)
  return {
    async stop() {
      await new Promise<void>((resolve) => smtp.close(() => resolve()))
      await page.stop()
    },
  }
}
