import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { call, callFile } from '../../web/api/client.ts'
import { ApiProblem } from '../../web/api/problem.ts'
import { quoteLink } from '../../web/api/quote-link.ts'

const id = '3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1a001'
const fetched = vi.fn<typeof fetch>()

function reply(status: number, body: unknown): void {
  fetched.mockResolvedValueOnce(new Response(body === undefined ? null : JSON.stringify(body), { status }))
}
function sent(): { address: string; init: RequestInit; headers: Record<string, string> } {
  const [address, init = {}] = fetched.mock.calls.at(-1) ?? []
  return { address: String(address), init, headers: init.headers as Record<string, string> }
}
async function problemFrom(work: Promise<unknown>) {
  const thrown = await work.then(
    () => undefined,
    (error: unknown) => error,
  )
  expect(thrown).toBeInstanceOf(ApiProblem)
  return (thrown as ApiProblem).problem
}

describe('the client of the API', () => {
  beforeEach(() => {
    fetched.mockReset()
    vi.stubGlobal('fetch', fetched)
  })
  afterEach(() => {
    quoteLink.forget()
    vi.unstubAllGlobals()
  })

  it('fills the path, leaves empty filters out, and parses the answer', async () => {
    reply(200, { items: [], nextCursor: null, extra: 'ignored' })
    expect(await call('listRequests', { query: { status: 'draft', q: '' } })).toEqual({
      items: [],
      nextCursor: null,
    })
    expect(sent().address).toBe('/api/requests?status=draft')
    expect(sent().init.method).toBe('GET')
  })

  it('names the version that a write read, and gives what makes records a key of its own', async () => {
    reply(200, {})
    await problemFrom(call('submitRequest', { params: { id }, ifMatch: 7 }))
    expect(sent().headers['If-Match']).toBe('"7"')
    expect(sent().headers['Idempotency-Key']).toBeUndefined()

    reply(201, { url: 'https://pay.example/1', amount: { amount: 100, currency: 'USD' } })
    reply(201, { url: 'https://pay.example/1', amount: { amount: 100, currency: 'USD' } })
    await call('payDeposit', { params: { id } })
    const first = sent().headers['Idempotency-Key']
    await call('payDeposit', { params: { id }, idempotencyKey: 'mine' })
    expect(first).toMatch(/^[0-9a-f-]{36}$/)
    expect(sent().headers['Idempotency-Key']).toBe('mine')
  })

  it('sends a private link in a header, never in the address', async () => {
    quoteLink.keep('token')
    fetched.mockResolvedValueOnce(new Response('%PDF', { status: 200 }))
    const file = await callFile('readQuoteDocument', { params: { id, letter: 'B' } })
    expect(await file.text()).toBe('%PDF')
    expect(sent().address).toBe(`/api/quotes/${id}/revisions/B/document.pdf`)
    expect(sent().headers['Quote-Link']).toBe('token')
  })

  it('throws what the desk refused, field by field', async () => {
    reply(422, {
      type: 'refused',
      title: 'This cannot be taken',
      status: 422,
      detail: 'height: a height is more than 0',
      errors: [{ path: 'height', message: 'a height is more than 0' }],
      requestId: 'r1',
    })
    const problem = await problemFrom(call('readRequest', { params: { id } }))
    expect(problem.errors).toEqual([{ path: 'height', message: 'a height is more than 0' }])
  })

  it.each([
    ['an answer of another shape', () => reply(200, { person: 'nobody' })],
    [
      'an answer that is no JSON',
      () => fetched.mockResolvedValueOnce(new Response('<html>', { status: 502 })),
    ],
    ['a lost connection', () => fetched.mockRejectedValueOnce(new TypeError('Failed to fetch'))],
  ])('throws the same kind of problem for %s', async (_, arrange) => {
    arrange()
    const problem = await problemFrom(call('readSession', {}))
    expect(problem.title).not.toBe('')
    expect(problem.errors).toEqual([])
  })
})
