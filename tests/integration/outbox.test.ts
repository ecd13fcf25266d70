import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { write } from '../../server/db/open-database.ts'
import type { Running } from '../../server/listen.ts'
import { startMailFake } from '../../server/mail/fake/start-mail-fake.ts'
import { deliverDue, enqueueMail } from '../../server/modules/outbox/outbox.service.ts'
import { START, startTestApp, type TestApp } from '../support/test-app.ts'

/* Letters through nodemailer to a mail server on this machine, which is there or is not. */

let app: TestApp
let mail: Running | undefined
beforeAll(async () => {
  app = await startTestApp()
})
afterAll(() => app.stop())
beforeEach(async () => {
  app.setClock(START)
  await app.deps.db.deleteFrom('outbox').execute()
  rmSync(join(app.deps.config.dataDir, 'mail'), { recursive: true, force: true })
})
afterEach(async () => {
  await mail?.stop()
  mail = undefined
})

async function startMail(): Promise<void> {
  mail = await startMailFake(app.deps.config, app.deps.logger)
}

const PDF = Buffer.from('%PDF-1.7 not much of one')

async function enqueue(withFile = false): Promise<void> {
  const { db, storage, clock } = app.deps
  const file = withFile ? await storage.put(PDF) : undefined
  await write(db, (trx) =>
    enqueueMail(trx, {
      letter: {
        kind: 'request received',
        data: {
          ...{ name: 'Maren', shop: 'The shop', number: 'R-1', title: 'Ferry hall', marks: 1, pieces: 4 },
          url: 'http://localhost/requests/1',
        },
      },
      ...{ to: 'maren@example.test', at: clock().toISOString() },
      ...(file
        ? { attachment: { key: file.key, fileName: 'Überdachung.pdf', contentType: 'application/pdf' } }
        : {}),
    }),
  )
}

const secondsAfterStart = (seconds: number) => new Date(Date.parse(START) + seconds * 1000).toISOString()

async function onlyLetter() {
  return app.deps.db.selectFrom('outbox').selectAll().executeTakeFirstOrThrow()
}

interface Shown {
  id: string
  to: string
  subject: string
  messageId: string
  html: string
  text: string
  attachments: { fileName: string; contentType: string; url: string }[]
}

async function mailbox(path: string): Promise<Response> {
  // The server behind the address is another one in every test: no connection is kept.
  return fetch(`${app.deps.config.mail.fakeUrl}${path}`, { headers: { Connection: 'close' } })
}

async function mailsInBox(): Promise<Shown[]> {
  const list = (await (await mailbox('/letters.json')).json()) as { id: string }[]
  return Promise.all(
    list.map(async ({ id }) => (await (await mailbox(`/letters/${id}.json`)).json()) as Shown),
  )
}

describe('a letter', () => {
  it('arrives with its file, in both forms, and is still in the mailbox after a restart of it', async () => {
    await startMail()
    await enqueue(true)
    await deliverDue(app.deps)
    expect(await onlyLetter()).toMatchObject({ status: 'sent', attempts: 1, lastError: null })
    await mail?.stop()
    await startMail()
    const [got, ...more] = await mailsInBox()
    expect(more).toEqual([])
    const { id } = await onlyLetter()
    expect(got).toMatchObject({
      ...{ to: 'maren@example.test', subject: 'We have your request R-1' },
      messageId: `<${id}@localhost>`,
      attachments: [{ fileName: 'Überdachung.pdf', contentType: 'application/pdf' }],
    })
    expect(got?.text).toContain('1 mark, 4 pieces')
    expect(got?.html).toContain('1 mark, 4 pieces')
    const file = await mailbox(got?.attachments[0]?.url ?? '')
    expect(Buffer.from(await file.arrayBuffer())).toEqual(PDF)
  })

  it('of something that was not kept is not there either', async () => {
    const { db, clock } = app.deps
    await expect(
      write(db, async (trx) => {
        await enqueueMail(trx, {
          letter: {
            kind: 'payment failed',
            data: {
              ...{ name: 'M', shop: 'S', order: 'O-1', title: 'T', amount: 'USD 1.00', reason: 'No.' },
              url: 'http://localhost/',
            },
          },
          ...{ to: 'maren@example.test', at: clock().toISOString() },
        })
        throw new Error('the rest went wrong')
      }),
    ).rejects.toThrow('the rest went wrong')
    expect(await db.selectFrom('outbox').selectAll().execute()).toEqual([])
  })

  it('waits while the mail server is away, longer each time, and goes out once it is back', async () => {
    await enqueue()
    await deliverDue(app.deps)
    const first = await onlyLetter()
    expect(first).toMatchObject({ status: 'waiting', attempts: 1 })
    expect(first.lastError).toMatch(/ECONNREFUSED/)
    // Not before its turn.
    await deliverDue(app.deps)
    expect((await onlyLetter()).attempts).toBe(1)
    app.setClock(secondsAfterStart(60))
    await deliverDue(app.deps)
    const second = await onlyLetter()
    expect(second.attempts).toBe(2)
    expect(Date.parse(second.nextAt) - Date.parse(secondsAfterStart(60))).toBeGreaterThan(
      Date.parse(first.nextAt) - Date.parse(START),
    )
    await startMail()
    app.setClock(secondsAfterStart(600))
    await deliverDue(app.deps)
    expect(await onlyLetter()).toMatchObject({ status: 'sent', attempts: 3, lastError: null })
    expect(await mailsInBox()).toHaveLength(1)
  })

  it('is parked after ten tries, and tried no more', async () => {
    await enqueue()
    for (let hour = 0; hour < 12; hour += 1) {
      app.setClock(secondsAfterStart(hour * 7200))
      await deliverDue(app.deps)
    }
    expect(await onlyLetter()).toMatchObject({ status: 'parked', attempts: 10 })
  })

  it('is sent by one of two who are at it together', async () => {
    await startMail()
    await enqueue()
    await Promise.all([deliverDue(app.deps), deliverDue(app.deps)])
    expect(await mailsInBox()).toHaveLength(1)
  })

  it('is free again some time after whoever had it died', async () => {
    await startMail()
    await enqueue()
    await app.deps.db
      .updateTable('outbox')
      .set({ attempts: 1, nextAt: secondsAfterStart(120) })
      .execute()
    await deliverDue(app.deps)
    expect(await mailsInBox()).toEqual([])
    app.setClock(secondsAfterStart(121))
    await deliverDue(app.deps)
    expect(await onlyLetter()).toMatchObject({ status: 'sent', attempts: 2 })
  })

  it('sent twice, because we died before it was noted, is known as the same by its number', async () => {
    await startMail()
    await enqueue()
    await deliverDue(app.deps)
    await app.deps.db.updateTable('outbox').set({ status: 'waiting', nextAt: START }).execute()
    await deliverDue(app.deps)
    const [one, other] = await mailsInBox()
    expect(one?.messageId).toBe(other?.messageId)
    expect(one?.id).not.toBe(other?.id)
  })

  it('stays sent when a slower try, that was overtaken, ends badly', async () => {
    await startMail()
    await enqueue()
    const { mailer } = app.deps
    const slow = Object.assign(Object.create(mailer) as typeof mailer, {
      async sendMail() {
        app.setClock(secondsAfterStart(600))
        await deliverDue(app.deps)
        throw new Error('the connection hung')
      },
    })
    await deliverDue({ ...app.deps, mailer: slow })
    expect(await onlyLetter()).toMatchObject({ status: 'sent', attempts: 2, lastError: null })
  })
})

describe('the mailbox', () => {
  it('shows a letter as a page in which nothing of it runs', async () => {
    await startMail()
    await enqueue()
    await deliverDue(app.deps)
    const [letter] = await mailsInBox()
    const list = await (await mailbox('/')).text()
    expect(list).toContain(`<a href="/letters/${letter?.id}">We have your request R-1</a>`)
    const html = await mailbox(`/letters/${letter?.id}/html`)
    expect(html.headers.get('content-security-policy')).toMatch(/sandbox.*default-src 'none'/)
    expect((await mailbox('/letters/1.json')).status).toBe(404)
  })
})
