import type { RevisionStatus } from './statuses.ts'

const DAY_MS = 86_400_000

/** Only a draft can be changed. What is approved waits to be sent as it is; a sent revision never changes. */
export function isEditable(status: RevisionStatus): boolean {
  return status === 'draft'
}

/** Seen by the customer, now or before. */
export function isPublic(status: RevisionStatus): boolean {
  return status !== 'draft' && status !== 'approved' && status !== 'withdrawn'
}

/** The price holds to the end of the last day, UTC. Instants are ISO 8601. */
export function holdsUntil(sentAt: string, days: number): string {
  const lastDay = new Date(Date.parse(sentAt) + days * DAY_MS).toISOString().slice(0, 10)
  return `${lastDay}T23:59:59.999Z`
}

/** Past its date a price cannot be accepted, only repriced. A revision that was never sent has no date. */
export function isExpired(validUntil: string | null, now: string): boolean {
  return validUntil !== null && Date.parse(now) > Date.parse(validUntil)
}

/** Why a revision cannot be accepted or declined now, in words for the customer; null when it can. */
export function answerFault(
  revision: { status: RevisionStatus; validUntil: string | null },
  now: string,
): string | null {
  switch (revision.status) {
    case 'draft':
    case 'approved':
      return 'this revision has not been sent'
    case 'accepted':
    case 'declined':
      return `this revision has already been ${revision.status}`
    case 'superseded':
      return 'a newer revision has taken the place of this one'
    case 'withdrawn':
      return 'the shop has withdrawn this revision'
    case 'expired':
      return EXPIRED
    case 'sent':
      return isExpired(revision.validUntil, now) ? EXPIRED : null
  }
}

const EXPIRED = 'the price has gone stale: ask for it to be repriced'
