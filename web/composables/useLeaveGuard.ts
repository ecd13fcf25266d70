import { onBeforeUnmount, onMounted, type Ref } from 'vue'
import { onBeforeRouteLeave } from 'vue-router'
import { askFirst } from './useQuestion.ts'

/** Unsaved changes ask first: within the pages by a question, at the edge of the tab by the browser's own. */
export function useLeaveGuard(dirty: Ref<boolean>): void {
  function onUnload(event: BeforeUnloadEvent): void {
    if (dirty.value) event.preventDefault()
  }
  onMounted(() => window.addEventListener('beforeunload', onUnload))
  onBeforeUnmount(() => window.removeEventListener('beforeunload', onUnload))

  onBeforeRouteLeave(async () => {
    if (!dirty.value) return true
    return askFirst(
      'Leave this page?',
      'What you changed since it was last saved will be lost.',
      'Leave without saving',
      'Stay here',
    )
  })
}
