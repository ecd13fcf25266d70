import { describe, expect, it } from 'vitest'
import { toCsv } from '../../../server/modules/accounts/csv.ts'

/* RFC 4180, section 2: CRLF after each record (1, 2), quotes around comma, quote and line break (6), quotes doubled (7). */

describe('CSV', () => {
  it.each([
    ['plain text', 'plain text'],
    ['a comma, here', '"a comma, here"'],
    ['a "quote"', '"a ""quote"""'],
    ['two\nlines', '"two\nlines"'],
    ['', ''],
  ])('writes %j as %j', (value, cell) => {
    expect(toCsv([[value]])).toBe(`${cell}\r\n`)
  })

  // What spreadsheets take for a formula at the start of a cell: common knowledge of the trade, and OWASP's list.
  it.each(['=1+1', '+1', '-1', '@SUM(A1)', '\tx', '\rx'])('makes %j text for a spreadsheet', (value) => {
    expect(toCsv([[value]])).toMatch(/^"?'/)
  })

  it('leaves signs inside a cell alone', () => {
    expect(toCsv([['a-b', '1=1']])).toBe('a-b,1=1\r\n')
  })
})
