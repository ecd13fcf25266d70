import { QueryClient, VueQueryPlugin } from '@tanstack/vue-query'
import { mount } from '@vue/test-utils'
import { createMemoryHistory, createRouter } from 'vue-router'
import { defineComponent, h, type Component, type PropType } from 'vue'

// Here an element turns into its whole markup where a browser says what it is; floats that place themselves ask often.
Element.prototype.toString = () => '[object HTMLElement]'

/** What a page asks of the desk, and what it is answered; tried in order, the first whose path matches answers. */
export interface DeskCall {
  method: string
  path: string
  query: URLSearchParams
  body: unknown
  headers: Record<string, string>
  signal: AbortSignal | null
}
export type Answer = (call: DeskCall) => Promise<Response> | Response | undefined

export function json(body: unknown, status = 200): Response {
  return new Response(JSON.stringify(body), { status })
}

/** A `fetch` that answers by hand and keeps what it was asked. `aside`: paths that are not there, and beside the point. */
export function deskAnswering(answer: Answer, aside?: RegExp): { fetch: typeof fetch; calls: DeskCall[] } {
  const calls: DeskCall[] = []
  return {
    calls,
    fetch: async (input, init = {}) => {
      const url = new URL(String(input), 'http://desk.example')
      const call: DeskCall = {
        method: init.method ?? 'GET',
        path: url.pathname,
        query: url.searchParams,
        body: typeof init.body === 'string' ? JSON.parse(init.body) : undefined,
        headers: init.headers as Record<string, string>,
        signal: init.signal ?? null,
      }
      if (aside?.test(call.path)) return new Response(null, { status: 404 })
      calls.push(call)
      const found = await answer(call)
      if (!found) throw new Error(`nothing answers ${call.method} ${call.path}`)
      return found
    },
  }
}

/** A component as a page of the application: below a router, so that leaving it can be guarded. */
export async function mountPage(component: Component, props: Record<string, unknown>) {
  const host = defineComponent({
    props: { given: { type: Object as PropType<Record<string, unknown>>, required: true } },
    setup: (own) => () => h(component, own.given),
  })
  const router = createRouter({
    history: createMemoryHistory(),
    routes: [
      { path: '/page', component: host, props: () => ({ given: props }) },
      { path: '/:rest(.*)*', component: { template: '<i />' } },
    ],
  })
  await router.push('/page')
  const wrapper = mount(
    { template: '<RouterView />' },
    {
      global: {
        plugins: [
          router,
          [
            VueQueryPlugin,
            { queryClient: new QueryClient({ defaultOptions: { queries: { retry: false } } }) },
          ],
        ],
      },
      attachTo: document.body,
    },
  )
  const button = (text: string) => {
    const found = wrapper.findAll('button').find((each) => each.text().includes(text))
    if (!found) throw new Error(`no button says ${text}`)
    return found
  }
  return { wrapper, router, button }
}
