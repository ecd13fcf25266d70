/** A number as typed, or why it was not taken. */
export type Parsed<T extends number = number> = { ok: true; value: T } | { ok: false; message: string }

export function not(message: string): { ok: false; message: string } {
  return { ok: false, message }
}

const GROUPED = /^\d{1,3}(?:[ \u00a0\u202f]\d{3})+(?:[.,]\d+)?$/
const PLAIN = /^(?:\d+(?:[.,]\d*)?|[.,]\d+)$/
const AMBIGUOUS = /^\d{1,3},\d{3}$/

/** Unsigned decimal; thousands may stand in groups with spaces, a decimal comma is taken, "4,200" is not: it has two readings. */
export function parseUnsigned(text: string): Parsed {
  if (AMBIGUOUS.test(text))
    return not(`${text} has two readings; write ${text.replace(',', '')} or ${text.replace(',', '.')}`)
  if (!GROUPED.test(text) && !PLAIN.test(text)) return not(`${text || 'this'} is not a number`)
  return { ok: true, value: Number(text.replaceAll(/[ \u00a0\u202f]/g, '').replace(',', '.')) }
}

/** Sign and the rest; a minus may be typed as a hyphen. */
export function splitSign(text: string): { sign: 1 | -1; rest: string } {
  const trimmed = text.trim()
  const negative = /^[-−–]/.test(trimmed)
  return { sign: negative ? -1 : 1, rest: trimmed.replace(/^[-−–+]\s*/, '') }
}
