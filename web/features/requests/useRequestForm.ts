import { computed, nextTick, reactive, ref, toRaw, watch } from 'vue'
import { useQueryClient } from '@tanstack/vue-query'
import type { Problem } from '../../../shared/contracts/common.ts'
import type { RequestDto } from '../../../shared/contracts/requests.ts'
import { problemOf } from '../../api/problem.ts'
import { createRequest, editRequest, requestKeys, submitRequest } from '../../api/requests.ts'
import { focusField } from '../../composables/focus-field.ts'
import { copyLine, newLine, nextMark, type LineDraft } from './line-draft.ts'
import { fromDto, issuesOf, newRequest, toBody, type RequestDraft } from './request-draft.ts'
import { useFieldErrors } from './useFieldErrors.ts'

/** The request while it is written: its lines, what is wrong with them, and how it is kept. */
export function useRequestForm(
  kept: RequestDto | null,
  unread: ReadonlyMap<string, { path: string; message: string }>,
) {
  const cache = useQueryClient()
  const draft = reactive<RequestDraft>(kept ? fromDto(kept) : newRequest())
  const current = ref(0)
  const saved = ref(kept ? { id: kept.id, version: kept.version } : null)
  const before = ref(JSON.stringify(toBody(toRaw(draft))))
  const busy = ref<'save' | 'submit' | null>(null)
  const problem = ref<Problem | null>(null)
  const errors = useFieldErrors()
  // The same draft, tried again after a lost answer, is the same request.
  let key = crypto.randomUUID()

  const line = computed<LineDraft>({
    get: () => draft.lines[current.value] ?? newLine('A1'),
    set: (value) => {
      draft.lines[current.value] = value
    },
  })
  const body = computed(() => JSON.stringify(toBody(draft)))
  const dirty = computed(() => body.value !== before.value)
  watch(body, () => {
    key = crypto.randomUUID()
    // What was said about a field stays only while it still holds.
    if (errors.issues.value.length > 0) {
      const still = new Set(issuesOf(draft).map((issue) => issue.path))
      errors.set(errors.issues.value.filter((issue) => still.has(issue.path)))
    }
  })

  function insert(fresh: LineDraft): void {
    draft.lines.splice(current.value + 1, 0, fresh)
    current.value += 1
  }
  const marks = () => draft.lines.map((each) => each.mark)
  const add = () => insert(newLine(nextMark(line.value.mark, marks())))
  const copy = () => insert(copyLine(line.value, nextMark(line.value.mark, marks())))
  function remove(): void {
    draft.lines.splice(current.value, 1)
    current.value = Math.min(current.value, draft.lines.length - 1)
  }

  async function showFirst(paths: readonly string[]): Promise<void> {
    const [first] = paths
    const place = /^lines\.(\d+)\.(.+)$/.exec(first ?? '')
    if (place) current.value = Number(place[1])
    await nextTick()
    focusField(place?.[2] ?? first ?? '')
  }

  async function keep(): Promise<RequestDto | null> {
    problem.value = null
    const [notRead] = unread.values()
    if (notRead) {
      focusField(notRead.path)
      return null
    }
    const found = issuesOf(draft)
    errors.set(found)
    if (found.length > 0) {
      await showFirst(found.map((issue) => issue.path))
      return null
    }
    const sent = body.value
    const dto = saved.value
      ? await editRequest(saved.value.id, saved.value.version, toBody(draft))
      : await createRequest(toBody(draft), key)
    saved.value = { id: dto.id, version: dto.version }
    before.value = sent
    cache.setQueryData(requestKeys.one(dto.id), dto)
    await cache.invalidateQueries({ queryKey: requestKeys.all, refetchType: 'none' })
    return dto
  }

  async function act(what: 'save' | 'submit'): Promise<RequestDto | null> {
    busy.value = what
    try {
      const dto = await keep()
      if (!dto || what === 'save') return dto
      const asked = await submitRequest(dto.id, dto.version)
      cache.setQueryData(requestKeys.one(asked.id), asked)
      return asked
    } catch (error) {
      problem.value = problemOf(error)
      errors.set(problem.value.errors)
      if (problem.value.errors.length > 0) await showFirst(problem.value.errors.map(({ path }) => path))
      return null
    } finally {
      busy.value = null
    }
  }

  return {
    draft,
    current,
    line,
    dirty,
    busy,
    problem,
    errors,
    wrongLines: computed(
      () =>
        new Set(
          errors.issues.value.flatMap(({ path }) => {
            const place = /^lines\.(\d+)\./.exec(path)
            return place ? [Number(place[1])] : []
          }),
        ),
    ),
    add,
    copy,
    remove,
    save: () => act('save'),
    submit: () => act('submit'),
  }
}
