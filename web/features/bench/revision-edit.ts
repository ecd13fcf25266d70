import { toRaw } from 'vue'
import type { LineSpecDto, ShownLineSpecDto } from '../../../shared/contracts/pricing.ts'
import { revisionBody, type RevisionDto } from '../../../shared/contracts/quotes.ts'
import type { Issue } from '../../../shared/units/refusal.ts'
import type { RevisionInput } from '../../api/quotes.ts'

/** A number may be missing while it is typed. */
type Open<T> = T extends number
  ? number | undefined
  : T extends readonly (infer Item)[]
    ? Open<Item>[]
    : T extends object
      ? { [Key in keyof T]: Open<T[Key]> }
      : T

export type LineEdit = Open<LineSpecDto>
export type PlateEdit = NonNullable<LineEdit['base']>

/** The whole work of a draft while somebody changes it. */
export interface RevisionEdit {
  lines: LineEdit[]
  discount: string
  note: string
}

/** Deep copies: an edit shares nothing with what was read. */
export function editOf(revision: Pick<RevisionDto, 'lines' | 'discount' | 'note'>): RevisionEdit {
  return {
    lines: revision.lines.map(({ spec }) => lineEditOf(spec)),
    discount: revision.discount,
    note: revision.note,
  }
}

/** The shop is answered with everything; what is left out for others is filled in for the type's sake. */
export function lineEditOf(spec: ShownLineSpecDto): LineEdit {
  const { extras, overrides = [], ...rest } = structuredClone(toRaw(spec))
  return { ...rest, extras: extras.map((extra) => ({ ...extra, unitCost: extra.unitCost ?? '' })), overrides }
}

/** As it would be sent, or what is still wrong with it, each at its field. */
export function readEdit(
  edit: RevisionEdit,
): { body: RevisionInput; issues: [] } | { body: null; issues: Issue[] } {
  const parsed = revisionBody.safeParse({ ...edit, discount: edit.discount || '0' })
  if (parsed.success) return { body: parsed.data, issues: [] }
  return {
    body: null,
    issues: parsed.error.issues.map((issue) => ({ path: issue.path.join('.'), message: wordsOf(issue) })),
  }
}

interface ZodIssueLike {
  code?: string | undefined
  message: string
  path: PropertyKey[]
  minimum?: unknown
  maximum?: unknown
  inclusive?: unknown
  origin?: unknown
}

const MM = new Set(['length', 'width', 'thickness', 'height', 'diameter', 'leg'])

function wordsOf(issue: ZodIssueLike): string {
  const unit = MM.has(String(issue.path.at(-1))) ? ' mm' : ''
  if (issue.path.at(-1) === 'reason') return 'why, in at least three letters'
  if (issue.code === 'too_small' && issue.origin === 'string') return 'this is wanted'
  if (issue.code === 'too_small') {
    return `${issue.inclusive ? 'at least' : 'more than'} ${String(issue.minimum)}${unit}`
  }
  if (issue.code === 'too_big') return `at most ${String(issue.maximum)}${unit}`
  if (issue.code === 'invalid_type') return 'a number is wanted'
  return issue.message
}
