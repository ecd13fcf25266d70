import type { Problem } from '../../shared/contracts/common.ts'

/** Anything that the API refused, or that kept us from it, as the one kind of error that pages show. */
export class ApiProblem extends Error {
  readonly problem: Problem

  constructor(problem: Problem) {
    super(problem.detail || problem.title)
    this.name = 'ApiProblem'
    this.problem = problem
  }
}

function local(title: string, detail: string, status = 0): ApiProblem {
  return new ApiProblem({ type: 'internal', title, status, detail, errors: [], requestId: '' })
}

export function unreachable(): ApiProblem {
  return local(
    'The desk cannot be reached',
    'Check the connection and try again. Nothing on this page is lost.',
  )
}

export function notUnderstood(status: number): ApiProblem {
  return local(
    'The answer was not understood',
    'The page may be older than the desk. Load it again; if that does not help, tell us.',
    status,
  )
}

/** What to show for whatever was thrown. */
export function problemOf(error: unknown): Problem {
  return (error instanceof ApiProblem ? error : unreachable()).problem
}
