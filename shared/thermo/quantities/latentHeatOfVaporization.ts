import { constant } from '../constants'
import { vaporizationForms } from '../latentHeat'
import { latentHeatDefinition } from '../latentHeatDefinition'
import { constantSlip, slip, zeroCelsius } from '../slips'

/** Latent heat of vaporization. Formulae, sources and ranges: `latentHeat.ts`. */
export const latentHeatOfVaporizationDefinition = latentHeatDefinition({
  key: 'latent-heat-of-vaporization',
  name: 'latent heat of vaporization',
  symbol: 'L_v',
  range: [200, 375],
  forms: vaporizationForms,
  ask: 'The latent heat of vaporization of water at the temperature, per kilogram.',
  slips: [
    // beside the constants that are taught it is never half the way off
    constantSlip('sign', 'sign of the slope turned round', 'The latent heat of vaporization falls as the temperature rises: here it rises.', (inputs) => {
      const t = Number(inputs.temperature) - zeroCelsius
      return t === 0 ? null : 2.501e6 + 2370 * t
    }),
    slip('kelvin-for-celsius', 'kelvin put in for Celsius', 'This is what comes out with the temperature in kelvin: the linear law takes °C.', inputs => 2.501e6 - 2370 * Number(inputs.temperature)),
    slip('sublimation', 'latent heat of sublimation', 'This is the latent heat of sublimation, from ice to vapor.', (_i, constants) => constant(constants, 'latentHeatIce')),
  ],
  example: { inputs: { temperature: 293.15 }, gives: 2_453_600, within: 1 },
})
