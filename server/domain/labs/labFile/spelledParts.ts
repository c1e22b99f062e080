import { inputSource } from '#shared/schemas/steps'
import { supplyItem } from '#shared/schemas/lab'
import { granted, inWords, isRecord, marks, type Field, type Spelling } from './spelling'

const number = '-?\\d+(?:\\.\\d+)?(?:e[+-]?\\d+)?'
const reads: Readonly<Record<string, string>> = { layer: 'layer', lowest: 'lowest', highest: 'highest', mean: 'mean', row: 'row' }

/** "layer of height", "mean of pressure", "low bound", "100 m", "constant g", "step dry-rate". */
export const source: Spelling = inWords(
  (value) => {
    const read = inputSource.safeParse(value)
    if (!read.success) return null
    switch (read.data.from) {
      case 'step': return `step ${read.data.key}`
      case 'constant': return `constant ${read.data.name}`
      case 'text': return `${read.data.value} ${read.data.unit}`
      case 'share': return read.data.row ? null : read.data.read === 'lowBound' ? 'low bound' : read.data.read === 'highBound' ? 'high bound' : `${read.data.read} of ${read.data.column}`
    }
  },
  (words) => {
    const bound = /^(low|high) bound$/.exec(words)
    if (bound) return { from: 'share', column: 'height', read: `${bound[1]}Bound` }
    const share = /^(\S+) of (.+)$/s.exec(words)
    if (share && reads[share[1] ?? '']) return { from: 'share', column: share[2], read: share[1] }
    const named = /^(step|constant) (.+)$/s.exec(words)
    if (named) return named[1] === 'step' ? { from: 'step', key: named[2] } : { from: 'constant', name: named[2] }
    const stated = new RegExp(`^(${number}) (.*)$`, 's').exec(words)
    return stated ? { from: 'text', value: Number(stated[1]), unit: stated[2] } : null
  },
)

/** "0 to 80 m". */
export const layer: Spelling = inWords(
  value => isRecord(value) ? `${String(value.lowM)} to ${String(value.highM)} m` : null,
  (words) => {
    const found = new RegExp(`^(${number}) to (${number}) m$`).exec(words)
    return found ? { lowM: Number(found[1]), highM: Number(found[2]) } : null
  },
)
export const layers: Spelling = {
  write: value => Array.isArray(value) ? value.map(layer.write) : value,
  read: value => Array.isArray(value) ? value.map(layer.read) : value,
}

/** "up, 0 to 80 m of VERSION". */
export const shares: Spelling = {
  write: value => Array.isArray(value) ? value.map(share.write) : value,
  read: value => Array.isArray(value) ? value.map(share.read) : value,
}
const share = inWords(
  (value) => {
    const item = supplyItem.safeParse(value)
    return item.success ? `${item.data.leg}, ${item.data.lowM} to ${item.data.highM} m of ${item.data.versionId}` : null
  },
  (words) => {
    const found = new RegExp(`^(\\w+), (${number}) to (${number}) m of (.+)$`, 's').exec(words)
    return found ? { versionId: found[4], leg: found[1], lowM: Number(found[2]), highM: Number(found[3]) } : null
  },
)

/** Each input by its name. */
const sources: Spelling = {
  write: value => isRecord(value) ? Object.fromEntries(Object.entries(value).map(([name, each]) => [name, source.write(each)])) : value,
  read: value => isRecord(value) ? Object.fromEntries(Object.entries(value).map(([name, each]) => [name, source.read(each)])) : value,
}

export const inputs: Field = { file: 'from', body: 'inputs', as: sources }
export const points: Field = { file: 'marks', body: 'pointsMilli', as: marks }
const width: Field[] = [{ file: 'digits', body: 'digits' }, { file: 'granted', body: 'granted', as: granted, usual: {} }, { file: 'slip-marks', body: 'slipMilli', as: marks, usual: 0 }]

/** A number that is asked by a quantity of the reference. */
export const asked: readonly Field[] = [
  { file: 'asks', body: 'quantity' }, { file: 'formula', body: 'variant', usual: null }, { file: 'in', body: 'unit' }, points, ...width,
  { file: 'digits-marks', body: 'digitsMilli', as: marks, usual: 0 },
  { file: 'near', body: 'near', usual: null, inside: { of: 'one', fields: [{ file: 'widths', body: 'widths' }, { file: 'marks', body: 'milli', as: marks }] } },
  inputs,
]
export const fitPart: readonly Field[] = [points, ...width]
