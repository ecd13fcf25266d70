import { useQuery } from '@tanstack/vue-query'
import { computed } from 'vue'
import { allPages } from '../../api/all-pages.ts'
import { listQuotes, quoteKeys } from '../../api/quotes.ts'
import { listRequests, requestKeys } from '../../api/requests.ts'
import { queueOf } from './queue.ts'

const REQUESTS = ['submitted', 'in review', 'quoted'] as const
const QUOTES = ['draft', 'approved', 'sent'] as const

/** What waits on the desk. Requests already quoted are read for the day by which they are needed. */
export function useQueue() {
  const requests = useQuery({
    queryKey: [...requestKeys.all, 'queue'],
    queryFn: ({ signal }) =>
      Promise.all(REQUESTS.map((status) => allPages((query) => listRequests({ ...query, status }, signal)))),
  })
  const quotes = useQuery({
    queryKey: [...quoteKeys.all, 'queue'],
    queryFn: ({ signal }) =>
      Promise.all(QUOTES.map((status) => allPages((query) => listQuotes({ ...query, status }, signal)))),
  })
  const lists = computed(() => [...(requests.data.value ?? []), ...(quotes.data.value ?? [])])

  return {
    rows: computed(() =>
      queueOf(
        (requests.data.value ?? []).flatMap(({ items }) => items),
        (quotes.data.value ?? []).flatMap(({ items }) => items),
      ),
    ),
    whole: computed(() => lists.value.every(({ whole }) => whole)),
    pending: computed(() => requests.isPending.value || quotes.isPending.value),
    error: computed(() => requests.error.value ?? quotes.error.value),
  }
}
