import { flushPromises, mount } from '@vue/test-utils'
import { createMemoryHistory, createRouter } from 'vue-router'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { LEDGER_ACCOUNTS } from '../../shared/contracts/accounts.ts'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { saveFile } from '../../web/composables/save-file.ts'
import BalanceSheet from '../../web/features/accounts/BalanceSheet.vue'
import LedgerDownload from '../../web/features/accounts/LedgerDownload.vue'
import LedgerRegister from '../../web/features/accounts/LedgerRegister.vue'
import { recordChanges } from '../../web/features/audit/record-changes.ts'
import { fractionOf, percentOf, readDecimal } from '../../web/format/decimals.ts'
import { deskAnswering, json, mountPage } from '../support/mount-page.ts'

vi.mock('../../web/composables/save-file.ts', () => ({ saveFile: vi.fn() }))

const usd = (amount: number) => ({ amount, currency: 'USD' })
const router = createRouter({
  history: createMemoryHistory(),
  routes: [{ path: '/:rest(.*)*', component: { template: '<i />' } }],
})

function sheet(sum: number) {
  const amounts = [500_00, -480_00, 0, 0, 0, -20_00 + sum, 0]
  const summary: AnswerOf<'readAccounts'> = {
    depositsDue: usd(0),
    depositsPaid: usd(480_00),
    depositsHeld: usd(480_00),
    balances: LEDGER_ACCOUNTS.map((account, index) => {
      const amount = amounts[index] ?? 0
      return {
        account,
        debit: usd(Math.max(0, amount)),
        credit: usd(Math.max(0, -amount)),
        balance: usd(amount),
      }
    }),
    sum: usd(sum),
  }
  return mount(BalanceSheet, { props: { summary }, global: { plugins: [router] } })
}

describe('the balances', () => {
  it('hang true when debits equal credits', () => {
    const wrapper = sheet(0)
    expect(wrapper.findAll('tbody tr')).toHaveLength(LEDGER_ACCOUNTS.length)
    expect(wrapper.text()).toContain('the books balance')
    expect(wrapper.find('[role="alert"]').exists()).toBe(false)
  })

  it('say so when a cent stands alone', () => {
    const wrapper = sheet(1)
    expect(wrapper.get('[role="alert"]').text()).toContain('do not balance')
    expect(wrapper.get('tfoot').text()).toContain('0.01')
    expect(wrapper.find('svg.off').exists()).toBe(true)
  })
})

describe('the ledger', () => {
  afterEach(() => {
    document.body.innerHTML = ''
    vi.unstubAllGlobals()
  })
  const entry = (n: number, amount: number) => ({
    id: `3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1b00${n}`,
    transactionId: '3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1b100',
    at: '2026-11-29T10:00:00Z',
    account: 'bank',
    amount: usd(amount),
    memo: `Entry ${n}`,
    order: null,
  })

  it('asks for one account, and for what came before by the cursor', async () => {
    const desk = deskAnswering(({ query }) =>
      query.get('cursor')
        ? json({ items: [entry(2, -700)], nextCursor: null })
        : json({ items: [entry(1, 1234)], nextCursor: 'older' }),
    )
    vi.stubGlobal('fetch', desk.fetch)
    const { wrapper, button } = await mountPage(LedgerRegister, { account: 'bank' })
    await flushPromises()
    await button('Show earlier ones').trigger('click')
    await flushPromises()
    expect(desk.calls.map(({ query }) => [query.get('account'), query.get('cursor')])).toEqual([
      ['bank', null],
      ['bank', 'older'],
    ])
    const cells = wrapper.findAll('tbody tr').map((row) => row.findAll('td').map((cell) => cell.text()))
    expect(cells.map((row) => row.slice(-2).map((text) => text.replace(/\u00a0/g, ' ')))).toEqual([
      ['debit USD 12.34', ''],
      ['', 'credit USD 7.00'],
    ])
  })

  it('comes whole as a file', async () => {
    const desk = deskAnswering(() => new Response('at,account,amount\n'))
    vi.stubGlobal('fetch', desk.fetch)
    const { button } = await mountPage(LedgerDownload, {})
    await button('Download all as CSV').trigger('click')
    await flushPromises()
    expect(desk.calls[0]?.path).toBe('/api/ledger.csv')
    expect(vi.mocked(saveFile).mock.calls[0]?.[1]).toBe('ledger.csv')
  })
})

describe('exact decimals as typed', () => {
  it.each([
    ['0.185', '18.5'],
    ['0', '0'],
    ['1', '100'],
    ['0.0725', '7.25'],
    ['-0.05', '-5'],
    ['0.005', '0.5'],
  ])('%s is %s percent, and back', (fraction, percent) => {
    expect(percentOf(fraction)).toBe(percent)
    expect(fractionOf(percent)).toBe(fraction)
  })

  it('are taken with a point only', () => {
    expect(['1 250.50', '−3', '12,5', '1e3', '', 'ten'].map(readDecimal)).toEqual([
      '1250.50',
      '-3',
      null,
      null,
      null,
      null,
    ])
  })
})

describe('a record before and after', () => {
  it('is laid side by side, field by field', () => {
    expect(
      recordChanges({ status: 'draft', at: { a: 1 } }, { status: 'sent', at: { a: 1 }, by: 'Mara' }),
    ).toEqual([
      { name: 'status', before: 'draft', after: 'sent', changed: true },
      { name: 'at.a', before: '1', after: '1', changed: false },
      { name: 'by', before: '', after: 'Mara', changed: true },
    ])
    expect(recordChanges(null, null)).toEqual([])
  })
})
