import { useMutation } from '@tanstack/vue-query'
import { ref, type Ref } from 'vue'
import type { QuoteDto } from '../../../shared/contracts/quotes.ts'
import { propose } from '../../api/proposals.ts'
import { lineEditOf, type LineEdit, type RevisionEdit } from './revision-edit.ts'

/**
 * Another shape with all that follows from it: plates, rods and welds as the engine details it for the same
 * requirement. Extras and what was set by hand stay as they are.
 */
export function useFit(kept: Ref<QuoteDto>, edit: Ref<RevisionEdit>) {
  const said = ref<string | null>(null)

  const { mutate, isPending, error } = useMutation({
    mutationFn: async ({ index, section }: { index: number; section: string }) => {
      const line = kept.value.current.lines[index]
      if (!line) return
      const answer = await propose({ ...line.requirement, section }, new AbortController().signal)
      const target = edit.value.lines[index]
      if (!target) return
      if (answer.found) adopt(target, lineEditOf(answer.spec))
      else target.section = section
      said.value = answer.found ? null : `${section} does not do: ${answer.reason}`
    },
    onMutate: () => {
      said.value = null
    },
  })
  return { fit: mutate, fitting: isPending, fitError: error, said }
}

function adopt(line: LineEdit, spec: LineEdit): void {
  const { section, grade, base, cap, rods, welds } = spec
  Object.assign(line, { section, grade, base, cap, rods, welds })
}
