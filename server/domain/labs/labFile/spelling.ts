/**
 * How a part of a lab is spelled in its text file: the same settings as in the revision, under names that read well, and with what goes without
 * saying left out. One table serves for writing, for reading and for finding the line of what is wrong.
 */
export interface Field {
  /** Its name in the file, and in the revision. */
  file: string
  body: string
  /** What it is where it is left out; it is not written where it is that. */
  usual?: unknown
  as?: Spelling
  /** Settings inside it: of one thing, of each of a list, or of each of a record. */
  inside?: { of: 'one' | 'list' | 'record', fields: readonly Field[] }
}
export interface Spelling { write: (value: unknown) => unknown, read: (value: unknown) => unknown }

export const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null && !Array.isArray(value)
export const isSame = (a: unknown, b: unknown): boolean => JSON.stringify(a) === JSON.stringify(b)

export function writeFields(fields: readonly Field[], body: Readonly<Record<string, unknown>>): Record<string, unknown> {
  return Object.fromEntries(fields.flatMap((field) => {
    const value = body[field.body]
    if (value === undefined || ('usual' in field && isSame(value, field.usual))) return []
    return [[field.file, writeValue(field, value)]]
  }))
}

function writeValue({ as, inside }: Field, value: unknown): unknown {
  if (as) return as.write(value)
  if (!inside) return value
  const one = (part: unknown) => isRecord(part) ? writeFields(inside.fields, part) : part
  if (inside.of === 'one') return one(value)
  if (inside.of === 'list') return Array.isArray(value) ? value.map(one) : value
  return isRecord(value) ? Object.fromEntries(Object.entries(value).map(([name, part]) => [name, one(part)])) : value
}

export interface NamedFault { path: readonly PropertyKey[], message: string }

/** From the file's names to the revision's; the schema judges what comes out. A name that means nothing is told. */
export function readFields(fields: readonly Field[], file: unknown, path: readonly PropertyKey[], faults: NamedFault[]): unknown {
  if (!isRecord(file)) {
    faults.push({ path, message: 'Settings are expected here, each as “name: value”.' })
    return {}
  }
  for (const name of Object.keys(file)) {
    if (!fields.some(field => field.file === name)) faults.push({ path: [...path, name], message: `There is no setting “${name}” here. There are: ${fields.map(field => field.file).join(', ')}.` })
  }
  return Object.fromEntries(fields.flatMap((field) => {
    const value = file[field.file]
    if (value === undefined || value === null) return 'usual' in field ? [[field.body, field.usual]] : []
    return [[field.body, readValue(field, value, [...path, field.file], faults)]]
  }))
}

function readValue({ as, inside }: Field, value: unknown, path: readonly PropertyKey[], faults: NamedFault[]): unknown {
  if (as) return as.read(value)
  if (!inside) return value
  if (inside.of === 'one') return readFields(inside.fields, value, path, faults)
  if (inside.of === 'list') return Array.isArray(value) ? value.map((part, at) => readFields(inside.fields, part, [...path, at], faults)) : value
  return isRecord(value) ? Object.fromEntries(Object.entries(value).map(([name, part]) => [name, readFields(inside.fields, part, [...path, name], faults)])) : value
}

/** Where a place of the revision stands in the file. */
export function filePath(fields: readonly Field[], path: readonly PropertyKey[]): PropertyKey[] {
  const [head, ...rest] = path
  const field = fields.find(each => each.body === head)
  if (!field) return []
  if (!field.inside) return [field.file, ...rest]
  if (field.inside.of === 'one') return [field.file, ...filePath(field.inside.fields, rest)]
  const [at, ...deeper] = rest
  return at === undefined ? [field.file] : [field.file, at, ...filePath(field.inside.fields, deeper)]
}

/** Marks are thousandths in the revision and marks in the file. */
export const marks: Spelling = {
  write: value => typeof value === 'number' ? value / 1000 : value,
  read(value) {
    if (typeof value !== 'number') return value
    const milli = Math.round(value * 1000)
    return Math.abs(milli - value * 1000) < 1e-6 ? milli : value * 1000
  },
}

/** A width in the unit asked is a number; a relative one says that it is. */
export const granted: Spelling = {
  write: value => isRecord(value) && isSame(Object.keys(value), ['absolute']) ? value.absolute : value,
  read: value => typeof value === 'number' ? { absolute: value } : value,
}

/** A spelling that falls back on the revision's own form wherever its words would not be read back the same. */
export function inWords(say: (value: unknown) => string | null, understand: (words: string) => unknown): Spelling {
  return {
    write(value) {
      const words = say(value)
      return words !== null && isSame(understand(words), value) ? words : value
    },
    read: value => typeof value === 'string' ? understand(value) ?? value : value,
  }
}
