import { useQueryClient } from '@tanstack/vue-query'
import { computed, ref, shallowRef, toRaw, watch, type Ref } from 'vue'
import type { Problem } from '../../../shared/contracts/common.ts'
import { quoteDto, type QuoteDto } from '../../../shared/contracts/quotes.ts'
import { problemOf } from '../../api/problem.ts'
import { editRevision, quoteKeys, readQuote, tryRevision, type RevisionInput } from '../../api/quotes.ts'
import { useLatest } from '../../composables/useLatest.ts'
import { carryOver, isChanged } from './edit-changes.ts'
import { editOf, readEdit, type RevisionEdit } from './revision-edit.ts'

/** Longer than for a proposal: every line of the quote is checked and priced anew. */
const PAUSE = 250

/**
 * A quote on the bench: what is kept, what is being changed, and the answer to the change while nothing is kept yet.
 * `read` is the quote as last fetched; what comes in while something is typed waits as `newer`.
 */
export function useBench(read: Ref<QuoteDto>) {
  const cache = useQueryClient()
  const kept = shallowRef(read.value)
  const edit = ref<RevisionEdit>(editOf(read.value.current))
  const newer = shallowRef<QuoteDto | null>(null)
  const problem = ref<Problem | null>(null)
  const keeping = ref(false)

  const at = computed(() => ({ id: kept.value.id, letter: kept.value.current.letter }))
  const dirty = computed(() => isChanged(edit.value, kept.value))
  const reading = computed(() => readEdit(edit.value))
  const live = useLatest(
    (body: RevisionInput, signal) => tryRevision(at.value, body, signal).then((quote) => ({ body, quote })),
    PAUSE,
  )

  /** The edit as sent, once it can be: what is asked again when it changes. */
  const asked = computed(() =>
    dirty.value && reading.value.body ? JSON.stringify(reading.value.body) : null,
  )
  watch(asked, (text) => {
    live.error.value = undefined
    if (text === null || !reading.value.body) live.stop()
    else live.ask(reading.value.body)
  })

  /** What the page shows: the answer to the edit, or what is kept. */
  const shown = computed(() => (dirty.value && live.answer.value ? live.answer.value.quote : kept.value))
  /** The answer to what is typed is on its way; what is shown belongs to an earlier edit. */
  const behind = computed(
    () =>
      asked.value !== null &&
      live.error.value === undefined &&
      JSON.stringify(live.answer.value?.body) !== asked.value,
  )

  function take(quote: QuoteDto): void {
    kept.value = quote
    edit.value = editOf(quote.current)
    live.stop()
    live.answer.value = undefined
    newer.value = null
    problem.value = null
    cache.setQueryData(quoteKeys.one(quote.id), quote)
  }

  watch(read, (quote) => {
    if (quote === kept.value) return
    const moved =
      quote.current.version !== kept.value.current.version || quote.current.letter !== at.value.letter
    if (moved && dirty.value) newer.value = quote
    else if (moved) take(quote)
    // The same revision: only its letters may have a new fate.
    else kept.value = quote
  })

  /** Somebody else was first: what stands now, from the refusal itself or read again. An edit is not touched by it. */
  async function meetNewer(refused: Problem): Promise<void> {
    const told = quoteDto.safeParse(refused.current)
    const found = told.success ? told.data : await readQuote(kept.value.id)
    if (dirty.value) newer.value = found
    else take(found)
    problem.value = dirty.value && refused.type === 'stale-version' ? null : refused
  }

  async function fail(error: unknown): Promise<void> {
    const refused = problemOf(error)
    problem.value = refused
    if (refused.type !== 'stale-version' && refused.type !== 'not-allowed-now') return
    await meetNewer(refused).catch((other: unknown) => (problem.value = problemOf(other)))
  }

  async function keep(): Promise<boolean> {
    const { body } = reading.value
    if (!body) return false
    keeping.value = true
    problem.value = null
    try {
      const quote = await editRevision(at.value, body, kept.value.current.version)
      const unchanged = JSON.stringify(reading.value.body) === JSON.stringify(body)
      if (unchanged) take(quote)
      // Typed on while it was being kept: that part stays an edit.
      else carry(quote)
      return true
    } catch (error) {
      await fail(error)
      return false
    } finally {
      keeping.value = false
    }
  }

  function carry(quote: QuoteDto): void {
    const carried = carryOver(toRaw(edit.value), editOf(kept.value.current), editOf(quote.current))
    take(quote)
    edit.value = carried
  }

  return {
    kept,
    edit,
    shown,
    at,
    dirty,
    behind,
    newer,
    problem,
    keeping,
    issues: computed(() => reading.value.issues),
    pending: live.pending,
    refused: computed(() =>
      live.error.value === undefined || !dirty.value ? null : problemOf(live.error.value),
    ),
    take,
    fail,
    keep,
    /** Reads what the other person kept, with this edit on top of it. */
    carryOverNewer: () => {
      if (newer.value) carry(newer.value)
    },
    undo: () => take(kept.value),
  }
}
