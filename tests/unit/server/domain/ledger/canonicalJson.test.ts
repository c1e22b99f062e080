import canonicalize from 'canonicalize'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { canonicalJson } from '../../../../../server/domain/ledger/canonicalJson'

describe('canonical JSON', () => {
  it('gives the example of its docstring', () => {
    expect(canonicalJson({ b: 1, a: [true, null] })).toBe('{"a":[true,null],"b":1}')
  })
  it('orders names by their UTF-16 units and prints numbers and controls as RFC 8785 does (sections 3.2.3 and 3.2.2)', () => {
    const names = { '€': 'Euro Sign', '\r': 'Carriage Return', '\ufb33': 'Hebrew Letter Dalet With Dagesh', '1': 'One', '😀': 'Emoji: Grinning Face', '\u0080': 'Control', 'ö': 'Latin Small Letter O With Diaeresis' }
    expect(Object.values(JSON.parse(`[${[...canonicalJson(names).matchAll(/:("(?:[^"\\]|\\.)*")/g)].map(match => match[1]).join()}]`) as string[])).toEqual(
      ['Carriage Return', 'One', 'Control', 'Latin Small Letter O With Diaeresis', 'Euro Sign', 'Emoji: Grinning Face', 'Hebrew Letter Dalet With Dagesh'])
    expect(canonicalJson([Number('333333333.33333329'), 1e30, 4.50, 2e-3, 0.000000000000000000000000001, -0])).toBe('[333333333.3333333,1e+30,4.5,0.002,1e-27,0]')
    expect(canonicalJson('\u20ac$\u000f\nA\'B"\\\\"/')).toBe('"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"')
  })
  it('is the text that the package gives, for any plain data', () => {
    fc.assert(fc.property(fc.jsonValue({ maxDepth: 4 }), value => canonicalJson(value) === canonicalize(value)), { numRuns: 500 })
    expect(canonicalJson({ a: undefined, at: new Date(0), bytes: Buffer.from('ab') })).toBe(canonicalize({ a: undefined, at: new Date(0), bytes: Buffer.from('ab') }))
  })
  it('refuses what has no canonical form', () => {
    for (const value of [Number.NaN, Infinity, '\ud800', { '\ud800': 1 }, undefined, 1n]) expect(() => canonicalJson(value)).toThrow(TypeError)
  })
})
