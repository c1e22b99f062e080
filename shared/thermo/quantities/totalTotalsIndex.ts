import { indexDefinition, ofLevels } from '../indexDefinition'
import { fineSlip, slip, zeroCelsius } from '../slips'
import { kIndex, totalTotals } from '../stabilityIndices'
import { texQuantity } from '../tex'

/** Total totals index: see `totalTotals`. */
export const totalTotalsIndexDefinition = indexDefinition({
  key: 'total-totals-index', name: 'total totals index', symbol: 'TT', kind: 'difference', shownUnit: 'K', nearZero: 1,
  source: 'AMS Glossary of Meteorology, "total totals index"', isAscent: false,
  ask: 'The total totals index, T and dewpoint at 850 hPa less twice T at 500 hPa.',
  of: totalTotals,
  steps: (_levels, value) => [{ text: 'Total totals', formula: 'TT = T_{850} + T_{d,850} - 2\\,T_{500}', filled: `TT = ${texQuantity(value, 'K', 4)}`, value, unit: 'K' }],
  slips: [
    slip('vertical-totals', 'vertical totals alone', 'These are the vertical totals, T at 850 less T at 500 hPa: the cross totals have to be added.', ofLevels(({ t850, t500 }) => t850 - t500)),
    slip('cross-totals', 'cross totals alone', 'These are the cross totals, dewpoint at 850 less T at 500 hPa: the vertical totals have to be added.', ofLevels(({ d850, t500 }) => d850 - t500)),
    slip('once-for-twice', 'T at 500 hPa taken off once', 'T at 500 hPa is taken off once: it has to be taken off twice.', ofLevels(({ t850, d850, t500 }) => t850 + d850 - t500 - zeroCelsius)),
    slip('sign-at-500', 'T at 500 hPa added', 'Twice T at 500 hPa is added: it has to be taken off.', ofLevels(({ t850, d850, t500 }) => t850 + d850 + 2 * t500 - 4 * zeroCelsius)),
    fineSlip('k-index', 'K index in place of it', 'This is the K index.', ofLevels(levels => kIndex(levels) - zeroCelsius)),
  ],
  gives: 48.5, within: 5e-05,
})
