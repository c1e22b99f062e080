import { inversionDefinition, ofInversion } from '../inversionDefinition'
import { fineSlip, signSlip } from '../slips'

/** Strength of the lowest inversion, T(top) − T(base) > 0: see `lowestInversion`. */
export const inversionStrengthDefinition = inversionDefinition({
  key: 'inversion-strength', name: 'strength of an inversion', symbol: 'ΔT', unit: 'K', nearZero: 0.1, asked: 'The strength of the inversion, T at its top less T at its base', formula: '\\Delta T = T_2 - T_1',
  of: inversion => inversion.topTemperature - inversion.baseTemperature,
  slips: [
    signSlip('The strength is T at the top less T at the base: positive in an inversion.'),
    fineSlip('per-100-m', 'K per 100 m in place of K', 'This is the rise per 100 m: the strength is the whole rise.', ofInversion(inversion => (inversion.topTemperature - inversion.baseTemperature) / (inversion.top - inversion.base) * 100)),
    fineSlip('per-kilometer', 'K per km in place of K', 'This is the rise per kilometer: the strength is the whole rise.', ofInversion(inversion => (inversion.topTemperature - inversion.baseTemperature) / (inversion.top - inversion.base) * 1000)),
  ],
  gives: 3,
})
