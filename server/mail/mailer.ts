import { createTransport, type Transporter } from 'nodemailer'
import type { Config } from '../config.ts'

/** Speaks to the mail server; in demo mode that is the local fake. */
export function createMailer({ mail }: Pick<Config, 'mail'>): Transporter {
  return createTransport(mail.smtpUrl, { from: mail.from })
}
