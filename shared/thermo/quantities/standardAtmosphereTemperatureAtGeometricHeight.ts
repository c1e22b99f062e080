import { standardAtmosphereQuantity } from '../standardAtmosphereQuantity'

/** Temperature of the standard atmosphere at a geometric height. Formula, source and range: `standardAtmosphere.ts`. */
export const standardAtmosphereTemperatureAtGeometricHeightDefinition = standardAtmosphereQuantity({
  key: 'standard-atmosphere-temperature-at-geometric-height',
  name: 'temperature of the standard atmosphere at a geometric height',
  symbol: 'T',
  of: 'temperature',
  by: 'geometric',
  ask: 'The temperature T of the standard atmosphere at the geometric height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.',
  example: { inputs: { geometricHeight: 5000 }, gives: 255.6755, within: 0.0001 },
})
