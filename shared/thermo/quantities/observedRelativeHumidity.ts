import { observedQuantity } from '../observedQuantity'
import { slip } from '../slips'

/** A student's own reading of relative humidity over water: see `observedQuantity`. */
export const observedRelativeHumidityDefinition = observedQuantity({
  key: 'observed-relative-humidity', measured: 'relative humidity', symbol: 'U', unit: '1', shownUnit: '%', kind: 'fraction', range: [0, 1.1], nearZero: 0.05,
  shown: si => si * 100,
  slips: [slip('dryness', '100 % less the reading', 'This is what is missing to 100 %.', (_i, _c, right) => 1 - right)],
  example: 0.65,
})
