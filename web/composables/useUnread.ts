import {
  inject,
  onBeforeUnmount,
  provide,
  shallowReactive,
  useId,
  type InjectionKey,
  type Ref,
  watch,
} from 'vue'

type Unread = Map<string, { path: string; message: string }>
const UNREAD: InjectionKey<Unread> = Symbol('unread')

/** A form that must not be sent while a field in it holds text that could not be read. */
export function provideUnread(): Unread {
  const unread: Unread = shallowReactive(new Map())
  provide(UNREAD, unread)
  return unread
}

/** Reports what a field could not read to the form around it. */
export function reportUnread(path: () => string | undefined, problem: Ref<string | null>): void {
  const unread = inject(UNREAD, null)
  if (!unread) return
  const id = useId()
  watch(problem, (message) => {
    if (message) unread.set(id, { path: path() ?? '', message })
    else unread.delete(id)
  })
  onBeforeUnmount(() => unread.delete(id))
}
