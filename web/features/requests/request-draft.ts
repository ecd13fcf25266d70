import type { RequestDto } from '../../../shared/contracts/requests.ts'
import type { Issue } from '../../../shared/units/refusal.ts'
import type { RequestInput } from '../../api/requests.ts'
import { newLine, type LineDraft } from './line-draft.ts'
import { geometryIssues, missingOf } from './line-checks.ts'
import { fromRequirement, toRequirement } from './line-requirement.ts'

export interface RequestDraft {
  title: string
  shipTo: { address: string; region: string; km: number | undefined }
  neededBy: string
  notes: string
  lines: LineDraft[]
}

export function newRequest(): RequestDraft {
  return {
    title: '',
    shipTo: { address: '', region: '', km: undefined },
    neededBy: '',
    notes: '',
    lines: [newLine('A1')],
  }
}

export function fromDto(dto: RequestDto): RequestDraft {
  return {
    title: dto.title,
    shipTo: { ...dto.shipTo },
    neededBy: dto.neededBy ?? '',
    notes: dto.notes,
    lines: dto.lines.map((line) => fromRequirement(line.requirement)),
  }
}

export function toBody(draft: RequestDraft): RequestInput {
  return {
    title: draft.title.trim(),
    shipTo: { ...draft.shipTo, km: draft.shipTo.km ?? 0 },
    neededBy: draft.neededBy || null,
    notes: draft.notes,
    lines: draft.lines.map(toRequirement),
  }
}

/** Everything that keeps the request from being saved, by its path in the body, in the order of the page. */
export function issuesOf(draft: RequestDraft): Issue[] {
  const issues = draft.lines.flatMap((line, index) =>
    [...missingOf(line), ...geometryIssues(line)].map(({ path, message }) => ({
      path: `lines.${index}.${path}`,
      message,
    })),
  )
  const marks = draft.lines.map((line) => line.mark.trim())
  marks.forEach((mark, index) => {
    if (mark !== '' && marks.indexOf(mark) < index) {
      issues.push({ path: `lines.${index}.mark`, message: `${mark} is already another column` })
    }
  })
  const { title, shipTo } = draft
  if (title.trim() === '') issues.push({ path: 'title', message: 'a name for the job' })
  if (shipTo.address.trim() === '') issues.push({ path: 'shipTo.address', message: 'where the steel goes' })
  if (shipTo.region.trim() === '') {
    issues.push({ path: 'shipTo.region', message: 'the state or region that taxes the delivery' })
  }
  if (shipTo.km === undefined) {
    issues.push({ path: 'shipTo.km', message: 'the road distance from the shop, 0 to collect' })
  }
  return issues
}
