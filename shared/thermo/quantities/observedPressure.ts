import { observedQuantity } from '../observedQuantity'
import { slip } from '../slips'

/** A student's own reading of pressure at the barometer: see `observedQuantity`. */
export const observedPressureDefinition = observedQuantity({
  key: 'observed-pressure', measured: 'pressure', symbol: 'p', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', range: [30_000, 110_000],
  shown: si => si / 100,
  slips: [
    slip('millimeters-of-mercury', 'mmHg given as hPa', 'Your number fits the scale in millimeters of mercury; the unit beside it says hPa.', (_i, _c, right) => right / 1.333224),
    slip('inches-of-mercury', 'inHg given as hPa', 'Your number fits the scale in inches of mercury; the unit beside it says hPa.', (_i, _c, right) => right / 33.86389),
  ],
  example: 98_000,
})
