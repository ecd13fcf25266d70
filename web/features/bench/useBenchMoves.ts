import { useMutation, useQueryClient } from '@tanstack/vue-query'
import { computed, type Ref } from 'vue'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { actionsFor } from '../../../shared/quoting/may-move.ts'
import type { Actor } from '../../../shared/quoting/statuses.ts'
import { approveRevision, quoteKeys, reviseQuote, sendRevision, withdrawRevision } from '../../api/quotes.ts'
import { requestKeys } from '../../api/requests.ts'

export type BenchMove = 'approve' | 'send' | 'withdraw' | 'revise'

interface Bench {
  kept: Ref<QuoteDto>
  take: (quote: QuoteDto) => void
  fail: (error: unknown) => Promise<void>
}

/** The moves of a revision. Nothing is shown as done before the desk has said so. */
export function useBenchMoves({ kept, take, fail }: Bench, actor: Ref<Actor>) {
  const cache = useQueryClient()
  // One key for one act on one version: pressed again after a lost answer, it is still the same act.
  const keys = new Map<string, string>()
  function keyOf(move: BenchMove): string {
    const act = [move, kept.value.current.letter, kept.value.current.version].join(' ')
    const key = keys.get(act) ?? crypto.randomUUID()
    keys.set(act, key)
    return key
  }

  const { mutate, isPending, variables } = useMutation({
    mutationFn: (move: BenchMove) => {
      const { id, current } = kept.value
      const at = { id, letter: current.letter }
      switch (move) {
        case 'approve':
          return approveRevision(at, current.version)
        case 'send':
          return sendRevision(at, current.version, keyOf(move))
        case 'withdraw':
          return withdrawRevision(at)
        case 'revise':
          return reviseQuote(id, keyOf(move))
      }
    },
    onSuccess: (quote) => {
      take(quote)
      void cache.invalidateQueries({ queryKey: [...quoteKeys.all, 'queue'], refetchType: 'none' })
      void cache.invalidateQueries({ queryKey: requestKeys.all, refetchType: 'none' })
    },
    onError: fail,
  })

  const allowed = computed(() => actionsFor('revision', actor.value, kept.value.current.status))
  return {
    move: mutate,
    moving: computed(() => (isPending.value ? variables.value : null)),
    may: (action: (typeof allowed.value)[number]) => allowed.value.includes(action),
  }
}
