import { QueryClient } from '@tanstack/vue-query'
import { ApiProblem } from './problem.ts'

/** What the desk refused it will refuse again; only a lost connection is worth another try. */
function worthRetrying(count: number, error: unknown): boolean {
  return count < 2 && error instanceof ApiProblem && error.problem.status === 0
}

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: { staleTime: 15_000, retry: worthRetrying, refetchOnWindowFocus: true },
    mutations: { retry: false },
  },
})
