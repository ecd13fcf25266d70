import type { Request, Response, Router } from 'express'
import type { z } from 'zod'
import {
  operations,
  type AnswerOf,
  type BodyOf,
  type Operation,
  type OperationId,
  type ParamsOf,
  type QueryOf,
} from '../../shared/contracts/operations.ts'
import type { Deps } from '../deps.ts'
import { fail } from '../errors.ts'
import { sendFile, type FileAnswer } from './file-answer.ts'
import { answerOnce, onceFor, repeatable, type Once } from './once.ts'
import { principalFor } from './read-principal.ts'
import type { Principal } from './principal.ts'
import { STREAMED, type Streamed } from './stream-lines.ts'
import { issuesOf } from './problem.ts'

export interface Call<Id extends OperationId> {
  params: ParamsOf<Id>
  query: QueryOf<Id>
  body: BodyOf<Id>
  principal: Principal
  /** The version that the caller read; 0 where the operation takes none. */
  ifMatch: number
  once: Once
  req: Request
  res: Response
}

type Answer<Id extends OperationId> = (AnswerOf<Id> extends never ? FileAnswer : AnswerOf<Id>) | Streamed

/**
 * Puts one operation of the contracts behind its rights, its schemas and its manners. The handler unpacks, calls one
 * function and returns; what it returns is parsed by the contract, so that nothing else leaves.
 */
export function route<Id extends OperationId>(
  router: Router,
  deps: Deps,
  id: Id,
  handle: (call: Call<Id>) => Promise<Answer<Id>>,
): void {
  const operation: Operation = operations[id]
  router[operation.method](operation.path, async (req, res) => {
    const principal = await principalFor(deps, id, req)
    const asked = {
      params: parse(operation.params, req.params, 'The address is not right.'),
      query: parse(operation.query, req.query, 'The query is not right.'),
      body: parse(operation.body, bodyOf(operation, req), 'Some fields are not right.'),
    }
    const call = operation.idempotent && repeatable(id, principal, req.get('idempotency-key'), asked)
    const doIt = () =>
      handle({
        ...(asked as Pick<Call<Id>, 'params' | 'query' | 'body'>),
        principal,
        ifMatch: operation.ifMatch ? versionIn(req) : 0,
        once: onceFor(call || undefined, deps.clock),
        req,
        res,
      })
    const answer = call ? await answerOnce(deps.db, call, doIt) : await doIt()
    if (answer === STREAMED) return
    if (operation.answer === 'file') sendFile(res, answer as FileAnswer)
    else if (operation.status === 204) res.status(204).end()
    else res.status(operation.status ?? 200).json(operation.answer.parse(answer))
  })
}

function parse(schema: z.ZodType | undefined, value: unknown, detail: string): unknown {
  if (!schema) return undefined
  const result = schema.safeParse(value ?? {})
  return result.success ? result.data : fail('invalid-input', detail, { issues: issuesOf(result.error) })
}

function bodyOf({ body }: Operation, req: Request): unknown {
  if (body && req.get('content-length') !== '0' && req.get('content-length') && !req.is('application/json')) {
    fail('unsupported-type', 'Send application/json in UTF-8.')
  }
  return req.body as unknown
}

function versionIn(req: Request): number {
  const match = /^(?:W\/)?"?(\d{1,15})"?$/.exec(req.get('if-match') ?? '')
  return match
    ? Number(match[1])
    : fail('version-required', 'Name the version that you read in If-Match, such as If-Match: "3".')
}
