import { isAlias, isNode, isPair, isScalar, LineCounter, parseDocument, visit, type Document } from 'yaml'
import type { LabFileFault } from './fault'

/** Settings as they were read; `lineOf` finds the line of a setting, or of the nearest one above it that is there. */
export interface ReadYaml { value: unknown, lineOf: (path: readonly PropertyKey[]) => number, faults: LabFileFault[] }

const longest = 200_000
/** Names that mean something to every object of the language: no setting is called so. */
const neverNames = new Set(['__proto__', 'prototype', 'constructor'])

/**
 * Reads a block of settings. Plain values alone: no anchors, aliases, tags or directives, through which a short text could grow without bound
 * or become something else than a value.
 * @param firstLine the line of the file on which the block's first line stands
 */
export function readYaml(source: string, firstLine: number): ReadYaml {
  const refused = (message: string, line = 1): ReadYaml => ({ value: {}, lineOf: () => firstLine, faults: [{ line: firstLine + line - 1, message }] })
  if (source.length > longest) return refused('These settings are longer than any lab needs.')
  const directive = source.split('\n').findIndex(line => /^(%|\.\.\.|---)/.test(line))
  if (directive >= 0) return refused('A line of settings begins with its name, not with %, three points or three dashes.', directive + 1)
  const lines = new LineCounter()
  const document = parsed(source, lines)
  if (!document) return refused('These settings are nested too deeply.')
  const lineAt = (offset: number) => firstLine + Math.max(lines.linePos(offset).line, 1) - 1
  const faults = document.errors.map(error => ({ line: lineAt(error.pos[0]), message: `This cannot be read as settings: ${firstSentence(error.message)}` }))
  if (faults.length > 0) return { value: {}, lineOf: () => firstLine, faults }
  const strange = strangeNode(document)
  if (strange) return { value: {}, lineOf: () => firstLine, faults: [{ line: lineAt(strange.offset), message: strange.message }] }
  return {
    value: document.toJS({ maxAliasCount: 0 }), faults: [],
    lineOf(path) {
      for (let length = path.length; length > 0; length--) {
        const offset = offsetOf(document, path.slice(0, length))
        if (offset !== null) return lineAt(offset)
      }
      return firstLine
    },
  }
}

function parsed(source: string, lineCounter: LineCounter): Document | null {
  try {
    return parseDocument(source, { lineCounter, version: '1.2', schema: 'core', strict: true, uniqueKeys: true, stringKeys: true, merge: false, prettyErrors: false, logLevel: 'silent' })
  }
  catch (error) {
    if (error instanceof RangeError) return null
    throw error
  }
}

function strangeNode(document: Document): { offset: number, message: string } | null {
  const found: { offset: number, message: string }[] = []
  const say = (offset: number | undefined, message: string) => {
    found.push({ offset: offset ?? 0, message })
    return visit.BREAK
  }
  visit(document, (_key, node) => {
    if (isPair(node)) return isScalar(node.key) && neverNames.has(String(node.key.value)) ? say(node.key.range?.[0], `No setting is called “${String(node.key.value)}”.`) : undefined
    if (!isNode(node)) return undefined
    if (isAlias(node) || node.anchor !== undefined) return say(node.range?.[0], 'A setting stands for itself: no anchors (&) and no aliases (*).')
    // A node has a tag only where somebody wrote one.
    return node.tag === undefined ? undefined : say(node.range?.[0], 'A setting is a plain value, without a tag (!).')
  })
  return found[0] ?? null
}

function offsetOf(document: Document, path: readonly PropertyKey[]): number | null {
  const parent: unknown = path.length === 1 ? document.contents : document.getIn(path.slice(0, -1), true)
  const last = path[path.length - 1]
  if (typeof parent === 'object' && parent !== null && 'items' in parent && Array.isArray(parent.items)) {
    const pair = parent.items.find(item => isPair(item) && isScalar(item.key) && item.key.value === last)
    if (isPair(pair) && isScalar(pair.key)) return pair.key.range?.[0] ?? null
  }
  const node = document.getIn(path, true)
  return isNode(node) ? node.range?.[0] ?? null : null
}

const firstSentence = (message: string): string => message.split('\n')[0] ?? message
