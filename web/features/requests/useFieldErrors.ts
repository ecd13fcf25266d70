import { computed, ref, type ComputedRef } from 'vue'
import type { Issue } from '../../../shared/units/refusal.ts'

/** What is wrong with which field, from whatever source spoke last. */
export function useFieldErrors() {
  const issues = ref<Issue[]>([])
  const byPath: ComputedRef<Map<string, string>> = computed(
    () => new Map([...issues.value].reverse().map(({ path, message }) => [path, message])),
  )
  return {
    issues,
    set: (found: readonly Issue[]) => {
      issues.value = [...found]
    },
    /** Once a field is touched, what was said about it is no longer known to hold. */
    forget: (path: string) => {
      issues.value = issues.value.filter((issue) => issue.path !== path)
    },
    at: (path: string) => byPath.value.get(path) ?? null,
  }
}
