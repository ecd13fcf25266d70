/** What a spreadsheet would take for a formula. */
const FORMULA = /^[=+\-@\t\r]/

/** A cell of RFC 4180; one that a spreadsheet would run is made text by an apostrophe. */
function cell(value: string): string {
  const safe = FORMULA.test(value) ? `'${value}` : value
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}

/** RFC 4180, lines ended by CR LF. */
export function toCsv(rows: readonly (readonly string[])[]): string {
  return rows.map((row) => `${row.map(cell).join(',')}\r\n`).join('')
}
