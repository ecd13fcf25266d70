import { QueryClient, VueQueryPlugin } from '@tanstack/vue-query'
import { flushPromises, mount } from '@vue/test-utils'
import { createMemoryHistory, createRouter } from 'vue-router'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { quoteFixture } from '../support/quote-fixture.ts'
import { answerState } from '../../web/features/quotes/answer-state.ts'
import QuoteAnswer from '../../web/features/quotes/QuoteAnswer.vue'

const fetched = vi.fn<typeof fetch>()

function answering() {
  const router = createRouter({
    history: createMemoryHistory(),
    routes: [{ path: '/:rest(.*)*', component: { template: '<i />' }, meta: { title: '' } }],
  })
  const wrapper = mount(QuoteAnswer, {
    props: { quote: quoteFixture(1), signer: 'Ines Vale' },
    global: { plugins: [router, [VueQueryPlugin, { queryClient: new QueryClient() }]] },
    attachTo: document.body,
  })
  const press = (text: string) =>
    wrapper
      .findAll('button')
      .find((button) => button.text().includes(text))
      ?.trigger('click')
  return { wrapper, router, press }
}

describe('the answer to a quote', () => {
  beforeEach(() => {
    fetched.mockReset()
    vi.stubGlobal('fetch', fetched)
  })
  afterEach(() => vi.unstubAllGlobals())

  it('is not accepted before the cautions are confirmed, and says so', async () => {
    const { wrapper } = answering()
    await wrapper.get('form').trigger('submit')
    expect(wrapper.get('[role="alert"]').text()).toContain('confirm the cautions')
    expect(fetched).not.toHaveBeenCalled()
  })

  it('goes out under a name, once confirmed, and leads to the order', async () => {
    const { wrapper, router } = answering()
    fetched.mockResolvedValueOnce(
      new Response(
        JSON.stringify({ order: { id: '3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1a009', number: 'O-1001' } }),
        { status: 201 },
      ),
    )
    await wrapper.get('input[type="checkbox"]').setValue(true)
    await wrapper.get('form').trigger('submit')
    await flushPromises()
    expect(JSON.parse(String(fetched.mock.calls[0]?.[1]?.body))).toEqual({
      name: 'Ines Vale',
      cautionsRead: true,
    })
    expect(router.currentRoute.value.path).toBe('/orders/3d1f3e3c-5d0c-4c39-9a4b-0a3f3bd1a009')
  })

  it('is declined with a reason only', async () => {
    const { wrapper, press } = answering()
    await press('Decline it')
    await wrapper.get('form').trigger('submit')
    expect(wrapper.text()).toContain('a few words')
    expect(fetched).not.toHaveBeenCalled()
  })
})

describe('whether a quote can be answered', () => {
  const quote = quoteFixture(1)
  const at = (status: 'sent' | 'accepted' | 'draft') => ({ ...quote, current: { ...quote.current, status } })

  it('is open while it is sent and its price holds', () => {
    expect(answerState(at('sent'), new Date('2026-12-30T00:00:00Z')).open).toBe(true)
    expect(answerState(at('sent'), new Date('2027-01-01T00:00:00Z'))).toMatchObject({ open: false })
    expect(answerState(at('draft'), new Date('2026-12-30T00:00:00Z')).open).toBe(false)
    expect(answerState(at('accepted'), new Date('2026-12-30T00:00:00Z')).open).toBe(false)
  })
})
