import { standardAtmosphereQuantity } from '../standardAtmosphereQuantity'

/** Pressure of the standard atmosphere. Formula, source and range: `standardAtmosphere.ts`. */
export const standardAtmospherePressureDefinition = standardAtmosphereQuantity({
  key: 'standard-atmosphere-pressure',
  name: 'pressure of the standard atmosphere',
  symbol: 'p',
  of: 'pressure',
  by: 'geopotential',
  ask: 'The pressure p of the standard atmosphere at the geopotential height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.',
  example: { inputs: { geopotentialHeight: 5000 }, gives: 54019.89, within: 0.05 },
})
