import { standardAtmosphereQuantity } from '../standardAtmosphereQuantity'

/** Density of the standard atmosphere. Formula, source and range: `standardAtmosphere.ts`. */
export const standardAtmosphereDensityDefinition = standardAtmosphereQuantity({
  key: 'standard-atmosphere-density',
  name: 'density of the standard atmosphere',
  symbol: 'ρ',
  of: 'density',
  by: 'geopotential',
  ask: 'The density ρ of the standard atmosphere at the geopotential height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.',
  example: { inputs: { geopotentialHeight: 5000 }, gives: 0.736116, within: 0.000001 },
})
