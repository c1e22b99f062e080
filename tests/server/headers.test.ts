import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startBuiltServer, type BuiltServer } from '../fixtures/builtServer'
import { Visitor } from '../fixtures/visitor'

let server: BuiltServer
beforeAll(async () => { server = await startBuiltServer() })
afterAll(() => server.close())

const publicFiles = () => {
  const root = fileURLToPath(new URL('../../.output/public', import.meta.url))
  const files = readdirSync(root, { recursive: true, withFileTypes: true }).filter(entry => entry.isFile()).map(entry => `${entry.parentPath.slice(root.length)}/${entry.name}`)
  // one of each kind is enough
  return [...new Map(files.map(file => [file.split('.').at(-1), file])).values()]
}

describe('every answer (S5; ASVS 3.4.3–3.4.6)', () => {
  const asked: [string, RequestInit?][] = [
    ['/'], ['/sign-in'], ['/readyz'], ['/api/me'], ['/api/openapi.json'], ['/api/auth/session'], ['/api/auth/csrf'], ['/api/auth/nothing'], ['/api/auth/_log', { method: 'POST' }], ['/api/nothing'], ['/nothing'],
    ['/nothing', { headers: { accept: 'text/html' } }], ['/c/1/work', { headers: { accept: 'text/html' } }], ['/api/me', { method: 'DELETE' }], ['/%E0%A4%A'], ['/api/%00'], ['/_nuxt/nothing.js'], ['/api/me', { method: 'OPTIONS', headers: { 'origin': 'https://elsewhere.example', 'access-control-request-method': 'GET' } }],
    ['/api/passphrase/resets', { method: 'POST', headers: { 'content-type': 'application/json' }, body: '{' }], ['/api/passphrase/resets', { method: 'POST', body: 'a=b' }],
  ]

  it('says nosniff, who may frame it, where it may load from, and what to tell other sites', async () => {
    const files = publicFiles()
    expect(files.length).toBeGreaterThan(2) // else the files were not looked at
    const missing: string[] = []
    for (const [path, init] of [...asked, ...files.map(file => [file] as [string])]) {
      const answer = await new Visitor(server.url).ask(path, init)
      await answer.arrayBuffer()
      const at = (name: string) => answer.headers.get(name) ?? ''
      const where = `${init?.method ?? 'GET'} ${path} (${answer.status})`
      if (at('x-content-type-options') !== 'nosniff') missing.push(`${where}: nosniff`)
      if (at('x-frame-options') !== 'DENY') missing.push(`${where}: x-frame-options "${at('x-frame-options')}"`)
      if (!/^(same-origin|no-referrer)$/.test(at('referrer-policy'))) missing.push(`${where}: referrer-policy`)
      const policy = at('content-security-policy')
      if (!policy.includes('frame-ancestors \'none\'')) missing.push(`${where}: frame-ancestors in "${policy}"`)
      if (!/default-src '(self|none)'|script-src 'none'/.test(policy)) missing.push(`${where}: scripts in "${policy}"`)
      if (!/^[0-9a-f-]{36}$/.test(at('x-request-id'))) missing.push(`${where}: x-request-id`)
      if (at('access-control-allow-origin') !== '') missing.push(`${where}: open to other origins`)
      if (at('x-powered-by') !== '') missing.push(`${where}: says what made it`)
      if (answer.status >= 500) missing.push(`${where}: a server error`)
    }
    expect(missing).toEqual([])
  })

  it('lets a page run only what carries its own nonce', async () => {
    const policies = await Promise.all([1, 2].map(async () => (await new Visitor(server.url).ask('/sign-in')).headers.get('content-security-policy') ?? ''))
    for (const policy of policies) {
      expect(policy).toMatch(/script-src[^;]*'nonce-[\w+/=]+'/)
      expect(policy).toContain('object-src \'none\'')
      expect(policy).toContain('base-uri \'none\'')
      expect(policy).not.toMatch(/script-src[^;]*'unsafe-inline'/)
    }
    expect(policies[0]).not.toBe(policies[1])
  })

  it('says nothing of encrypted transport over plain http, and insists on it over https', async () => {
    expect((await new Visitor(server.url).ask('/readyz')).headers.get('strict-transport-security')).toBeNull()
    const secure = await startBuiltServer({ env: { AUTH_ORIGIN: 'https://labs.example/api/auth', NEXTAUTH_URL: 'https://labs.example/api/auth' } })
    try {
      const guest = new Visitor(secure.url)
      expect((await guest.ask('/readyz')).headers.get('strict-transport-security')).toMatch(/max-age=31536000; includeSubDomains/)
      const cookies = (await guest.ask('/api/auth/csrf')).headers.getSetCookie()
      expect(cookies.length).toBeGreaterThan(0)
      for (const line of cookies) expect(line).toMatch(/; Secure/i)
    }
    finally {
      await secure.close()
    }
  })

  it('keeps what the API says out of caches', async () => {
    for (const path of ['/api/me', '/api/openapi.json', '/api/auth/session', '/api/auth/csrf']) expect((await new Visitor(server.url).ask(path)).headers.get('cache-control'), path).toMatch(/no-store/)
  })
})

describe('what stands in the log', () => {
  it('is one line of JSON for each request, by its pattern, with the number that the answer carries', async () => {
    const answer = await new Visitor(server.url).ask('/reset/a-token-that-nobody-should-read?q=nor-this', { headers: { 'x-request-id': 'made up\n{"level":"info"}'.replace('\n', '') } })
    await answer.text()
    const id = answer.headers.get('x-request-id')!
    await new Promise(resolve => setTimeout(resolve, 200))
    const lines = server.log().split('\n').filter(line => line.includes(id))
    expect(lines).toHaveLength(1)
    expect(JSON.parse(lines[0]!)).toMatchObject({ event: 'request', method: 'GET', status: answer.status })
    // The router's own warnings are for development and tests: with NODE_ENV=production they are not there.
    const log = server.log().split('\n').filter(line => !line.startsWith('[Vue Router warn]')).join('\n')
    expect(log).not.toContain('a-token-that-nobody')
    expect(log).not.toContain('nor-this')
    expect(log).not.toContain('made up')
  })
})
