import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { operations, type Operation, type OperationId } from '../../shared/contracts/operations.ts'
import { policy, type Caller } from '../../server/http/policy.ts'
import { startTestApp, type Agent, type TestApp } from '../support/test-app.ts'

/* Every operation is tried as everyone; one without a row in the policy does not compile. */

let app: TestApp
const agents = new Map<string, Agent>()
beforeAll(async () => {
  app = await startTestApp()
  agents.set('nobody', app.stranger())
  for (const name of ['contractor', 'other', 'estimator', 'accounts', 'admin'] as const) {
    agents.set(name, await app.signIn(name))
  }
  const expires = new Date(app.deps.clock().getTime() + 86_400_000)
  const token = await app.deps.links.signQuoteLink(NOWHERE, NOWHERE, expires)
  agents.set('link', app.stranger().set('Quote-Link', token))
  const stale = await app.deps.links.signQuoteLink(NOWHERE, NOWHERE, new Date(1000))
  agents.set('stale link', app.stranger().set('Quote-Link', stale))
  agents.set('forged link', app.stranger().set('Quote-Link', `${token.slice(0, -4)}AAAA`))
})
afterAll(() => app.stop())

const NOWHERE = '00000000-0000-4000-8000-000000000000'
const CALLERS: Record<string, Caller | undefined> = {
  nobody: undefined,
  contractor: 'contractor',
  other: 'contractor',
  estimator: 'estimator',
  accounts: 'accounts',
  admin: 'admin',
  link: 'link',
  'stale link': undefined,
  'forged link': undefined,
}

async function statusOf(agent: Agent, { method, path }: Operation): Promise<number> {
  const address = path.replace(':id', NOWHERE).replace(':letter', 'A').replace(':designation', 'W10X49')
  const reply = await agent[method](address).set('Idempotency-Key', crypto.randomUUID())
  return reply.status
}

const entries = Object.entries(operations) as [OperationId, Operation][]

describe('every operation, as everyone', () => {
  it.each(entries)('%s', async (id, operation) => {
    const callers: readonly Caller[] = policy[id]
    for (const [name, caller] of Object.entries(CALLERS)) {
      const agent = agents.get(name)
      if (!agent || id === 'signOut') continue
      const may = callers.includes('anyone') || (caller !== undefined && callers.includes(caller))
      const status = await statusOf(agent, operation)
      const signedIn = caller !== undefined && caller !== 'link'
      if (may)
        expect([401, 403], `${name} may`).not.toContain(status === 401 && id === 'signIn' ? 422 : status)
      else expect(status, `${name} may not`).toBe(signedIn ? 403 : 401)
    }
  })
})
