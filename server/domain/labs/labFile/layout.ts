import type { LabFileFault } from './fault'

/**
 * How a lab's text file is laid out, line by line: settings between two lines of `---`; the text; each step as a heading `## …`, a block of settings
 * that opens with ```` ```step ```` and its own text; the readings of the practice in a block that opens with ```` ```readings ````; last, under
 * `# Marking guide`, what staff alone see.
 */
export interface Block { /** Of its first line of settings. */ line: number, source: string }
export interface LaidOut {
  head: Block
  text: string
  steps: { titleLine: number, title: string, settings: Block, text: string }[]
  readings: Block | null
  guide: string
}

const opens = /^```(step|readings)\s*$/
const closes = /^```\s*$/
const guideLine = /^# Marking guide\s*$/

/** Text between two marks, without the empty lines at its ends. */
const between = (lines: readonly string[], from: number, to: number): string => lines.slice(from, to).join('\n').replace(/^(?:[ \t]*\n)+/, '').trimEnd()

/** Whole lines: the last one ends too, since a text among the settings may end with empty lines. */
const linesOf = (lines: readonly string[], from: number, to: number): string => lines.slice(from, to).map(line => `${line}\n`).join('')

/** True where a text, put in the open, is read back as it is. */
export function isPlainText(text: string): boolean {
  const lines = text.split('\n')
  return !text.includes('\r') && text === between(lines, 0, lines.length) && !lines.some(line => opens.test(line) || guideLine.test(line))
}
export const isPlainTitle = (title: string): boolean => /^[^\n\r\u2028\u2029]+$/.test(title) && title === title.trim()

export function layOut(file: string): { laid: LaidOut, faults: LabFileFault[] } {
  const lines = file.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n').split('\n')
  const laid: LaidOut = { head: { line: 2, source: '' }, text: '', steps: [], readings: null, guide: '' }
  const end = lines.findIndex((line, at) => at > 0 && /^---\s*$/.test(line))
  if (!/^---\s*$/.test(lines[0] ?? '')) return { laid, faults: [{ line: 1, message: 'A lab’s text begins with its settings, between two lines of three dashes.' }] }
  if (end < 0) return { laid, faults: [{ line: 1, message: 'The settings at the head do not end: a line of three dashes is missing.' }] }
  laid.head.source = linesOf(lines, 1, end)

  const { blocks, faults } = findBlocks(lines, end + 1)
  const afterBlocks = (blocks.at(-1)?.close ?? end) + 1
  const guideAt = lines.findIndex((line, at) => at >= afterBlocks && guideLine.test(line))
  const stop = guideAt < 0 ? lines.length : guideAt
  if (guideAt >= 0) laid.guide = between(lines, guideAt + 1, lines.length)
  laid.text = between(lines, end + 1, blocks[0]?.begins ?? stop)
  blocks.forEach((block, at) => {
    const settings = { line: block.open + 2, source: linesOf(lines, block.open + 1, block.close) }
    if (block.kind === 'readings') {
      if (laid.readings) faults.push({ line: block.open + 1, message: 'A lab has one block of readings for the practice.' })
      laid.readings = settings
      return
    }
    laid.steps.push({ titleLine: block.begins + 1, title: /^## (.*)$/.exec(lines[block.begins] ?? '')?.[1]?.trim() ?? '', settings, text: between(lines, block.close + 1, blocks[at + 1]?.begins ?? stop) })
  })
  return { laid, faults }
}

interface Found { kind: string, /** Lines counted from 0: the heading, the opening and the closing. */ begins: number, open: number, close: number }

function findBlocks(lines: readonly string[], from: number): { blocks: Found[], faults: LabFileFault[] } {
  const blocks: Found[] = []
  const faults: LabFileFault[] = []
  for (let at = from; at < lines.length; at++) {
    const kind = opens.exec(lines[at] ?? '')?.[1]
    if (kind === undefined) continue
    const close = lines.findIndex((line, no) => no > at && closes.test(line))
    if (close < 0) {
      faults.push({ line: at + 1, message: 'This block does not end: a line of three backticks is missing.' })
      break
    }
    let begins = at - 1
    while (begins >= from && (lines[begins] ?? '').trim() === '') begins--
    if (!/^## /.test(lines[begins] ?? '')) {
      faults.push({ line: at + 1, message: 'A block stands under its title, a line that begins with “## ”.' })
      begins = at
    }
    blocks.push({ kind, begins, open: at, close })
    at = close
  }
  return { blocks, faults }
}
