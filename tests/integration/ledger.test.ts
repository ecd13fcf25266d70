import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { write } from '../../server/db/open-database.ts'
import { postToLedger } from '../../server/modules/accounts/ledger.service.ts'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { startTestApp, type Agent, type TestApp } from '../support/test-app.ts'

/* Double entry: what is debited is credited. The bookings are made up; the rule is bookkeeping's own. */

let app: TestApp
let accounts: Agent
beforeAll(async () => {
  app = await startTestApp()
  accounts = await app.signIn('accounts')
})
afterAll(() => app.stop())

type Entries = Parameters<typeof postToLedger>[1]['entries']

function post(entries: Entries, memo = 'Made up', at = '2026-03-02T09:00:00.000Z'): Promise<void> {
  const booking = { at, memo, currency: 'USD', orderId: null, paymentId: null, entries }
  return write(app.deps.db, (trx) => postToLedger(trx, booking))
}

async function count(): Promise<number> {
  return (await app.deps.db.selectFrom('ledger').select('id').execute()).length
}

describe('the ledger', () => {
  it.each<[string, Entries]>([
    [
      'out of balance',
      [
        { account: 'bank', amount: 100 },
        { account: 'revenue', amount: -99 },
      ],
    ],
    ['of one side', [{ account: 'bank', amount: 0 }]],
    ['of nothing', []],
    [
      'with a side of zero',
      [
        { account: 'bank', amount: 0 },
        { account: 'revenue', amount: 0 },
      ],
    ],
    [
      'of parts of a cent',
      [
        { account: 'bank', amount: 0.5 },
        { account: 'revenue', amount: -0.5 },
      ],
    ],
  ])('takes no booking %s', async (_what, entries) => {
    const before = await count()
    await expect(post(entries)).rejects.toThrow(/does not balance/)
    expect(await count()).toBe(before)
  })

  it('gives balances whose debits equal their credits, derived from its entries', async () => {
    await post([
      { account: 'card clearing', amount: 116_000 },
      { account: 'customer deposits', amount: -116_000 },
    ])
    await post([
      { account: 'bank', amount: 112_600 },
      { account: 'processor fees', amount: 3400 },
      { account: 'card clearing', amount: -116_000 },
    ])
    const { balances, sum } = (await accounts.get('/api/accounts/summary').expect(200))
      .body as AnswerOf<'readAccounts'>
    const shown = Object.fromEntries(
      balances.map(({ account, debit, credit, balance }) => [
        account,
        [debit.amount, credit.amount, balance.amount],
      ]),
    )
    expect(shown).toMatchObject({
      'card clearing': [116_000, 116_000, 0],
      'customer deposits': [0, 116_000, -116_000],
      bank: [112_600, 0, 112_600],
      'processor fees': [3400, 0, 3400],
    })
    expect(sum.amount).toBe(0)
  })

  it('is walked page by page, each entry once, newest first', async () => {
    // Sides of a booking share an instant: the page must not fall between them and lose one.
    for (let day = 1; day <= 3; day += 1) {
      await post(
        [
          { account: 'bank', amount: day },
          { account: 'revenue', amount: -day },
        ],
        `Day ${day}`,
        `2026-04-0${day}T00:00:00.000Z`,
      )
    }
    const seen: AnswerOf<'listLedger'>['items'] = []
    let cursor: string | null = null
    do {
      const at = cursor === null ? '' : `&cursor=${encodeURIComponent(cursor)}`
      const page = (await accounts.get(`/api/ledger?limit=1${at}`).expect(200)).body as AnswerOf<'listLedger'>
      seen.push(...page.items)
      cursor = page.nextCursor
    } while (cursor !== null)
    expect(seen).toHaveLength(await count())
    expect(new Set(seen.map(({ id }) => id)).size).toBe(seen.length)
    const instants = seen.map(({ at }) => at)
    expect(instants).toEqual([...instants].sort().reverse())
  })

  it('goes to the bookkeeper with decimals, a memo that is no formula, and balanced columns', async () => {
    await post(
      [
        { account: 'bank', amount: 5 },
        { account: 'revenue', amount: -5 },
      ],
      '=HYPERLINK("http://x"), "quoted"',
      '2026-05-01T00:00:00.000Z',
    )
    const { text } = await accounts.get('/api/ledger.csv').expect(200)
    const last = text.trimEnd().split('\r\n').slice(-2)
    expect(last[0]).toMatch(
      /^2026-05-01T00:00:00\.000Z,[\w-]{36},bank,0\.05,,USD,"'=HYPERLINK\(""http:\/\/x""\), ""quoted""",$/,
    )
    expect(last[1]).toMatch(/,revenue,,0\.05,USD,/)
  })
})
