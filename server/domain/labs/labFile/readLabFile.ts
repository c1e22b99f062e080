import { labBody, type LabBody } from '#shared/schemas/lab'
import { labStep, type StepKind } from '#shared/schemas/steps'
import type { LabFileFault } from './fault'
import { layOut, type LaidOut } from './layout'
import { readReadings } from './readingsTable'
import { readYaml } from './readYaml'
import { headFields } from './spelledHead'
import { stepFields } from './spelledStep'
import { filePath, isRecord, readFields, type Field, type NamedFault } from './spelling'

/** More than any lab needs; a longer text is refused before it is looked at. */
export const longestLabFile = 1_500_000
const mostFaults = 40

export type ReadLabFile = { body: LabBody, faults: [] } | { body: null, faults: LabFileFault[] }

/** Makes a lab of its text, or says what is wrong in it, each fault with its line. Nothing in the text is run, fetched or expanded. */
export function readLabFile(file: string): ReadLabFile {
  if (file.length > longestLabFile) return { body: null, faults: [{ line: 1, message: 'This text is longer than any lab can be.' }] }
  const { laid, faults } = layOut(file)
  if (faults.length > 0) return refused(faults)
  const head = readHead(laid)
  const steps = laid.steps.map(readStep)
  const found = [...head.faults, ...steps.flatMap(step => step.faults)]
  if (found.length > 0) return refused(found)
  const read = labBody.safeParse({ ...head.raw, steps: steps.map(step => step.raw) })
  if (read.success) return { body: read.data, faults: [] }
  return refused(read.error.issues.map((issue) => {
    const [part, at, ...inside] = issue.path
    const step = part === 'steps' ? steps[Number(at)] : undefined
    return { line: step ? step.lineOf(inside) : head.lineOf(issue.path), message: wordsOf(issue, step ? '' : String(part ?? '')) }
  }))
}

function refused(faults: LabFileFault[]): ReadLabFile {
  return { body: null, faults: [...new Map(faults.map(fault => [`${fault.line} ${fault.message}`, fault])).values()].sort((a, b) => a.line - b.line).slice(0, mostFaults) }
}

interface Part { raw: Record<string, unknown>, lineOf: (bodyPath: readonly PropertyKey[]) => number, faults: LabFileFault[] }

function readPart(source: { line: number, source: string }, fieldsOf: (value: unknown) => readonly Field[]): Part {
  const yaml = readYaml(source.source, source.line)
  const fields = fieldsOf(yaml.value)
  const named: NamedFault[] = []
  const raw = readFields(fields, yaml.faults.length > 0 ? {} : yaml.value, [], named)
  return {
    raw: isRecord(raw) ? raw : {}, lineOf: path => yaml.lineOf(filePath(fields, path)),
    faults: [...yaml.faults, ...named.map(fault => ({ line: yaml.lineOf(fault.path), message: fault.message }))],
  }
}

function readHead(laid: LaidOut): Part {
  const part = readPart(laid.head, () => headFields)
  const open = (name: 'text' | 'guide') => {
    if (part.raw[name] === undefined) part.raw[name] = laid[name]
    else if (laid[name] !== '') part.faults.push({ line: part.lineOf([name]), message: `The ${name} stands twice: here and below.` })
  }
  open('text')
  open('guide')
  if (laid.readings) {
    const { table, faults } = readReadings(laid.readings)
    part.faults.push(...faults)
    if (isRecord(part.raw.practice)) part.raw.practice = { ...part.raw.practice, ...table }
    else part.faults.push({ line: laid.readings.line - 1, message: 'There are readings for a practice, and the head does not say of which leg and layer: “practice: { leg: up, layer: 0 to 80 m }”.' })
  }
  return part
}

const isKind = (kind: unknown): kind is StepKind => typeof kind === 'string' && Object.hasOwn(stepFields, kind)

function readStep(step: LaidOut['steps'][number]): Part {
  const part = readPart(step.settings, value => stepFields[isRecord(value) && isKind(value.kind) ? value.kind : 'number'])
  if (part.faults.length > 0) return part
  part.raw = { ...part.raw, title: part.raw.title ?? step.title, text: part.raw.text ?? step.text }
  const lineOf = (path: readonly PropertyKey[]) => path[0] === 'title' ? step.titleLine : part.lineOf(path)
  const read = labStep.safeParse(part.raw)
  return { raw: part.raw, lineOf, faults: read.success ? [] : read.error.issues.map(issue => ({ line: lineOf(issue.path), message: wordsOf(issue, String(filePath(fieldsOfRaw(part.raw), issue.path).join(', '))) })) }
}

const fieldsOfRaw = (raw: Record<string, unknown>): readonly Field[] => stepFields[isKind(raw.kind) ? raw.kind : 'number']

function wordsOf(issue: { code?: string, message: string, input?: unknown }, name: string): string {
  const where = name === '' ? '' : `${name}: `
  if (issue.code === 'invalid_type' && issue.message.endsWith('received undefined')) return `${where}this is missing.`
  return `${where}${issue.message}`
}
