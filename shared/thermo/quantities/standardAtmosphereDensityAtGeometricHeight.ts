import { standardAtmosphereQuantity } from '../standardAtmosphereQuantity'

/** Density of the standard atmosphere at a geometric height. Formula, source and range: `standardAtmosphere.ts`. */
export const standardAtmosphereDensityAtGeometricHeightDefinition = standardAtmosphereQuantity({
  key: 'standard-atmosphere-density-at-geometric-height',
  name: 'density of the standard atmosphere at a geometric height',
  symbol: 'ρ',
  of: 'density',
  by: 'geometric',
  ask: 'The density ρ of the standard atmosphere at the geometric height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.',
  example: { inputs: { geometricHeight: 5000 }, gives: 0.736429, within: 0.000001 },
})
