import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { z } from 'zod'

const session = z.object({
  id: z.string(),
  amount: z.int(),
  currency: z.string(),
  description: z.string(),
  metadata: z.record(z.string(), z.string()),
  successUrl: z.string(),
  cancelUrl: z.string(),
  status: z.enum(['open', 'complete', 'expired']),
  intentId: z.string(),
  intentStatus: z.enum(['requires_payment_method', 'succeeded', 'canceled']),
  failure: z.string().nullable(),
  createdAt: z.int(),
  expiresAt: z.int(),
})
export type CardSession = z.infer<typeof session>

const event = z.object({
  id: z.string(),
  type: z.string(),
  sessionId: z.string(),
  createdAt: z.int(),
  attempts: z.int(),
  nextAt: z.int(),
  delivered: z.boolean(),
})
export type CardEvent = z.infer<typeof event>

const state = z.object({
  sessions: z.record(z.string(), session),
  events: z.array(event),
  answers: z.record(z.string(), z.object({ asked: z.string(), sessionId: z.string() })),
})
export type CardState = z.infer<typeof state>

/** What the local fake of the card processor knows. It survives a restart as the real one would. */
export class CardStore {
  readonly #file: string
  readonly state: CardState

  constructor(dataDir: string) {
    this.#file = join(dataDir, 'card-fake.json')
    this.state = existsSync(this.#file)
      ? state.parse(JSON.parse(readFileSync(this.#file, 'utf8')))
      : { sessions: {}, events: [], answers: {} }
  }

  keep(): void {
    writeFileSync(`${this.#file}.part`, JSON.stringify(this.state))
    renameSync(`${this.#file}.part`, this.#file)
  }
}
