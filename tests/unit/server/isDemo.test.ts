import { describe, expect, it } from 'vitest'
import { isDemo } from '../../../server/utils/isDemo'

describe('the demo', () => {
  it.each([
    ['on this machine alone', {}, true],
    ['on this machine, by its own address', { HOST: '127.0.0.1', AUTH_ORIGIN: 'http://127.0.0.1:3000/api/auth' }, true],
    ['on this machine by IPv6', { HOST: '::1' }, true],
    ['on this machine by IPv6, by its own address', { HOST: '::1', AUTH_ORIGIN: 'http://[::1]:3000/api/auth' }, true],
    ['on a host that others reach', { HOST: '0.0.0.0' }, false],
    ['behind a proxy', { HOST: '127.0.0.1', AUTH_ORIGIN: 'https://labs.example/api/auth' }, false],
    ['behind a proxy, asked for', { HOST: '127.0.0.1', AUTH_ORIGIN: 'https://labs.example/api/auth', DEMO: '1' }, true],
    ['on this machine, refused', { DEMO: '0' }, false],
  ] as const)('%s', (_where, env, want) => {
    expect(isDemo({ NODE_ENV: 'production', ...env })).toBe(want)
  })
})
