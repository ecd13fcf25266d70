import { Router } from 'express'
import type { AddressObject, ParsedMail } from 'mailparser'
import { fakePage } from '../../fake-page.ts'
import { escapeHtml } from '../../html.ts'
import type { MailStore } from './mail-store.ts'

function addressText(address: AddressObject | AddressObject[] | undefined): string {
  return [address ?? []]
    .flat()
    .map(({ text }) => text)
    .join(', ')
}

function summaryOf(id: string, mail: ParsedMail) {
  return {
    id,
    to: addressText(mail.to),
    from: addressText(mail.from),
    subject: mail.subject ?? '',
    date: mail.date?.toISOString() ?? null,
  }
}

function letterOf(id: string, mail: ParsedMail) {
  return {
    ...summaryOf(id, mail),
    messageId: mail.messageId ?? null,
    text: mail.text ?? '',
    html: mail.html || '',
    attachments: mail.attachments.map(({ filename, contentType, size }, index) => ({
      ...{ fileName: filename ?? '', contentType, size },
      url: `/letters/${id}/attachments/${index}`,
    })),
  }
}

/** The mailbox of the demo: whoever a mail was for, it is here, to be read as a page or as JSON. */
export function mailboxPage(store: MailStore): Router {
  const router = Router()

  async function all() {
    const mails = await Promise.all(
      store
        .ids()
        .slice(0, 200)
        .map(async (id) => ({ id, mail: await store.read(id) })),
    )
    return mails.flatMap(({ id, mail }) => (mail ? [summaryOf(id, mail)] : []))
  }

  router.get('/letters.json', async (_req, res) => void res.json(await all()))
  router.get('/letters/:id.json', async (req, res) => {
    const mail = await store.read(req.params.id)
    if (!mail) return void res.sendStatus(404)
    return void res.json(letterOf(req.params.id, mail))
  })
  router.get('/letters/:id/attachments/:index', async (req, res) => {
    const mail = await store.read(req.params.id)
    const file = mail?.attachments[Number(req.params.index)]
    if (!file) return void res.sendStatus(404)
    return void res.type(file.contentType).send(file.content)
  })
  router.get('/letters/:id/html', async (req, res) => {
    const mail = await store.read(req.params.id)
    if (!mail?.html) return void res.sendStatus(404)
    // It came by mail: it is shown, and nothing in it runs.
    res.set(
      'Content-Security-Policy',
      "sandbox allow-popups allow-top-navigation-by-user-activation; default-src 'none'; style-src 'unsafe-inline'",
    )
    return void res.type('html').send(mail.html.replace('<head>', '<head><base target="_top">'))
  })
  router.get('/letters/:id', async (req, res) => {
    const { id } = req.params
    const mail = await store.read(id)
    if (!mail) return void res.status(404).send(fakePage('Practice mailbox', '<h1>No such mail</h1>'))
    return void res.send(fakePage(mail.subject ?? 'Mail', letterBody(letterOf(id, mail))))
  })
  router.get('/', async (_req, res) => void res.send(fakePage('Practice mailbox', listBody(await all()))))
  return router
}

function letterBody({ id, to, from, subject, date, text, attachments }: ReturnType<typeof letterOf>): string {
  const files = attachments
    .map(({ url, fileName }) => `<a href="${escapeHtml(url)}">${escapeHtml(fileName)}</a>`)
    .join(', ')
  return `<p class="quiet"><a href="/">Practice mailbox</a></p>
<h1>${escapeHtml(subject)}</h1>
<dl><dt>To</dt><dd>${escapeHtml(to)}</dd><dt>From</dt><dd>${escapeHtml(from)}</dd><dt>At</dt><dd>${escapeHtml(date ?? '')}</dd>
${files ? `<dt>With it</dt><dd>${files}</dd>` : ''}</dl>
<iframe title="The mail as HTML" src="/letters/${escapeHtml(id)}/html"></iframe>
<h2>As plain text</h2><pre>${escapeHtml(text)}</pre>`
}

function listBody(mails: ReturnType<typeof summaryOf>[]): string {
  const rows = mails.map(
    ({ id, to, subject, date }) =>
      `<tr><td><a href="/letters/${escapeHtml(id)}">${escapeHtml(subject)}</a></td><td>${escapeHtml(to)}</td><td>${escapeHtml(date ?? '')}</td></tr>`,
  )
  const table = `<table><thead><tr><th>Subject</th><th>To</th><th>At</th></tr></thead><tbody>${rows.join('')}</tbody></table>`
  return `<h1>Practice mailbox</h1>
<p class="quiet">Every mail of the demo ends here and goes nowhere else.</p>
${rows.length > 0 ? table : '<p>No mail yet.</p>'}`
}
