import { NO_BREAK_SPACE } from '../../shared/units/figures.ts'

export function percent(fraction: number): string {
  return `${(fraction * 100).toFixed(0)}${NO_BREAK_SPACE}%`
}

/** Keeps a number, its fraction and its unit on one line. */
export function bound(text: string): string {
  return text.replace(/(\d|Ø) (?=\d|mm|m\b|ft|in|%)/g, `$1${NO_BREAK_SPACE}`)
}
