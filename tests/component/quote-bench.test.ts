import { flushPromises } from '@vue/test-utils'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { QuoteDto } from '../../shared/contracts/quotes.ts'
import QuoteBench from '../../web/features/bench/QuoteBench.vue'
import { deskAnswering, json, mountPage, type Answer, type DeskCall } from '../support/mount-page.ts'
import { quoteFixture } from '../support/quote-fixture.ts'

type Current = QuoteDto['current']

/** A quote in draft, as an estimator is answered; parts of the revision can be given. */
function draft(changed: Partial<Current> = {}): QuoteDto {
  const quote = quoteFixture(2)
  return { ...quote, current: { ...quote.current, status: 'draft', blockers: [], ...changed } }
}
/** The same quote, answered with another utilisation and total. */
function answered(utilisation: number, amount: number): QuoteDto {
  const quote = draft()
  const [first] = quote.current.lines
  if (first) first.check = { ...first.check, utilisation }
  quote.current.price = { ...quote.current.price, total: { amount, currency: 'USD' } }
  return quote
}
/** What the page sent for the first mark. */
function firstLine(call: DeskCall | undefined): Current['lines'][number]['spec'] {
  return (call?.body as { lines: Current['lines'][number]['spec'][] }).lines[0]!
}

async function bench(quote: QuoteDto, answer: Answer = () => undefined, actor = 'estimator') {
  const desk = deskAnswering(answer, /\/capacity$/)
  vi.stubGlobal('fetch', desk.fetch)
  const page = await mountPage(QuoteBench, { quote, actor })
  const field = (path: string) => page.wrapper.get<HTMLInputElement>(`[data-path="${path}"] input`)
  const strip = () => page.wrapper.get('[aria-label="Verdict and price"]').text().replaceAll('\u00a0', ' ')
  return { ...page, ...desk, field, strip }
}
const pause = () => vi.advanceTimersByTimeAsync(300)

describe('the bench while a draft is changed', () => {
  beforeEach(() => {
    vi.useFakeTimers()
  })
  afterEach(() => {
    document.body.innerHTML = ''
    vi.useRealTimers()
    vi.unstubAllGlobals()
  })

  it('tries the edit after a pause and moves verdict and price, keeping nothing', async () => {
    const { field, strip, calls } = await bench(draft(), () => json(answered(0.874, 1_234_567)))
    await field('base.thickness').setValue('25')
    await pause()
    expect(calls.map(({ method, path }) => [method, path.split('/').slice(-2).join('/')])).toEqual([
      ['POST', 'B/try'],
    ])
    expect(firstLine(calls[0]).base?.thickness).toBe(25)
    expect(strip()).toContain('87 %')
    expect(strip()).toContain('12,345.67')
    expect(strip()).toContain('not kept yet')
  })

  it('shows the answer to the last edit, however the answers come in', async () => {
    const waiting: ((reply: Response) => void)[] = []
    const { field, strip, calls } = await bench(
      draft(),
      () => new Promise((resolve) => waiting.push(resolve)),
    )
    await field('base.thickness').setValue('25')
    await pause()
    await field('base.thickness').setValue('38')
    await pause()
    expect(calls[0]?.signal?.aborted).toBe(true)
    waiting[1]?.(json(answered(0.71, 2_000_000)))
    await flushPromises()
    waiting[0]?.(json(answered(0.99, 1_000_000)))
    await flushPromises()
    expect(strip()).toContain('71 %')
    expect(strip()).toContain('20,000.00')
  })

  it('says that a base plate fails though every shape holds', async () => {
    const failing = answered(0.6, 1)
    const [line] = failing.current.lines
    const bearing = line?.base?.checks[0]
    if (line?.base && bearing) {
      line.base = { ...line.base, verdict: 'fails', checks: [{ ...bearing, utilisation: 1.31 }] }
    }
    const { field, strip } = await bench(draft(), () => json(failing))
    await field('base.thickness').setValue('8')
    await pause()
    expect(strip()).toContain('A1, base plate 131 % fails')
  })

  it('asks and keeps nothing while a field is wrong, says what would be right and leads there', async () => {
    const { field, wrapper, calls, button } = await bench(draft())
    await field('base.thickness').setValue('300')
    await pause()
    expect(calls).toEqual([])
    expect(wrapper.get('[data-path="base.thickness"] .error').text()).toBe('at most 200 mm')
    await button('Keep').trigger('click')
    await flushPromises()
    expect(calls).toEqual([])
    expect(document.activeElement).toBe(field('base.thickness').element)
  })

  it('wants a reason for what is set by hand', async () => {
    const { wrapper, calls, button } = await bench(draft(), () => json(answered(0.6, 1)))
    await button('Welding').trigger('click')
    await wrapper.get('[data-path="overrides.0.value"] input').setValue('90')
    await pause()
    expect(calls).toEqual([])
    await wrapper.get('[data-path="overrides.0.reason"] input').setValue('Rotator is free that week')
    await pause()
    expect(firstLine(calls[0]).overrides).toEqual([
      { item: 'minutes.welding', value: '90', reason: 'Rotator is free that week' },
    ])
  })

  it('keeps an edit by the version that it read', async () => {
    const kept = { ...answered(0.6, 1), current: { ...answered(0.6, 1).current, version: 4 } }
    const { field, button, calls, strip } = await bench(draft(), (call) =>
      call.method === 'PUT' ? json(kept) : json(answered(0.6, 1)),
    )
    await field('base.thickness').setValue('25')
    await pause()
    await button('Keep').trigger('click')
    await flushPromises()
    const put = calls.find(({ method }) => method === 'PUT')
    expect(put?.headers['If-Match']).toBe('"3"')
    expect(firstLine(put).base?.thickness).toBe(25)
    expect(strip()).toContain('as kept')
  })

  it('keeps what was typed when somebody else was first, and carries it over to what they kept', async () => {
    const newer = draft({ version: 4 })
    newer.current.lines[1]!.spec.grade = 'A572-50'
    const refusal = { type: 'stale-version', title: 'Older', status: 412, detail: '', requestId: 'r1' }
    const { field, button, wrapper, calls } = await bench(draft(), (call) =>
      call.method === 'PUT' ? json({ ...refusal, current: newer }, 412) : json(answered(0.6, 1)),
    )
    await field('base.thickness').setValue('25')
    await pause()
    await button('Keep').trigger('click')
    await flushPromises()
    const told = wrapper.get('[role="alert"]').text()
    expect(told).toContain('A2, steel')
    expect(told).toContain('A572-50')
    expect(field('base.thickness').element.value).toBe('25')

    await button('with my changes on top').trigger('click')
    await pause()
    const carried = calls.at(-1)?.body as { lines: { grade: string; base: { thickness: number } }[] }
    expect([carried.lines[0]?.base.thickness, carried.lines[1]?.grade]).toEqual([25, 'A572-50'])
  })
})

describe('the moves of a revision', () => {
  afterEach(() => {
    document.body.innerHTML = ''
    vi.unstubAllGlobals()
  })

  it('cannot be approved while a shape does not hold, and the page says why', async () => {
    const why = 'A1 does not hold: it works at 124 %'
    const { wrapper, button, calls } = await bench(draft({ blockers: [why] }))
    expect(button('Approve revision B').attributes('disabled')).toBeDefined()
    expect(wrapper.get('.hindered').text()).toContain(why)
    await button('Approve revision B').trigger('click')
    expect(calls).toEqual([])
  })

  it('is not shown as approved before the desk has said so', async () => {
    let reply: (response: Response) => void = () => undefined
    const { wrapper, button, calls } = await bench(draft(), () => new Promise((resolve) => (reply = resolve)))
    await button('Approve revision B').trigger('click')
    await flushPromises()
    expect(calls[0]?.headers['If-Match']).toBe('"3"')
    expect(wrapper.get('.stamp').text()).toBe('draft')
    reply(json(draft({ status: 'approved', version: 4 })))
    await flushPromises()
    expect(wrapper.get('.stamp').text()).toBe('approved')
    expect(button('Send revision B').attributes('disabled')).toBeUndefined()
  })

  it('leaves a sent revision to be read only, and offers the next one', async () => {
    const { wrapper, button } = await bench(draft({ status: 'sent' }))
    expect(wrapper.find('[data-path="section"]').exists()).toBe(false)
    expect(wrapper.findAll('button').some((each) => each.text().startsWith('Approve'))).toBe(false)
    expect(button('Revise it').attributes('disabled')).toBeUndefined()
  })
})
