import { execFileSync } from 'node:child_process'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createDocumentPress } from '../../server/pdf/document-press.ts'
import { quoteFixture, shopDetails } from '../support/quote-fixture.ts'

/* Read back by poppler's tools, which share nothing with what wrote the file. */

const issuedOn = '2026-12-01T10:00:00Z'
const press = createDocumentPress(
  fileURLToPath(new URL('../../server/pdf/quote-document.worker.ts', import.meta.url)),
)
let folder = ''
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'quote-'))
})
afterAll(async () => {
  await press.close()
  await rm(folder, { recursive: true })
})

async function written(name: string, body: Buffer): Promise<string> {
  const file = join(folder, name)
  await writeFile(file, body)
  return file
}

function read(tool: 'pdftotext' | 'pdfinfo' | 'pdffonts', args: string[]): string {
  return execFileSync(tool, args, { encoding: 'utf8', maxBuffer: 64e6 }).replaceAll('\u00a0', ' ')
}

describe('the quote on paper', () => {
  let file = ''
  let text = ''
  let body: Buffer = Buffer.alloc(0)
  beforeAll(async () => {
    body = await press.renderQuoteDocument({ quote: quoteFixture(2), shop: shopDetails, issuedOn })
    expect(body.subarray(0, 5).toString()).toBe('%PDF-')
    file = await written('quote.pdf', body)
    text = read('pdftotext', ['-layout', file, '-'])
  })

  it('says who offers what to whom, until when and for how much', () => {
    for (const said of [
      'Harrow Lane Columns',
      'Quote Q-1001 B',
      'B, in place of A',
      'Åsgård & Łuków Builders',
      '31 December 2026',
      'W10X49',
      'W250X73',
      'USD 1,591.84',
      'USD 6,367.36',
      'Tax 8.25 %',
      'USD 14,196.68',
      'Deposit on acceptance',
      'Erection, grout and concrete',
      'The engineer of record confirms each shape',
    ]) {
      expect(text).toContain(said)
    }
  })

  it('carries the calculation with the signs of the trade', () => {
    for (const sign of ['Ω', 'φ', 'λ', 'χ', 'π', '√', '²', '≤', '′', '″', 'Ø']) expect(text).toContain(sign)
    expect(text).toContain('π² · 199 948 MPa / 65.12²')
    expect(text).toContain('segments govern')
    expect(text).toContain('2 114 kN')
  })

  it('has a face with the glyph for each sign: nothing stands in the PDF’s own fourteen fonts', () => {
    const fonts = read('pdffonts', [file]).split('\n').slice(2).filter(Boolean)
    expect(fonts.length).toBeGreaterThanOrEqual(3)
    for (const font of fonts) expect(font).toMatch(/^[A-Z]{6}\+(Archivo|IBMPlexSans).* yes yes yes /)
  })

  it('numbers every page', () => {
    const pages = text.split('\f').slice(0, -1)
    expect(pages.length).toBeGreaterThanOrEqual(5)
    pages.forEach((page, index) => expect(page).toContain(`Q-1001 B · page ${index + 1} of ${pages.length}`))
  })

  it('leaves out what is the shop’s own: cost, margin, discount, warnings', () => {
    for (const secret of [
      '4711.11',
      '4,711.11',
      '311.11',
      '0.2345',
      '23.45',
      'argin',
      'contingency',
      'blocker',
      'Mara Quill',
    ]) {
      expect(text).not.toContain(secret)
    }
    expect(text).not.toMatch(/none of the customer/)
  })

  it('is tagged and titled, with the drawings in words', () => {
    const info = read('pdfinfo', [file])
    expect(info).toMatch(/Title:\s+Quote Q-1001 B/)
    expect(info).toMatch(/Tagged:\s+yes/)
    expect(info).toMatch(/Page size:.*A4/)
    const structure = read('pdfinfo', ['-struct-text', file])
    for (const element of ['H1', 'H2', 'Table', 'TH', 'TD', 'LI', 'Figure'])
      expect(structure).toContain(element)
    // Alternative texts stand in the file as UTF-16, most significant byte first.
    const words = Buffer.from('Brace 1 at 2.20 m holds the weak axis only', 'utf16le').swap16()
    expect(body.includes(words)).toBe(true)
  })
})

describe('a long schedule', () => {
  it('goes over to more pages, repeating the head of the table', async () => {
    const shop = { ...shopDetails, paper: 'Letter' as const, system: 'US' as const }
    const body = await press.renderQuoteDocument({ quote: quoteFixture(60), shop, issuedOn })
    const file = await written('long.pdf', body)
    const text = read('pdftotext', ['-layout', file, '-'])
    const offered = text.split('\f').filter((page) => /Mark\s+Pieces\s+Section/.test(page))
    expect(offered.length).toBeGreaterThanOrEqual(2)
    const marks = offered.flatMap((page) => page.match(/^\s*A\d+\s+4\s/gm) ?? [])
    expect(marks).toHaveLength(60)
    expect(read('pdfinfo', [file])).toMatch(/Page size:.*letter/)
    // 1250 kN is 281 kip, 4200 mm is 13.78 ft (1 kip = 4.4482216 kN, 1 ft = 304.8 mm).
    expect(text).toContain('281 kip')
    expect(text).toContain('13.78 ft')
  })
})

describe('two quotes at once', () => {
  it('come out each with its own number', async () => {
    const other = { ...quoteFixture(1), number: 'Q-2002' }
    const made = await Promise.all(
      [quoteFixture(1), other].map((quote) =>
        press.renderQuoteDocument({ quote, shop: shopDetails, issuedOn }),
      ),
    )
    const titles = await Promise.all(
      made.map(async (body, index) => read('pdfinfo', [await written(`${index}.pdf`, body)])),
    )
    expect(titles.map((info) => /Title:\s+(.*)/.exec(info)?.[1])).toEqual([
      'Quote Q-1001 B',
      'Quote Q-2002 B',
    ])
  })
})
