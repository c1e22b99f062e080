import { standardAtmosphereQuantity } from '../standardAtmosphereQuantity'

/** Temperature of the standard atmosphere. Formula, source and range: `standardAtmosphere.ts`. */
export const standardAtmosphereTemperatureDefinition = standardAtmosphereQuantity({
  key: 'standard-atmosphere-temperature',
  name: 'temperature of the standard atmosphere',
  symbol: 'T',
  of: 'temperature',
  by: 'geopotential',
  ask: 'The temperature T of the standard atmosphere at the geopotential height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.',
  example: { inputs: { geopotentialHeight: 5000 }, gives: 255.6500, within: 0.0001 },
})
