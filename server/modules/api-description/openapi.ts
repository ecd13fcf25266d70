import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from 'zod-openapi'
import type { z } from 'zod'
import { problem } from '../../../shared/contracts/common.ts'
import { operations, type Operation } from '../../../shared/contracts/operations.ts'

/** The description of the API, made from the same schemas that validate. */
export function describeApi(): ReturnType<typeof createDocument> {
  const paths: ZodOpenApiPathsObject = {}
  for (const [id, operation] of Object.entries<Operation>(operations)) {
    const path = operation.path.replace(/:(\w+)/g, '{$1}')
    paths[path] = { ...paths[path], [operation.method]: describe(id, operation) }
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Plumbrule',
      version: '1',
      description: 'Quantities: mm, N, N·mm, MPa, kg; money in minor units; instants in UTC.',
    },
    paths,
  })
}

function describe(id: string, operation: Operation): ZodOpenApiOperationObject {
  const { summary, params, query, body, answer, status = 200 } = operation
  return {
    operationId: id,
    summary,
    requestParams: {
      ...(params ? { path: params as z.ZodObject } : {}),
      ...(query ? { query: query as z.ZodObject } : {}),
    },
    ...(body ? { requestBody: { content: { 'application/json': { schema: body } } } } : {}),
    responses: {
      [status]:
        answer === 'file' || status === 204
          ? { description: summary }
          : { description: summary, content: { 'application/json': { schema: answer } } },
      default: {
        description: 'What was wrong (RFC 9457)',
        content: { 'application/problem+json': { schema: problem } },
      },
    },
  }
}
