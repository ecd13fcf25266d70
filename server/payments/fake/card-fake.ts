import { randomBytes } from 'node:crypto'
import { CardStore, type CardSession } from './card-store.ts'

const DAY_S = 86_400

const seconds = () => Math.floor(Date.now() / 1000)
const idOf = (prefix: string) => `${prefix}_${randomBytes(12).toString('hex')}`

export interface NewSession {
  amount: number
  currency: string
  description: string
  metadata: Record<string, string>
  successUrl: string
  cancelUrl: string
}

export type Outcome = 'accept' | 'decline' | 'no funds'

const FAILURES: Record<Exclude<Outcome, 'accept'>, string> = {
  decline: 'Your card was declined.',
  'no funds': 'Your card has insufficient funds.',
}

/** Plays the card processor: checkouts, what a payer does with them, and the events that follow. */
export class CardFake {
  readonly store: CardStore

  constructor(dataDir: string) {
    this.store = new CardStore(dataDir)
  }

  session(id: string): CardSession | undefined {
    return this.store.state.sessions[id]
  }

  sessionOfIntent(intentId: string): CardSession | undefined {
    return Object.values(this.store.state.sessions).find((one) => one.intentId === intentId)
  }

  /** The same key and question give the same checkout; undefined: the key was used for something else. */
  create(wanted: NewSession, key: string | undefined): CardSession | undefined {
    const { answers, sessions } = this.store.state
    const asked = JSON.stringify(wanted)
    const before = key === undefined ? undefined : answers[key]
    if (before) return before.asked === asked ? sessions[before.sessionId] : undefined
    const now = seconds()
    const created: CardSession = {
      ...wanted,
      ...{ id: idOf('cs_test'), status: 'open', intentId: idOf('pi') },
      ...{ intentStatus: 'requires_payment_method', failure: null, createdAt: now, expiresAt: now + DAY_S },
    }
    sessions[created.id] = created
    if (key !== undefined) answers[key] = { asked, sessionId: created.id }
    this.store.keep()
    return created
  }

  /** What the payer chose. Pressing twice pays once. */
  pay(id: string, outcome: Outcome): CardSession | undefined {
    const session = this.session(id)
    if (session?.status !== 'open') return session
    if (outcome === 'accept') {
      Object.assign(session, { status: 'complete', intentStatus: 'succeeded', failure: null })
      this.#tell('payment_intent.succeeded', id)
      this.#tell('checkout.session.completed', id)
    } else {
      session.failure = FAILURES[outcome]
      this.#tell('payment_intent.payment_failed', id)
    }
    this.store.keep()
    return session
  }

  /** Closes checkouts that were left open too long. */
  expire(): void {
    const late = Object.values(this.store.state.sessions).filter(
      ({ status, expiresAt }) => status === 'open' && expiresAt < seconds(),
    )
    for (const session of late) {
      Object.assign(session, { status: 'expired', intentStatus: 'canceled' })
      this.#tell('checkout.session.expired', session.id)
    }
    if (late.length > 0) this.store.keep()
  }

  #tell(type: string, sessionId: string): void {
    const common = { createdAt: seconds(), attempts: 0, nextAt: Date.now(), delivered: false }
    this.store.state.events.push({ id: idOf('evt'), type, sessionId, ...common })
  }
}
