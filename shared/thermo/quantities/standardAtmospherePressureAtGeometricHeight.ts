import { standardAtmosphereQuantity } from '../standardAtmosphereQuantity'

/** Pressure of the standard atmosphere at a geometric height. Formula, source and range: `standardAtmosphere.ts`. */
export const standardAtmospherePressureAtGeometricHeightDefinition = standardAtmosphereQuantity({
  key: 'standard-atmosphere-pressure-at-geometric-height',
  name: 'pressure of the standard atmosphere at a geometric height',
  symbol: 'p',
  of: 'pressure',
  by: 'geometric',
  ask: 'The pressure p of the standard atmosphere at the geometric height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.',
  example: { inputs: { geometricHeight: 5000 }, gives: 54048.26, within: 0.05 },
})
