import { effectScope } from 'vue'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { useLatest } from '../../web/composables/useLatest.ts'

interface Call {
  input: string
  signal: AbortSignal
  answer: (text: string) => void
  fail: (error: Error) => void
}

function watched() {
  const calls: Call[] = []
  const scope = effectScope()
  const latest = scope.run(() =>
    useLatest<string, string>(
      (input, signal) =>
        new Promise((resolve, reject) => calls.push({ input, signal, answer: resolve, fail: reject })),
      150,
    ),
  )
  if (!latest) throw new Error('the scope did not run')
  return { calls, scope, latest }
}
const settled = () => vi.advanceTimersByTimeAsync(0)

describe('the latest answer', () => {
  beforeEach(() => {
    vi.useFakeTimers()
  })
  afterEach(() => {
    vi.useRealTimers()
  })

  it('waits for a pause and asks once', async () => {
    const { calls, latest } = watched()
    latest.ask('a')
    await vi.advanceTimersByTimeAsync(100)
    latest.ask('ab')
    await vi.advanceTimersByTimeAsync(149)
    expect(calls).toHaveLength(0)
    await vi.advanceTimersByTimeAsync(1)
    expect(calls.map((call) => call.input)).toEqual(['ab'])
    expect(latest.pending.value).toBe(true)
    calls[0]?.answer('AB')
    await settled()
    expect(latest.answer.value).toBe('AB')
    expect(latest.pending.value).toBe(false)
  })

  it('lets the last input win though its answer comes first', async () => {
    const { calls, latest } = watched()
    latest.ask('first')
    await vi.advanceTimersByTimeAsync(150)
    latest.ask('second')
    await vi.advanceTimersByTimeAsync(150)
    expect(calls[0]?.signal.aborted).toBe(true)
    calls[1]?.answer('SECOND')
    await settled()
    calls[0]?.answer('FIRST')
    await settled()
    expect(latest.answer.value).toBe('SECOND')
  })

  it('does not show the failure of an input that was left behind', async () => {
    const { calls, latest } = watched()
    latest.ask('first')
    await vi.advanceTimersByTimeAsync(150)
    latest.ask('second')
    await vi.advanceTimersByTimeAsync(150)
    calls[0]?.fail(new Error('aborted'))
    calls[1]?.answer('SECOND')
    await settled()
    expect(latest.error.value).toBeUndefined()
    expect(latest.answer.value).toBe('SECOND')
  })

  it('keeps the last answer beside a failure, and drops the failure with the next answer', async () => {
    const { calls, latest } = watched()
    latest.ask('a')
    await vi.advanceTimersByTimeAsync(150)
    calls[0]?.fail(new Error('refused'))
    await settled()
    expect(latest.error.value).toEqual(new Error('refused'))
    latest.ask('b')
    await vi.advanceTimersByTimeAsync(150)
    calls[1]?.answer('B')
    await settled()
    expect([latest.answer.value, latest.error.value]).toEqual(['B', undefined])
  })

  it('stops asking when its owner is gone', async () => {
    const { calls, scope, latest } = watched()
    latest.ask('a')
    scope.stop()
    await vi.advanceTimersByTimeAsync(500)
    expect(calls).toHaveLength(0)
  })
})
