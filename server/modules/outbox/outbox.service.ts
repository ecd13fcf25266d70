import { randomUUID } from 'node:crypto'
import { z } from 'zod'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { write, type Reader, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { composeMail } from '../../mail/compose-mail.ts'
import type { Letter } from '../../mail/letters.ts'
import { dueLetters, insertLetter, lettersAbout, updateLetter } from './outbox.repo.ts'
import type { OutboxTable } from './outbox.table.ts'

const attachment = z.object({ key: z.string(), fileName: z.string(), contentType: z.string() })

export interface NewLetter {
  letter: Letter
  to: string
  at: string
  quoteId?: string
  orderId?: string
  attachment?: z.infer<typeof attachment>
}

/** Writes a letter in the transaction of what caused it. It is sent once that is kept. */
export async function enqueueMail(trx: Trx, { letter, to, at, ...about }: NewLetter): Promise<void> {
  await insertLetter(trx, {
    id: randomUUID(),
    kind: letter.kind,
    toAddress: to,
    ...composeMail(letter),
    attachment: about.attachment ? JSON.stringify(about.attachment) : null,
    quoteId: about.quoteId ?? null,
    orderId: about.orderId ?? null,
    ...{ status: 'waiting', attempts: 0, nextAt: at, lastError: null, createdAt: at, sentAt: null },
  })
}

const SECOND = 1000
/** While one is at a letter nobody else takes it; one that died over it gives it up after this. */
const LEASE_MS = 60 * SECOND
const MOST_ATTEMPTS = 10
const BATCH = 20

/** Half a minute, doubling to an hour. */
function waitAfter(attempts: number): number {
  return Math.min(30 * SECOND * 2 ** (attempts - 1), 3600 * SECOND)
}

/** Sends what is due. What cannot be sent is tried later, and parked after ten tries. */
export async function deliverDue(deps: Deps): Promise<void> {
  const { db, clock } = deps
  const letters = await write(db, async (trx) => {
    const now = clock()
    const due = await dueLetters(trx, now.toISOString(), BATCH)
    const freeAt = new Date(now.getTime() + LEASE_MS).toISOString()
    for (const { id, attempts } of due)
      await updateLetter(trx, id, { nextAt: freeAt, attempts: attempts + 1 })
    return due
  })
  for (const letter of letters) await deliver(deps, letter)
}

async function deliver(deps: Deps, letter: OutboxTable): Promise<void> {
  const { db, clock, logger } = deps
  const attempts = letter.attempts + 1
  try {
    await send(deps, letter)
    await write(db, (trx) =>
      updateLetter(trx, letter.id, { status: 'sent', sentAt: clock().toISOString(), lastError: null }),
    )
  } catch (error) {
    logger.warn({ err: error, letter: letter.id, attempts }, 'a letter could not be sent')
    const lastError = error instanceof Error ? error.message.slice(0, 500) : 'unknown'
    const nextAt = new Date(clock().getTime() + waitAfter(attempts)).toISOString()
    const parked = attempts >= MOST_ATTEMPTS ? { status: 'parked' as const } : {}
    await write(db, (trx) => updateLetter(trx, letter.id, { lastError, nextAt, ...parked }))
  }
}

async function send({ mailer, storage, config }: Deps, letter: OutboxTable): Promise<void> {
  const file = letter.attachment === null ? undefined : attachment.parse(JSON.parse(letter.attachment))
  const { host } = new URL(config.publicUrl)
  await mailer.sendMail({
    from: config.mail.from,
    to: letter.toAddress,
    subject: letter.subject,
    html: letter.html,
    text: letter.text,
    // Fixed by the letter: one that was sent twice, because we died in between, is known as the same.
    messageId: `<${letter.id}@${host}>`,
    headers: { 'Auto-Submitted': 'auto-generated' },
    ...(file
      ? {
          attachments: [
            {
              filename: file.fileName,
              contentType: file.contentType,
              content: await storage.get(file.key),
            },
          ],
        }
      : {}),
  })
}

/** Letters about a quote, oldest first, with their fate. */
export async function lettersOfQuote(db: Reader, quoteId: string): Promise<NonNullable<QuoteDto['letters']>> {
  const rows = await lettersAbout(db, quoteId)
  return rows.map(({ id, subject, toAddress, status, attempts, createdAt, sentAt }) => ({
    ...{ id, subject, status, attempts, createdAt, sentAt },
    to: toAddress,
  }))
}
