const days = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' })
const moments = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
})
/** A calendar day has no zone: it reads the same everywhere. */
const calendar = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC',
})

/** "1 Dec 2026", of an instant where the reader is. */
export function dayText(instant: string): string {
  return days.format(new Date(instant))
}

/** "1 Dec 2026, 14:05". */
export function momentText(instant: string): string {
  return moments.format(new Date(instant))
}

/** "1 Dec 2026", of a calendar day such as 2026-12-01. */
export function calendarText(day: string): string {
  return calendar.format(new Date(`${day}T00:00:00Z`))
}

/** Whole days from one instant to another, rounded up; negative when it has passed. */
export function daysUntil(instant: string, now: Date): number {
  return Math.ceil((new Date(instant).getTime() - now.getTime()) / 86_400_000)
}
