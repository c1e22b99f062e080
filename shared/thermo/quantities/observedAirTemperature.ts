import { observedQuantity } from '../observedQuantity'
import { slip, zeroCelsius } from '../slips'

/** A student's own reading of air temperature: see `observedQuantity`. */
export const observedAirTemperatureDefinition = observedQuantity({
  key: 'observed-air-temperature', measured: 'air temperature', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', range: [200, 335],
  shown: si => si - zeroCelsius,
  slips: [slip('fahrenheit', '°F given as °C', 'Your number fits the scale in degrees Fahrenheit; the unit beside it says Celsius.', (_i, _c, right) => (right - zeroCelsius) * 1.8 + 32 + zeroCelsius)],
  example: 293.15,
})
