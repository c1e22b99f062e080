import katex from 'katex'
import MarkdownIt from 'markdown-it'
import { describe, expect, it } from 'vitest'
import { renderInline, renderLabText } from '../../../../../server/domain/labs/renderLabText'

/** What a browser would make of the HTML: its tags with their attributes, parsed plainly. */
function tagsOf(html: string): { name: string, attributes: string }[] {
  return [...html.matchAll(/<([a-zA-Z][\w-]*)([^>]*)>/g)].map(([, name = '', attributes = '']) => ({ name: name.toLowerCase(), attributes }))
}

const forbiddenTags = ['script', 'img', 'iframe', 'object', 'embed', 'style', 'link', 'form', 'input', 'button', 'base', 'meta', 'video', 'audio', 'foreignobject', 'use', 'animate', 'set', 'textarea', 'template']

const corpus: [title: string, text: string][] = [
  ['a script', '<script>alert(1)</script>'],
  ['a picture that fails', '<img src=x onerror=alert(1)>'],
  ['a picture in Markdown', '![x](https://elsewhere.example/x.png)'],
  ['a script as a link', '[x](javascript:alert(1))'],
  ['a script as a link, hidden by an entity', '[x](java&#x73;cript:alert(1))'],
  ['a link to data', '[x](data:text/html,<script>alert(1)</script>)'],
  ['an automatic script link', '<javascript:alert(1)>'],
  ['a link without a scheme to elsewhere', '[x](//elsewhere.example/x)'],
  ['a handler in a title', '[x](https://a.example "\\" onmouseover=\\"alert(1)")'],
  ['a fence with a tag as its language', '```"><img src=x onerror=alert(1)>\ncode\n```'],
  ['a formula with a script link', '$\\href{javascript:alert(1)}{x}$'],
  ['a formula with a url', '$\\url{javascript:alert(1)}$'],
  ['a formula that fetches', '$\\includegraphics{https://elsewhere.example/x.png}$'],
  ['a formula with a class', '$\\htmlClass{act}{x}$'],
  ['a formula with a style', '$\\htmlStyle{position:fixed;inset:0}{x}$'],
  ['a formula with data', '$\\htmlData{onclick=alert(1)}{x}$'],
  ['a formula with a tag in its text', '$\\text{<img src=x onerror=alert(1)>}$'],
  ['a broken formula with a tag', '$\\frac{<script>alert(1)</script>$'],
  ['a color that is a script', '$\\textcolor{red;background:url(//elsewhere.example)}{x}$'],
  ['an svg', '<svg onload=alert(1)><use href="#x"/></svg>'],
  ['math that carries a tag', '<math><mtext><img src=x onerror=alert(1)></mtext></math>'],
  ['a table cell with a tag', '|a|\n|-|\n|<img src=x onerror=alert(1)>|'],
]

/** What stands in the way of a page: tags, handlers, addresses and styles that no lab text may bring. */
function harmIn(html: string): string[] {
  return tagsOf(html).flatMap(({ name, attributes }) => {
    const style = /\sstyle="([^"]*)"/.exec(attributes)?.[1] ?? ''
    return [
      ...(forbiddenTags.includes(name) ? [`<${name}>`] : []),
      ...(/\son\w+\s*=/i.test(attributes.replace(/\stitle="[^"]*"/, '')) ? ['a handler'] : []),
      ...(/(href|src|action)\s*=\s*["']?\s*(javascript|data|vbscript|\/\/)/i.test(attributes) ? ['an address'] : []),
      ...(/position:\s*(fixed|absolute|sticky)|url\(/i.test(style) ? ['a style'] : []),
    ]
  })
}

describe('lab text', () => {
  it.each(corpus)('makes nothing of %s', (_title, text) => {
    expect(harmIn(renderLabText(text))).toEqual([])
    expect(harmIn(renderInline(text))).toEqual([])
  })

  it('finds harm where a renderer lets HTML through', () => {
    const open = new MarkdownIt({ html: true })
    expect(corpus.filter(([, text]) => harmIn(open.render(text)).length > 0).length).toBeGreaterThanOrEqual(6)
    const trusting = katex.renderToString('\\href{javascript:alert(1)}{x}', { trust: true })
    expect(harmIn(trusting)).toContain('an address')
  })

  it('sets formulas, inline and on their own', () => {
    const html = renderLabText('The rate $\\Gamma = -\\frac{\\partial T}{\\partial z}$ and\n\n$$\\theta = T \\left(\\frac{p_0}{p}\\right)^\\kappa$$')
    expect(html).toContain('<math xmlns="http://www.w3.org/1998/Math/MathML">')
    expect(html).toContain('display="block"')
    expect(html).toContain('<mi mathvariant="normal">Γ</mi>')
  })

  it('keeps money as money', () => {
    expect(renderLabText('It costs $5 and $10.')).toBe('<p>It costs $5 and $10.</p>\n')
  })

  it('stops a formula that expands without end, in time', () => {
    const before = performance.now()
    const html = renderLabText('$\\def\\a{\\a\\a}\\a$ and $\\def\\b{xxxxxxxxxx}\\def\\c{\\b\\b\\b\\b\\b\\b\\b\\b\\b\\b}\\def\\d{\\c\\c\\c\\c\\c\\c\\c\\c\\c\\c}\\def\\e{\\d\\d\\d\\d\\d\\d\\d\\d\\d\\d}\\e\\e\\e\\e\\e\\e\\e\\e\\e\\e$')
    expect(performance.now() - before).toBeLessThan(3000)
    expect(html.match(/katex-error/g)).toHaveLength(2)
  })

  it('draws no box larger than twenty times the type', () => {
    const html = renderLabText('$\\rule{500em}{500em}$').replace(/<annotation.*?<\/annotation>/s, '') // which holds what was typed
    const sizes = [...html.matchAll(/(-?\d+(?:\.\d+)?)em/g)].map(match => Math.abs(Number(match[1])))
    expect(sizes.length).toBeGreaterThan(0)
    expect(Math.max(...sizes)).toBeLessThanOrEqual(21)
  })

  it('puts a text’s first heading below the page’s own', () => {
    expect(renderLabText('# Lab')).toBe('<h2>Lab</h2>\n')
  })
})
