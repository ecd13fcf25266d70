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

/** Moves the focus to the field of a path, opening what it is folded into. */
export function focusField(path: string): boolean {
  const field = document.querySelector<HTMLElement>(`[data-path="${CSS.escape(path)}"]`)
  const fold = field?.closest('details')
  if (fold) fold.open = true
  const control = field?.querySelector<HTMLElement>('input, textarea, [role="combobox"], button')
  control?.focus()
  return control !== null && control !== undefined
}
