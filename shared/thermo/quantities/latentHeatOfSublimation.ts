import { constant } from '../constants'
import { sublimationForms } from '../latentHeat'
import { latentHeatDefinition } from '../latentHeatDefinition'
import { slip } from '../slips'

/** Latent heat of sublimation. Formulae, sources and ranges: `latentHeat.ts`. */
export const latentHeatOfSublimationDefinition = latentHeatDefinition({
  key: 'latent-heat-of-sublimation',
  name: 'latent heat of sublimation',
  symbol: 'L_s',
  range: [150, 273.16],
  forms: sublimationForms,
  ask: 'The latent heat of sublimation of ice at the temperature, per kilogram.',
  slips: [
    slip('vaporization', 'latent heat of vaporization', 'This is the latent heat of vaporization, from liquid water to vapor.', (_i, constants) => constant(constants, 'latentHeat')),
  ],
  example: { inputs: { temperature: 263.15 }, gives: 2_834_000, within: 1 },
})
