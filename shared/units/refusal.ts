/** One thing wrong with an input: where (dotted path, as in the request body) and what would be right. */
export interface Issue {
  path: string
  message: string
}

/** Thrown by `shared/` when an input cannot be taken. Names every field that is wrong; the server answers 422. */
export class Refusal extends Error {
  readonly issues: readonly Issue[]

  constructor(issues: readonly Issue[]) {
    super(issues.map((issue) => `${issue.path}: ${issue.message}`).join('; '))
    this.name = 'Refusal'
    this.issues = issues
  }
}

/** Refuses a single field. */
export function refuse(path: string, message: string): never {
  throw new Refusal([{ path, message }])
}
