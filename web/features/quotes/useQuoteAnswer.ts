import { useMutation, useQueryClient } from '@tanstack/vue-query'
import type { Ref } from 'vue'
import { useRouter } from 'vue-router'
import { orderKeys } from '../../api/orders.ts'
import { acceptRevision, declineRevision, quoteKeys } from '../../api/quotes.ts'
import { requestKeys } from '../../api/requests.ts'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'

/** Accept and decline. Never shown as done before the server says so. */
export function useQuoteAnswer(quote: Ref<QuoteDto>) {
  const cache = useQueryClient()
  const router = useRouter()
  // The same acceptance, however often its button is pressed.
  const key = crypto.randomUUID()
  const at = () => ({ id: quote.value.id, letter: quote.value.current.letter })

  function refresh(): Promise<unknown> {
    const keys = [quoteKeys.all, quoteKeys.linked, requestKeys.all, orderKeys.all]
    return Promise.all(keys.map((queryKey) => cache.invalidateQueries({ queryKey })))
  }

  const accept = useMutation({
    mutationFn: (name: string) => acceptRevision(at(), { name, cautionsRead: true }, key),
    onSuccess: async ({ order }) => {
      void refresh()
      await router.push(`/orders/${order.id}`)
    },
  })
  const decline = useMutation({
    mutationFn: (answer: { name: string; reason: string }) => declineRevision(at(), answer),
    onSuccess: refresh,
  })
  return { accept, decline }
}
