import { randomUUID } from 'node:crypto'
import { z } from 'zod'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { write, type Reader, type Trx } from '../../db/open-database.ts'
import type { Deps } from '../../deps.ts'
import { composeMail } from '../../mail/compose-mail.ts'
import type { Letter } from '../../mail/letters.ts'
import { dueLetter, insertLetter, lettersAbout, updateFailedTry, updateLetter } from './outbox.repo.ts'
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
const LEASE_MS = 120 * SECOND
const MOST_ATTEMPTS = 10
const MOST_PER_TURN = 20

/** Half a minute, doubling to an hour. */
function waitAfter(attempts: number): number {
  return Math.min(30 * SECOND * 2 ** (attempts - 1), 3600 * SECOND)
}

/** Sends what is due. What cannot be sent is tried later, and parked after ten tries. */
export async function deliverDue(deps: Deps): Promise<void> {
  for (let turn = 0; turn < MOST_PER_TURN; turn += 1) {
    const letter = await claimNext(deps)
    if (!letter) return
    await deliver(deps, letter)
  }
}

/** One at a time: the time for which it is claimed is then for sending this one alone. */
function claimNext({ db, clock }: Deps): Promise<OutboxTable | undefined> {
  return write(db, async (trx) => {
    const now = clock()
    const letter = await dueLetter(trx, now.toISOString())
    if (!letter) return undefined
    const claim = {
      nextAt: new Date(now.getTime() + LEASE_MS).toISOString(),
      attempts: letter.attempts + 1,
    }
    await updateLetter(trx, letter.id, claim)
    return { ...letter, ...claim }
  })
}

async function deliver(deps: Deps, letter: OutboxTable): Promise<void> {
  const { db, clock, logger } = deps
  const { attempts } = letter
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
    await write(db, (trx) => updateFailedTry(trx, letter, { lastError, nextAt, ...parked }))
  }
}

async function send({ mailer, storage, config }: Deps, letter: OutboxTable): Promise<void> {
  const file = letter.attachment === null ? undefined : attachment.parse(JSON.parse(letter.attachment))
  // Without the port: a colon may not stand there (RFC 5322, 3.6.4).
  const { hostname } = new URL(config.publicUrl)
  await mailer.sendMail({
    from: config.mail.from,
    to: letter.toAddress,
    subject: letter.subject,
    html: letter.html,
    text: letter.text,
    // Fixed by the letter: one that was sent twice, because we died in between, is known as the same.
    messageId: `<${letter.id}@${hostname}>`,
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
