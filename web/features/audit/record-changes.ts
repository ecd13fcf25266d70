export interface RecordChange {
  name: string
  before: string
  after: string
  changed: boolean
}

/** Two states of a record laid side by side, field by field; fields of fields by their path. */
export function recordChanges(before: unknown, after: unknown): RecordChange[] {
  const [was, is] = [fieldsOf(before), fieldsOf(after)]
  const names = [...new Set([...was.keys(), ...is.keys()])]
  return names.map((name) => {
    const [one, other] = [was.get(name) ?? '', is.get(name) ?? '']
    return { name, before: one, after: other, changed: one !== other }
  })
}

function fieldsOf(value: unknown, path = ''): Map<string, string> {
  if (value === null || value === undefined) return new Map()
  if (typeof value !== 'object') return new Map([[path || 'value', String(value)]])
  return new Map(
    Object.entries(value).flatMap(([key, inner]) => [...fieldsOf(inner, path ? `${path}.${key}` : key)]),
  )
}
