import { onScopeDispose, ref, shallowRef, type Ref, type ShallowRef } from 'vue'

export interface Latest<Input, Answer> {
  answer: ShallowRef<Answer | undefined>
  error: ShallowRef<unknown>
  /** An answer is on its way; what is shown belongs to an earlier input. */
  pending: Ref<boolean>
  ask: (input: Input) => void
  stop: () => void
}

/**
 * Answers that keep up with typing: waits for a pause, keeps one request in flight, and the last input wins however the
 * answers come in.
 */
export function useLatest<Input, Answer>(
  work: (input: Input, signal: AbortSignal) => Promise<Answer>,
  pause = 150,
): Latest<Input, Answer> {
  const answer = shallowRef<Answer>()
  const error = shallowRef<unknown>()
  const pending = ref(false)
  let timer: ReturnType<typeof setTimeout> | undefined
  let flight: AbortController | undefined

  async function run(input: Input): Promise<void> {
    flight?.abort()
    const own = new AbortController()
    flight = own
    try {
      const found = await work(input, own.signal)
      if (flight !== own) return
      answer.value = found
      error.value = undefined
    } catch (thrown) {
      if (flight !== own) return
      error.value = thrown
    }
    pending.value = false
  }

  function stop(): void {
    clearTimeout(timer)
    flight?.abort()
    flight = undefined
    pending.value = false
  }

  function ask(input: Input): void {
    clearTimeout(timer)
    pending.value = true
    timer = setTimeout(() => void run(input), pause)
  }

  onScopeDispose(stop)
  return { answer, error, pending, ask, stop }
}
