import type { InputDefinition, NumberKind, QuantityDefinition, Slip } from './definition'
import { numberOf } from './inputs'
import { oneFormula } from './oneFormula'
import { texQuantity } from './tex'

/** What a student reads on an instrument of their own, beside the station's value at the same time and place. */
export interface Observed {
  key: string
  /** "air temperature" */
  measured: string
  symbol: string
  unit: string
  shownUnit: string
  kind: NumberKind
  range: readonly [number, number]
  nearZero?: number
  /** For the trace: the value in `shownUnit`. */
  shown: (si: number) => number
  slips: readonly Slip[]
  example: number
}

/**
 * A student's own reading. What it is compared with is the station's value; by how much the two may differ is the sum of both instruments'
 * accuracies, which the author states. Later steps go on from what the student read.
 *
 * Source: WMO-No. 8, vol. I, ch. 1 (comparison within stated uncertainties), as common practice.
 */
export function observedQuantity({ key, measured, symbol, unit, shownUnit, kind, range, nearZero, shown, slips, example }: Observed): QuantityDefinition {
  const input: InputDefinition = { name: 'station', label: `${measured} by the station`, symbol, unit, shownUnit, kind, shape: 'number', range }
  return oneFormula({
    key, name: `own reading of the ${measured}`, symbol, unit, shownUnit, kind, ...(nearZero === undefined ? {} : { nearZero }),
    inputs: [input],
    constants: [],
    formula: {
      key: 'beside-the-station', label: 'compared with the station',
      source: { text: 'WMO-No. 8, vol. I, ch. 1: two instruments compared within their stated uncertainties', status: 'common practice' },
      validity: 'read at the station, at the time that is asked', knownError: 'the accuracies of both instruments, which the lab states',
    },
    value: inputs => numberOf(inputs, 'station'),
    ask: `Your own reading of the ${measured}, on the instrument you were given, at the place and time stated.`,
    working: (_inputs, _constants, value) => [{ text: 'The station read', formula: symbol, filled: `${symbol} = ${texQuantity(shown(value), shownUnit)}`, value, unit }],
    slips,
    example: { inputs: { station: example }, gives: example, within: 0 },
  })
}
