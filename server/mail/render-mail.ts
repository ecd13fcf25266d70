import { escapeHtml as escape } from '../html.ts'

export interface Mail {
  subject: string
  html: string
  text: string
}

export interface MailParts {
  shop: string
  subject: string
  greeting: string
  paragraphs: string[]
  facts: [name: string, value: string][]
  action: { label: string; url: string }
  listTitle?: string
  list?: readonly string[]
}

/* Colours of the desk by day: mail readers know neither variables nor our dark sheet. */
const INK = '#1b2024'
const PAPER = '#f6f4ee'
const QUIET = '#454b50'
const HAIR = '#d2d0ca'
const LAYOUT = '#2b3a8c'
const OXIDE = '#98402b'
const FACE = 'Archivo, Arial, Helvetica, sans-serif'

/** One letter, twice: the plain text says everything that the HTML says. Subjects are one line, whatever is in them. */
export function renderMail(parts: MailParts): Mail {
  const subject = parts.subject.replaceAll(/\s+/g, ' ').trim()
  return { subject, html: toHtml({ ...parts, subject }), text: toText({ ...parts, subject }) }
}

function toText({
  shop,
  subject,
  greeting,
  paragraphs,
  facts,
  action,
  listTitle,
  list = [],
}: MailParts): string {
  const width = Math.max(...facts.map(([name]) => name.length))
  const blocks = [
    subject,
    `Dear ${greeting},`,
    ...paragraphs,
    facts.map(([name, value]) => `${name.padEnd(width)}  ${value}`).join('\n'),
    `${action.label}: ${action.url}`,
    ...(list.length > 0 ? [[`${listTitle ?? ''}:`, ...list.map((line) => `- ${line}`)].join('\n')] : []),
    shop,
  ]
  return `${blocks.join('\n\n')}\n`
}

function toHtml({
  shop,
  subject,
  greeting,
  paragraphs,
  facts,
  action,
  listTitle,
  list = [],
}: MailParts): string {
  const p = (text: string) => `<p style="margin:0 0 14px">${escape(text)}</p>`
  const rows = facts
    .map(
      ([name, value]) =>
        `<tr><td style="padding:6px 20px 6px 0;border-bottom:1px solid ${HAIR};color:${QUIET};white-space:nowrap">${escape(name)}</td>` +
        `<td style="padding:6px 0;border-bottom:1px solid ${HAIR}">${escape(value)}</td></tr>`,
    )
    .join('')
  const items = list.map((line) => `<li style="margin:0 0 6px">${escape(line)}</li>`).join('')
  const listed =
    items &&
    `<h2 style="margin:24px 0 8px;font-size:15px">${escape(listTitle ?? '')}</h2>` +
      `<ul style="margin:0;padding-left:18px;font-size:13px;line-height:20px;color:${QUIET}">${items}</ul>`
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escape(subject)}</title></head>
<body style="margin:0;background:${PAPER}">
<table role="presentation" width="100%" cellpadding="0" cellspacing="0" style="background:${PAPER}"><tr><td align="center" style="padding:24px 12px">
<table role="presentation" width="560" cellpadding="0" cellspacing="0" style="width:100%;max-width:560px;background:#ffffff;border:1px solid ${HAIR}"><tr>
<td width="28" style="padding:0 0 0 20px;vertical-align:top"><div style="width:2px;height:64px;background:${OXIDE}"></div></td>
<td style="padding:24px 24px 28px 0;font:15px/23px ${FACE};color:${INK}">
<p style="margin:0 0 20px;font-size:13px;letter-spacing:.04em;color:${QUIET}">${escape(shop)}</p>
<h1 style="margin:0 0 16px;font-size:20px;line-height:26px">${escape(subject)}</h1>
<p style="margin:0 0 14px">Dear ${escape(greeting)},</p>
${paragraphs.map(p).join('\n')}
<table role="presentation" cellpadding="0" cellspacing="0" style="margin:0 0 20px;font:15px/23px ${FACE};color:${INK}">${rows}</table>
<p style="margin:0 0 14px"><a href="${escape(action.url)}" style="display:inline-block;padding:10px 18px;background:${LAYOUT};color:#ffffff;text-decoration:none;border-radius:2px">${escape(action.label)}</a></p>
<p style="margin:0;font-size:12px;line-height:18px;color:${QUIET};word-break:break-all">${escape(action.url)}</p>
${listed}
</td></tr></table>
</td></tr></table>
</body>
</html>
`
}
