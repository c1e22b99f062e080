import { z } from 'zod'
import { routes } from '#routes'
import type { DescribedRoute } from '../utils/defineApiHandler'
import { defineApiHandler } from '../utils/defineApiHandler'

const described = (handler: unknown): DescribedRoute | null =>
  typeof handler === 'function' && 'described' in handler ? (handler.described as DescribedRoute) : null

const schemaOf = (schema: z.ZodType, io: 'input' | 'output') => z.toJSONSchema(schema, { io, unrepresentable: 'any', target: 'draft-2020-12' })

function parametersOf(where: 'path' | 'query', schema: z.ZodType | undefined): unknown[] {
  if (!(schema instanceof z.ZodObject)) return []
  return Object.entries(schema.shape as Record<string, z.ZodType>).map(([name, part]) => ({
    name, in: where, required: where === 'path' || !part.safeParse(undefined).success, schema: schemaOf(part, 'input'),
  }))
}

function operationOf(route: DescribedRoute): Record<string, unknown> {
  const headers = [
    ...(route.makes ? [{ name: 'Idempotency-Key', in: 'header', required: true, schema: { type: 'string', minLength: 8, maxLength: 200 } }] : []),
    ...(route.guards ? [{ name: 'If-Match', in: 'header', required: true, schema: { type: 'string' } }] : []),
  ]
  return {
    'summary': route.summary,
    'x-action': route.action,
    'parameters': [...parametersOf('path', route.params), ...parametersOf('query', route.query), ...headers],
    ...(route.body && route.raw !== 'body' ? { requestBody: { required: true, content: { 'application/json': { schema: schemaOf(route.body, 'input') } } } } : {}),
    ...(route.raw === 'body' ? { requestBody: { required: true, content: { 'application/octet-stream': { schema: { type: 'string', format: 'binary' } } } } } : {}),
    'responses': {
      [route.status ?? 200]: { description: 'Done', content: route.raw === 'answer' ? {} : { 'application/json': { schema: schemaOf(route.reply, 'output') } } },
      default: { description: 'Refused (RFC 9457)', content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } } },
    },
  }
}

const problem = { type: 'object', required: ['type', 'title', 'status', 'code', 'detail'], properties: { type: { type: 'string' }, title: { type: 'string' }, status: { type: 'integer' }, code: { type: 'string' }, detail: { type: 'string' } } }

export default defineApiHandler({
  action: 'house:describe',
  summary: 'This description',
  reply: z.record(z.string(), z.unknown()),
  handle: () => {
    const paths: Record<string, Record<string, unknown>> = {}
    for (const { method, path, handler } of routes) {
      const route = described(handler)
      if (route) (paths[path] ??= {})[method] = operationOf(route)
    }
    ;(paths['/api/openapi.json'] ??= {}).get = { 'summary': 'This description', 'x-action': 'house:describe', 'responses': { 200: { description: 'Done' } } }
    return { openapi: '3.1.0', info: { title: 'Tetherhouse', version: '0.1.0' }, paths, components: { schemas: { Problem: problem } } }
  },
})
