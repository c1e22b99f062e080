import { observedQuantity } from '../observedQuantity'
import { slip } from '../slips'

/** A student's own reading of wind speed with a hand-held anemometer: see `observedQuantity`. */
export const observedWindSpeedDefinition = observedQuantity({
  key: 'observed-wind-speed', measured: 'wind speed', symbol: 'V', unit: 'm/s', shownUnit: 'm/s', kind: 'ratio', range: [0, 75], nearZero: 0.5,
  shown: si => si,
  slips: [
    slip('knots', 'knots given as m/s', 'Your number fits the scale in knots; the unit beside it says meters per second.', (_i, _c, right) => right / 0.514444),
    slip('kilometers-per-hour', 'km/h given as m/s', 'Your number fits the scale in kilometers per hour; the unit beside it says meters per second.', (_i, _c, right) => right * 3.6),
  ],
  example: 4.2,
})
