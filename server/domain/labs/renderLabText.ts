import { createHash } from 'node:crypto'
import { tex } from '@mdit/plugin-tex'
import katex from 'katex'
import MarkdownIt from 'markdown-it'
import sanitizeHtml from 'sanitize-html'

/** How many rendered texts are kept by digest: a class opens the same few. */
const kept = new Map<string, string>()
const mostKept = 300

/** What one formula may do: no links or pictures, no box larger than 20 em, at most 500 expansions. */
const formulaLimits = { trust: false, maxSize: 20, maxExpand: 500, throwOnError: false, strict: 'ignore', output: 'htmlAndMathml' } as const

/** Characters of one formula; longer ones are shown as typed. */
const longestFormula = 2000

const markdown = new MarkdownIt({ html: false, linkify: false, typographer: false, breaks: false })
  .use(tex, { delimiters: 'all', render: renderFormula })

function renderFormula(content: string, displayMode: boolean): string {
  if (content.length > longestFormula) return `<code>${markdown.utils.escapeHtml(content)}</code>`
  return katex.renderToString(content, { ...formulaLimits, displayMode })
}

const mathml = ['math', 'semantics', 'annotation', 'mrow', 'mi', 'mn', 'mo', 'ms', 'mtext', 'mspace', 'msup', 'msub', 'msubsup', 'munder', 'mover', 'munderover', 'mfrac', 'msqrt', 'mroot', 'mtable', 'mtr', 'mtd', 'mlabeledtr', 'mstyle', 'mpadded', 'mphantom', 'menclose', 'mglyph']
const drawing = ['svg', 'path', 'line', 'g']

/** A length as KaTeX writes it; nothing that fetches, covers or scripts. */
const length = /^-?\d{0,4}(\.\d{1,6})?(em|ex|px|%)?$/
const shade = /^(#[0-9a-f]{3,8}|[a-z]{3,20}|transparent)$/i

const allowed: sanitizeHtml.IOptions = {
  allowedTags: ['h1', 'h2', 'h3', 'h4', 'h5', 'h6', 'p', 'a', 'ul', 'ol', 'li', 'blockquote', 'em', 'strong', 's', 'code', 'pre', 'hr', 'br', 'table', 'thead', 'tbody', 'tr', 'th', 'td', 'span', ...mathml, ...drawing],
  allowedAttributes: {
    'a': ['href'],
    'ol': ['start'],
    'th': ['style'],
    'td': ['style'],
    'span': ['class', 'style', 'aria-hidden', 'title'],
    'math': ['xmlns', 'display'],
    'annotation': ['encoding'],
    'mo': ['stretchy', 'fence', 'separator', 'lspace', 'rspace', 'minsize', 'maxsize', 'accent', 'form', 'mathvariant'],
    'mi': ['mathvariant'],
    'mn': ['mathvariant'],
    'mtext': ['mathvariant'],
    'mspace': ['width', 'height', 'depth', 'linebreak'],
    'mtable': ['rowspacing', 'columnspacing', 'columnalign', 'displaystyle'],
    'mstyle': ['scriptlevel', 'displaystyle', 'mathcolor'],
    'mpadded': ['width', 'height', 'depth', 'lspace', 'voffset'],
    'mover': ['accent'],
    'munder': ['accentunder'],
    'mfrac': ['linethickness'],
    'menclose': ['notation'],
    'svg': ['xmlns', 'width', 'height', 'viewBox', 'viewbox', 'preserveAspectRatio', 'preserveaspectratio', 'style'],
    'path': ['d'],
    'line': ['x1', 'y1', 'x2', 'y2', 'stroke-width'],
  },
  allowedStyles: {
    '*': {
      'height': [length], 'width': [length], 'min-width': [length], 'top': [length], 'bottom': [length], 'left': [length], 'right': [length],
      'margin-left': [length], 'margin-right': [length], 'margin-top': [length], 'margin': [/^(-?\d{0,3}(\.\d{1,6})?(em|px)?\s?){1,4}$/], 'padding-left': [length], 'padding-right': [length],
      'vertical-align': [length], 'border-bottom-width': [length], 'border-top-width': [length], 'border-right-width': [length], 'border-width': [length], 'font-size': [length],
      'color': [shade], 'border-color': [shade], 'background-color': [shade], 'position': [/^relative$/], 'text-align': [/^(left|right|center)$/],
    },
  },
  allowedSchemes: ['http', 'https', 'mailto'],
  allowedSchemesAppliedToAttributes: ['href'],
  allowProtocolRelative: false,
  parser: { lowerCaseTags: false, lowerCaseAttributeNames: false },
  transformTags: {
    // The page's own heading is the lab's title: a text's first level stands below it.
    h1: 'h2',
    a: (tagName, attribs): sanitizeHtml.Tag => ({ tagName, attribs: attribs.href === undefined ? {} : { href: attribs.href } }),
  },
}

/**
 * The HTML of a text that an author wrote: Markdown with formulas between dollar signs, raw HTML shown as typed.
 * It is made on the server only and passes an allow-list after it was made, whatever the renderers may let through.
 */
export function renderLabText(text: string): string {
  const digest = createHash('sha256').update(text).digest('hex')
  const known = kept.get(digest)
  if (known !== undefined) return known
  const html = sanitizeHtml(markdown.render(text), allowed)
  if (kept.size >= mostKept) kept.delete(kept.keys().next().value ?? '')
  kept.set(digest, html)
  return html
}

/** A sentence with formulas, without a paragraph around it. */
export function renderInline(text: string): string {
  return sanitizeHtml(markdown.renderInline(text), allowed)
}
