import { createTransport, type Transporter } from 'nodemailer'
import type { Config } from '../config.ts'

/** A server that hangs is given up well within the time for which a letter is claimed. */
const PATIENCE = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 20_000 }

/** Speaks to the mail server; in demo mode that is the local fake. */
export function createMailer({ mail }: Pick<Config, 'mail'>): Transporter {
  return createTransport({ url: mail.smtpUrl, ...PATIENCE }, { from: mail.from })
}
