import { refuse } from '../units/refusal.ts'

const PREFIXES = { request: 'R', quote: 'Q', order: 'O' } as const
export type Numbered = keyof typeof PREFIXES

/** Before the first: a short number reads like a slip of the pen. */
const START = 1000

/** `R-1001`, `Q-1001`, `O-1001`: the count of its kind, from 1. */
export function numberOf(kind: Numbered, count: number): string {
  if (!Number.isSafeInteger(count) || count < 1) refuse('count', 'a whole number from 1 on')
  return `${PREFIXES[kind]}-${START + count}`
}

/** The number after the last one given out; null before the first. */
export function nextNumber(kind: Numbered, last: string | null): string {
  if (last === null) return numberOf(kind, 1)
  const match = new RegExp(`^${PREFIXES[kind]}-(\\d+)$`).exec(last)
  const value = Number(match?.[1])
  if (!match || value <= START) refuse('number', `a number of the kind ${PREFIXES[kind]}-${START + 1}`)
  return numberOf(kind, value - START + 1)
}

export const FIRST_LETTER = 'A'

/** Revision letters: A to Z, then AA to ZZ. */
export function nextLetter(letter: string): string {
  if (!/^[A-Z]{1,2}$/.test(letter)) refuse('letter', 'a revision letter, A to Z or AA to ZZ')
  if (letter === 'ZZ') refuse('letter', 'ZZ is the last revision of a quote: open a new one')
  const value = [...letter].reduce((all, sign) => all * 26 + sign.charCodeAt(0) - 64, 0)
  const text = (n: number): string =>
    (n > 26 ? text(Math.floor((n - 1) / 26)) : '') + String.fromCharCode(65 + ((n - 1) % 26))
  return text(value + 1)
}

/** A before Z before AA. */
export function compareLetters(a: string, b: string): number {
  return a.length - b.length || (a < b ? -1 : a > b ? 1 : 0)
}

/** `Q-1001 B`: how a revision is named in mail and on paper. */
export function revisionName(number: string, letter: string): string {
  return `${number} ${letter}`
}
