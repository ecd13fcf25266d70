import { problem } from '../../shared/contracts/common.ts'
import {
  operations,
  type AnswerOf,
  type BodyInputOf,
  type Operation,
  type OperationId,
  type Operations,
  type ParamsOf,
  type QueryInputOf,
} from '../../shared/contracts/operations.ts'
import { quoteLink } from './quote-link.ts'
import { ApiProblem, notUnderstood, unreachable } from './problem.ts'

type Needed<Key extends string, Value> = [Value] extends [undefined] ? object : Record<Key, Value>

export type CallOptions<Id extends OperationId> = Needed<'params', ParamsOf<Id>> &
  Needed<'body', BodyInputOf<Id>> &
  (Operations[Id] extends { ifMatch: true } ? { ifMatch: number } : object) & {
    query?: QueryInputOf<Id>
    /** The same key for the same act, however often it is tried; a new one is made when left out. */
    idempotencyKey?: string
    signal?: AbortSignal
  }

interface LooseOptions {
  params?: Record<string, string>
  query?: Record<string, unknown>
  body?: unknown
  ifMatch?: number
  idempotencyKey?: string
  signal?: AbortSignal
}

/** Calls one operation of the API and parses its answer by its contract. Throws `ApiProblem`. */
export async function call<Id extends OperationId>(id: Id, options: CallOptions<Id>): Promise<AnswerOf<Id>> {
  const operation: Operation = operations[id]
  const reply = await send(operation, options as LooseOptions)
  if (operation.answer === 'file') throw new Error(`${id} answers a file: use callFile`)
  const parsed = operation.answer.safeParse(reply.status === 204 ? {} : await readJson(reply))
  if (!parsed.success) throw notUnderstood(reply.status)
  return parsed.data as AnswerOf<Id>
}

/** Calls an operation that answers a file. */
export async function callFile<Id extends OperationId>(id: Id, options: CallOptions<Id>): Promise<Blob> {
  const reply = await send(operations[id], options as LooseOptions)
  return reply.blob()
}

async function send(operation: Operation, options: LooseOptions): Promise<Response> {
  const reply = await fetch(addressOf(operation, options), {
    method: operation.method.toUpperCase(),
    headers: headersOf(operation, options),
    credentials: 'same-origin',
    ...(options.body === undefined ? {} : { body: JSON.stringify(options.body) }),
    ...(options.signal ? { signal: options.signal } : {}),
  }).catch((error: unknown) => {
    throw options.signal?.aborted ? error : unreachable()
  })
  if (!reply.ok) throw await refusalOf(reply)
  return reply
}

function addressOf({ path }: Operation, { params = {}, query = {} }: LooseOptions): string {
  const filled = path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(params[name] ?? ''))
  const search = new URLSearchParams()
  for (const [name, value] of Object.entries(query)) {
    if (value !== undefined && value !== '') search.set(name, String(value))
  }
  return search.size > 0 ? `${filled}?${search}` : filled
}

function headersOf(operation: Operation, options: LooseOptions): Record<string, string> {
  const headers: Record<string, string> = { Accept: 'application/json' }
  if (options.body !== undefined) headers['Content-Type'] = 'application/json'
  if (options.ifMatch !== undefined) headers['If-Match'] = `"${options.ifMatch}"`
  if (operation.idempotent) headers['Idempotency-Key'] = options.idempotencyKey ?? crypto.randomUUID()
  const link = quoteLink.read()
  if (link) headers['Quote-Link'] = link
  return headers
}

async function refusalOf(reply: Response): Promise<ApiProblem> {
  const parsed = problem.safeParse(await readJson(reply))
  return parsed.success ? new ApiProblem(parsed.data) : notUnderstood(reply.status)
}

async function readJson(reply: Response): Promise<unknown> {
  return reply.json().catch(() => undefined)
}
