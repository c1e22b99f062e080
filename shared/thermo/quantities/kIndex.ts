import { indexDefinition, ofLevels } from '../indexDefinition'
import { fineSlip, slip, zeroCelsius } from '../slips'
import { kIndex } from '../stabilityIndices'
import { texQuantity } from '../tex'

/** K index: see `kIndex`. Printed in °C. */
export const kIndexDefinition = indexDefinition({
  key: 'k-index', name: 'K index', symbol: 'K', kind: 'temperature', shownUnit: 'Cel',
  source: 'AMS Glossary of Meteorology, "K index"', isAscent: false,
  ask: 'The K index, T at 850 less T at 500 hPa, plus the dewpoint at 850, less the dewpoint depression at 700 hPa, in °C.',
  of: kIndex,
  steps: (_levels, value) => [{ text: 'K index', formula: 'K = T_{850} - T_{500} + T_{d,850} - (T_{700} - T_{d,700})', filled: `K = ${texQuantity(value - zeroCelsius, 'Cel', 4)}`, value, unit: 'K' }],
  slips: [
    slip('depression-added', 'dewpoint depression added', 'The dewpoint depression at 700 hPa is added: it has to be taken off.', ofLevels(({ t850, d850, t700, d700, t500 }) => t850 - t500 + d850 + (t700 - d700))),
    slip('depression-left-out', 'dewpoint depression left out', 'The dewpoint depression at 700 hPa is left out.', ofLevels(({ t850, d850, t500 }) => t850 - t500 + d850)),
    slip('dewpoint-left-out', 'dewpoint at 850 hPa left out', 'The dewpoint at 850 hPa is left out.', ofLevels(({ t850, t700, d700, t500 }) => t850 - t500 - (t700 - d700) + zeroCelsius)),
    slip('dewpoint-for-depression', 'dewpoint for its depression', 'This takes off the dewpoint at 700 hPa: its depression below T is needed.', ofLevels(({ t850, d850, d700, t500 }) => t850 - t500 + d850 - (d700 - zeroCelsius))),
    fineSlip('total-totals', 'total totals in place of it', 'This is the total totals index.', ofLevels(({ t850, d850, t500 }) => t850 + d850 - 2 * t500 + zeroCelsius)),
  ],
  gives: 299.65, within: 0.0003,
})
