import type { StepKind } from '#shared/schemas/steps'
import { asked, fitPart, inputs, points } from './spelledParts'
import type { Field } from './spelling'

const named: readonly Field[] = [{ file: 'key', body: 'key' }, { file: 'kind', body: 'kind' }]
/** Only where a title or a text cannot stand in the open; see `plainText`. */
const hidden: readonly Field[] = [{ file: 'title', body: 'title' }, { file: 'text', body: 'text' }]

/** The settings of a step in its text file, by kind. */
export const stepFields: Readonly<Record<StepKind, readonly Field[]>> = {
  number: [...named, ...hidden, ...asked],
  diagram: [...named, ...hidden, ...asked, { file: 'read-off', body: 'divisions', inside: { of: 'record', fields: [{ file: 'division', body: 'division' }, { file: 'in', body: 'unit' }] } }],
  reading: [...named, ...hidden, ...asked, { file: 'accuracy', body: 'accuracy', inside: { of: 'one', fields: [{ file: 'station', body: 'station' }, { file: 'own', body: 'own' }] } }],
  fit: [...named, ...hidden, inputs, {
    file: 'asks-for', body: 'parts', inside: {
      of: 'one', fields: [
        { file: 'slope', body: 'slope', inside: { of: 'one', fields: fitPart } },
        { file: 'intercept', body: 'intercept', usual: null, inside: { of: 'one', fields: fitPart } },
        { file: 'error', body: 'error', usual: null, inside: { of: 'one', fields: fitPart } },
      ],
    },
  }],
  table: [...named, ...hidden, { file: 'rows', body: 'rows' }, { file: 'columns', body: 'columns', inside: { of: 'list', fields: [{ file: 'key', body: 'key' }, { file: 'title', body: 'title' }, ...asked] } }],
  choice: [...named, ...hidden, points, { file: 'several', body: 'isSeveral', usual: false }, {
    file: 'options', body: 'options', inside: { of: 'list', fields: [{ file: 'key', body: 'key' }, { file: 'text', body: 'text' }, { file: 'right', body: 'isRight', usual: false }, { file: 'why', body: 'why', usual: '' }] },
  }],
}
