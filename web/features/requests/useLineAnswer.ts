import { computed, shallowReactive, watch, type Ref } from 'vue'
import type { ProposalAnswerDto } from '../../../shared/contracts/proposals.ts'
import { ApiProblem, problemOf } from '../../api/problem.ts'
import { propose, type ProposalInput } from '../../api/proposals.ts'
import { useLatest } from '../../composables/useLatest.ts'
import { geometryIssues, missingOf } from './line-checks.ts'
import type { LineDraft } from './line-draft.ts'
import { toRequirement } from './line-requirement.ts'

interface Asked {
  key: string
  answer: ProposalAnswerDto
}

/** The shape and price of the mark in hand, asked again as it changes; the last answer of each mark is remembered. */
export function useLineAnswer(line: Ref<LineDraft>, to: Ref<{ km: number | undefined; region: string }>) {
  const answers = shallowReactive(new Map<string, ProposalAnswerDto>())
  const latest = useLatest(async (input: { key: string; body: ProposalInput }, signal): Promise<Asked> => {
    return { key: input.key, answer: await propose(input.body, signal) }
  })

  const missing = computed(() => missingOf(line.value))
  const wrong = computed(() => geometryIssues(line.value))
  const body = computed<ProposalInput | null>(() => {
    if (missing.value.length > 0 || wrong.value.length > 0) return null
    const { look } = line.value
    return {
      ...toRequirement(line.value),
      ...(to.value.km === undefined ? {} : { delivery: { km: to.value.km, region: to.value.region } }),
      ...(look ? { section: look } : {}),
    }
  })

  watch(
    () => [line.value.key, JSON.stringify(body.value)] as const,
    () => {
      if (body.value) latest.ask({ key: line.value.key, body: body.value })
      else latest.stop()
    },
    { immediate: true },
  )
  watch(latest.answer, (asked) => {
    if (asked) answers.set(asked.key, asked.answer)
  })

  const refused = computed(() => {
    const error = latest.error.value
    return error === undefined || latest.pending.value ? null : problemOf(error)
  })
  return {
    answers,
    answer: computed(() => (body.value ? answers.get(line.value.key) : undefined)),
    pending: latest.pending,
    missing,
    /** Wrong fields of the mark in hand: found here at once, or named by the server. */
    issues: computed(() => {
      const error = latest.error.value
      const told = error instanceof ApiProblem && !latest.pending.value ? error.problem.errors : []
      return [...wrong.value, ...told]
    }),
    problem: refused,
  }
}
