import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { DEMO_PASSWORD } from '../../seeds/demo/people.ts'
import { requestBody } from '../support/round.ts'
import { RunningServer } from '../support/running-server.ts'

/* SIGKILL while the processor's word is on its way in, as if the plug were pulled; then the next start. */

const server = new RunningServer()
beforeAll(() => server.start())
afterAll(() => server.stop())

/** A program that signs in and keeps its cookie. */
async function person(name: string) {
  const reply = await fetch(`${server.url}/api/session`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify({ email: `${name}@plumbrule.example`, password: DEMO_PASSWORD }),
  })
  const cookie = reply.headers.getSetCookie()[0]?.split(';')[0] ?? ''
  return async function ask<T>(method: string, path: string, body?: unknown, version?: number): Promise<T> {
    const answer = await fetch(`${server.url}${path}`, {
      method,
      headers: {
        Cookie: cookie,
        'Sec-Fetch-Site': 'same-origin',
        'Idempotency-Key': crypto.randomUUID(),
        ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
        ...(version === undefined ? {} : { 'If-Match': `"${version}"` }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    })
    if (!answer.ok) throw new Error(`${method} ${path}: ${answer.status} ${await answer.text()}`)
    return (await answer.json()) as T
  }
}

type Ask = Awaited<ReturnType<typeof person>>
type Quote = AnswerOf<'readQuote'>

async function acceptedOrder(contractor: Ask, estimator: Ask): Promise<string> {
  const request = await contractor<AnswerOf<'createRequest'>>('POST', '/api/requests', requestBody())
  await contractor('POST', `/api/requests/${request.id}/submit`, undefined, request.version)
  const quote = await estimator<Quote>('POST', `/api/requests/${request.id}/quote`)
  const at = `/api/quotes/${quote.id}/revisions/A`
  const approved = await estimator<Quote>('POST', `${at}/approve`, undefined, quote.current.version)
  await estimator('POST', `${at}/send`, undefined, approved.current.version)
  const accepted = await contractor<AnswerOf<'acceptRevision'>>('POST', `${at}/accept`, {
    name: 'Maren Tessell',
    cautionsRead: true,
  })
  return accepted.order.id
}

async function releasedOrder(contractor: Ask, id: string): Promise<AnswerOf<'readOrder'>> {
  for (let tries = 0; tries < 300; tries += 1) {
    const order = await contractor<AnswerOf<'readOrder'>>('GET', `/api/orders/${id}`)
    if (order.status === 'released') return order
    await new Promise((resolve) => setTimeout(resolve, 200))
  }
  throw new Error('not released a minute after the next start')
}

describe('the plug pulled between the webhook and its answer', () => {
  it.each([0, 5, 15, 40])(
    '%s ms after the card went through: one payment, a balanced ledger',
    async (wait) => {
      const contractor = await person('contractor')
      const estimator = await person('estimator')
      const id = await acceptedOrder(contractor, estimator)
      const { url } = await contractor<AnswerOf<'payDeposit'>>('POST', `/api/orders/${id}/deposit`)
      await fetch(url, {
        method: 'POST',
        body: new URLSearchParams({ outcome: 'accept' }),
        redirect: 'manual',
      })
      // The fake sends its events every 300 ms: this falls before, between and within them.
      await new Promise((resolve) => setTimeout(resolve, 280 + wait))
      await server.end('SIGKILL')
      await server.start()
      const order = await releasedOrder(await person('contractor'), id)
      expect(order.payments.map(({ status }) => status)).toEqual(['succeeded'])
      expect(order.deposit.paid).toEqual(order.deposit.due)
      const accounts = await person('accounts')
      const summary = await accounts<AnswerOf<'readAccounts'>>('GET', '/api/accounts/summary')
      expect(summary.sum.amount).toBe(0)
      const ledger = await accounts<AnswerOf<'listLedger'>>('GET', '/api/ledger?limit=50')
      expect(ledger.items.filter((entry) => entry.order?.id === id)).toHaveLength(2)
      const admin = await person('admin')
      const audit = await admin<AnswerOf<'listAudit'>>('GET', '/api/audit')
      expect(audit.chain).toBe('whole')
    },
  )
})
