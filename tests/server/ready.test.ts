import { afterAll, beforeAll, expect, it } from 'vitest'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { Visitor } from '../fixtures/visitor'

let server: BuiltServer
beforeAll(async () => { server = await startBuiltServer() })
afterAll(() => server.close())

it('is ready, describes itself with an action for each operation, and has nobody signed in', async () => {
  const visitor = new Visitor(server.url)
  expect(await visitor.get('/readyz')).toEqual({ ready: true })
  const { paths } = await visitor.get<{ paths: Record<string, Record<string, { 'x-action'?: string }>> }>('/api/openapi.json')
  const operations = Object.entries(paths).flatMap(([path, methods]) => Object.entries(methods).map(([method, operation]) => ({ where: `${method} ${path}`, action: operation['x-action'] })))
  expect(operations.length).toBeGreaterThan(1)
  expect(operations.filter(operation => !operation.action)).toEqual([])
  expect((await visitor.ask('/api/me')).status).toBe(401)
})

it('ends with code 0 on SIGTERM and comes back with its data', async () => {
  expect(await server.stop('SIGTERM')).toBe(0)
  await server.restart()
  expect((await new Visitor(server.url).ask('/readyz')).status).toBe(200)
})
