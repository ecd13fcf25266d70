import { describe, expect, it } from 'vitest'
import { escapeHtml } from '../../../server/html.ts'
import { composeMail } from '../../../server/mail/compose-mail.ts'
import type { Letter } from '../../../server/mail/letters.ts'
import { CAUTIONS } from '../../../shared/quoting/cautions.ts'

const NASTY = '<img src=x onerror="go()"> & \'co\''
const url = 'https://desk.example.test/q#a.b-c?x=1&y=2'
const paid = { name: 'Maren', shop: 'The shop', order: 'O-1001', title: NASTY, amount: 'USD 1,160.00', url }
const accepted = {
  ...{ shop: 'The shop', quote: 'Q-1001 A', title: NASTY, order: 'O-1001', acceptedBy: NASTY },
  ...{ deposit: 'USD 1,160.00', url },
}

const LETTERS: Letter[] = [
  {
    kind: 'request received',
    data: { name: NASTY, shop: NASTY, number: 'R-1', title: NASTY, marks: 1, pieces: 4, url },
  },
  {
    kind: 'quote sent',
    data: {
      ...{ name: NASTY, shop: 'The shop', quote: 'Q-1001 A', title: NASTY, total: 'USD 2,320.00', url },
      ...{ validUntil: '2026-12-31T23:59:59.000Z', note: `Erection is yours. ${NASTY}` },
    },
  },
  { kind: 'quote accepted', data: { ...accepted, name: 'Maren' } },
  { kind: 'quote accepted for shop', data: { ...accepted, company: NASTY } },
  { kind: 'deposit receipt', data: { ...paid, at: '2026-12-01T10:00:00.000Z' } },
  { kind: 'payment failed', data: { ...paid, reason: NASTY } },
]

/** Facts that stand in a letter as they were given; instants are worded. */
function factsOf({ data }: Letter): string[] {
  return Object.entries(data).flatMap(([name, value]) =>
    typeof value === 'string' && name !== 'validUntil' && name !== 'at' ? [value] : [],
  )
}

describe.each(LETTERS)('the letter "$kind"', (letter) => {
  const { subject, html, text } = composeMail(letter)

  it('says the same in HTML and in plain text', () => {
    for (const fact of factsOf(letter)) {
      expect(text).toContain(fact)
      expect(html).toContain(escapeHtml(fact))
    }
  })

  it('has a button to its address, and an address to copy', () => {
    expect(html).toContain(`<a href="${escapeHtml(url)}"`)
    expect(html).toContain(`>${escapeHtml(url)}</p>`)
  })

  it('lets nothing of what people typed become HTML', () => {
    expect(html).not.toContain('<img')
    expect(subject).not.toContain('\n')
  })

  it('needs nothing that mail readers leave out: no script, style sheet, picture or variable', () => {
    expect(html).not.toMatch(/<script|<style|<link|var\(|url\(/)
  })
})

describe('the letter with a quote', () => {
  const sent = LETTERS.find(({ kind }) => kind === 'quote sent')
  if (!sent) throw new Error('no such letter here')
  const { html, text } = composeMail(sent)

  it('carries every caution, and the day until which the price holds', () => {
    for (const caution of CAUTIONS) {
      expect(text).toContain(caution.text)
      expect(html).toContain(escapeHtml(caution.text))
    }
    expect(text).toContain('31 December 2026')
    expect(html).toContain('31 December 2026')
  })
})

describe('a subject', () => {
  it('is one line, whatever a title has in it', () => {
    const { subject } = composeMail({
      kind: 'quote sent',
      data: {
        ...{ name: 'M', shop: 'S', quote: 'Q-1 A', title: 'Hall\r\nBcc: everyone@example.test', note: '' },
        ...{ total: 'USD 1.00', validUntil: '2026-12-31T00:00:00.000Z', url },
      },
    })
    expect(subject).toBe('Quote Q-1 A: Hall Bcc: everyone@example.test')
  })
})
