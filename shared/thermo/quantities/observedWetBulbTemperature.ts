import { observedQuantity } from '../observedQuantity'
import { slip, zeroCelsius } from '../slips'

/** A student's own reading of a ventilated wet bulb: see `observedQuantity`. */
export const observedWetBulbTemperatureDefinition = observedQuantity({
  key: 'observed-wet-bulb-temperature', measured: 'wet-bulb temperature', symbol: 'T_w', unit: 'K', shownUnit: 'Cel', kind: 'temperature', range: [200, 335],
  shown: si => si - zeroCelsius,
  slips: [slip('fahrenheit', '°F given as °C', 'Your number fits the scale in degrees Fahrenheit; the unit beside it says Celsius.', (_i, _c, right) => (right - zeroCelsius) * 1.8 + 32 + zeroCelsius)],
  example: 288.15,
})
