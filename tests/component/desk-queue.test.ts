import { flushPromises } from '@vue/test-utils'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { allPages } from '../../web/api/all-pages.ts'
import DeskQueue from '../../web/features/desk/DeskQueue.vue'
import { daysAway, queueOf } from '../../web/features/desk/queue.ts'
import { deskAnswering, json, mountPage, type Answer } from '../support/mount-page.ts'
import { quoteFixture } from '../support/quote-fixture.ts'

type RequestRow = AnswerOf<'listRequests'>['items'][number]
type QuoteRow = AnswerOf<'listQuotes'>['items'][number]
const idOf = (n: number) => `3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1b${String(n).padStart(3, '0')}`
const company = { id: idOf(900), name: 'Quarry Road Builders' }

function request(n: number, changed: Partial<RequestRow> = {}): RequestRow {
  return {
    id: idOf(n),
    number: `R-${1000 + n}`,
    status: 'submitted',
    title: `Job ${n}`,
    company,
    neededBy: null,
    indicativeTotal: null,
    quote: null,
    createdAt: '2026-11-01T08:00:00Z',
    submittedAt: '2026-11-02T08:00:00Z',
    marks: 1,
    pieces: 4,
    ...changed,
  }
}
function quote(n: number, changed: Partial<QuoteRow> = {}): QuoteRow {
  return {
    id: idOf(500 + n),
    number: `Q-${1000 + n}`,
    letter: 'A',
    status: 'draft',
    title: `Job ${n}`,
    company,
    total: { amount: 100, currency: 'USD' },
    validUntil: null,
    createdAt: '2026-11-03T08:00:00Z',
    ...changed,
  }
}

describe('the order of the queue', () => {
  it('puts the oldest promise first, then who asked first, and what has no day last', () => {
    const rows = queueOf(
      [
        request(1, { submittedAt: '2026-10-01T08:00:00Z' }),
        request(2, { neededBy: '2026-12-20', submittedAt: '2026-11-09T08:00:00Z' }),
        request(3, { neededBy: '2026-12-20', submittedAt: '2026-11-05T08:00:00Z' }),
        request(4, { neededBy: '2026-12-01' }),
      ],
      [],
    )
    expect(rows.map(({ number }) => number)).toEqual(['R-1004', 'R-1003', 'R-1002', 'R-1001'])
  })

  it('shows a request in review once, as its quote, with the day that was promised', () => {
    const rows = queueOf(
      [
        request(1, {
          status: 'in review',
          neededBy: '2026-12-05',
          quote: { id: idOf(501), number: 'Q-1001' },
        }),
        request(2, { status: 'quoted', neededBy: '2026-12-04', quote: { id: idOf(502), number: 'Q-1002' } }),
        request(3, { status: 'quoted', quote: { id: idOf(503), number: 'Q-1003' } }),
      ],
      [quote(1), quote(2, { status: 'sent' })],
    )
    expect(rows.map(({ number, stage, neededBy }) => [number, stage, neededBy])).toEqual([
      ['Q-1002 A', 'with the customer', '2026-12-04'],
      ['Q-1001 A', 'on the bench', '2026-12-05'],
    ])
  })

  it.each([
    ['2026-12-01', 'today'],
    ['2026-12-02', 'in 1 day'],
    ['2026-11-27', '4 days ago'],
  ])('%s is %s on the first of December', (day, text) => {
    expect(daysAway(day, new Date(2026, 11, 1, 23, 30)).text).toBe(text)
  })

  it('reads a list to its end, page by page, and says when it is cut', async () => {
    const pages = [1, 2, 3]
    const whole = await allPages(({ cursor }) => {
      const at = Number(cursor ?? 0)
      return Promise.resolve({ items: [pages[at]], nextCursor: at < 2 ? String(at + 1) : null })
    })
    expect(whole).toEqual({ items: [1, 2, 3], whole: true })
    const endless = await allPages(() => Promise.resolve({ items: [0], nextCursor: 'more' }))
    expect(endless).toMatchObject({ items: { length: 10 }, whole: false })
  })
})

describe('the desk', () => {
  afterEach(() => {
    document.body.innerHTML = ''
    vi.unstubAllGlobals()
  })

  async function desk(more: Answer) {
    const found = deskAnswering((call) => {
      const status = call.query.get('status')
      if (call.method === 'GET' && call.path === '/api/requests') {
        return json({ items: status === 'submitted' ? [request(1), request(2)] : [], nextCursor: null })
      }
      if (call.method === 'GET' && call.path === '/api/quotes') return json({ items: [], nextCursor: null })
      return more(call)
    })
    vi.stubGlobal('fetch', found.fetch)
    const page = await mountPage(DeskQueue, { actor: 'estimator' })
    await flushPromises()
    return { ...page, calls: found.calls }
  }

  it('takes a request up by one key, tried again with the same, and goes to its bench', async () => {
    const replies = [new Response('{}', { status: 502 }), json(quoteFixture(1), 201)]
    const { wrapper, router, calls } = await desk((call) =>
      call.path.endsWith('/quote') ? replies.shift() : undefined,
    )
    const take = () => wrapper.get('[aria-label="Take it up, R-1001"]').trigger('click')
    await take()
    await flushPromises()
    expect(wrapper.get('[role="alert"]').text()).not.toBe('')
    await take()
    await flushPromises()
    const posts = calls.filter(({ method }) => method === 'POST')
    expect(posts.map(({ path }) => path)).toEqual(Array(2).fill(`/api/requests/${idOf(1)}/quote`))
    expect(posts[0]?.headers['Idempotency-Key']).toBe(posts[1]?.headers['Idempotency-Key'])
    expect(router.currentRoute.value.path).toBe(`/bench/${quoteFixture(1).id}`)
  })

  it('declines with a reason only', async () => {
    const { button, calls } = await desk(() => undefined)
    await button('Decline').trigger('click')
    await flushPromises()
    const form = document.querySelector<HTMLFormElement>('form.decline')
    form?.dispatchEvent(new Event('submit', { cancelable: true }))
    await flushPromises()
    expect(form?.textContent).toContain('in words that the customer reads')
    expect(calls.some(({ method }) => method === 'POST')).toBe(false)
  })

  it('shows whose turn it is', async () => {
    const { wrapper, button } = await desk(() => undefined)
    expect(wrapper.findAll('tbody tr')).toHaveLength(2)
    await button('with the customer').trigger('click')
    expect(wrapper.findAll('tbody tr')).toHaveLength(0)
    expect(wrapper.text()).toContain('Nothing is with the customer.')
  })
})
