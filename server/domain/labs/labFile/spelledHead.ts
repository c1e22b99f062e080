import { layer, layers, shares } from './spelledParts'
import { isRecord, type Field, type Spelling } from './spelling'

const legLayer: Spelling = {
  write: value => isRecord(value) ? { leg: value.leg, layer: layer.write({ lowM: value.lowM, highM: value.highM }) } : value,
  read(value) {
    if (!isRecord(value)) return value
    const { layer: words, ...rest } = value
    const read = layer.read(words)
    return isRecord(read) ? { ...rest, ...read } : value
  },
}

/** What stands at the head of a lab's text file. */
export const headFields: readonly Field[] = [
  { file: 'title', body: 'title' }, { file: 'kind', body: 'kind', usual: null }, { file: 'minutes', body: 'minutes', usual: null },
  { file: 'aims', body: 'aims', usual: [] }, { file: 'outcomes', body: 'outcomes', usual: [] },
  {
    file: 'drawn-from', body: 'conditions', usual: null, inside: {
      of: 'one', fields: [
        { file: 'leg', body: 'leg' }, { file: 'layers', body: 'layers', as: layers }, { file: 'rows', body: 'rows', usual: 5 },
        { file: 'changes', body: 'changes', usual: [], inside: { of: 'list', fields: [{ file: 'column', body: 'column' }, { file: 'least', body: 'least' }, { file: 'most', body: 'most' }] } },
        { file: 'at-most', body: 'atMost', usual: 24 },
      ],
    },
  },
  { file: 'shares', body: 'supply', usual: [], as: shares },
  { file: 'practice', body: 'practice', usual: null, as: legLayer },
  {
    file: 'field-plan', body: 'fieldPlan', usual: null, inside: {
      of: 'one', fields: [
        { file: 'in-charge', body: 'inCharge' },
        { file: 'hazards', body: 'hazards', inside: { of: 'list', fields: [{ file: 'hazard', body: 'hazard' }, { file: 'caution', body: 'caution' }] } },
        { file: 'go-no-go', body: 'checks', inside: { of: 'list', fields: [{ file: 'item', body: 'item' }, { file: 'set-by', body: 'setBy' }, { file: 'limit', body: 'limit', usual: '' }] } },
      ],
    },
  },
  // only where they cannot stand in the open
  { file: 'text', body: 'text' }, { file: 'guide', body: 'guide' },
]
