import { inversionDefinition, ofInversion } from '../inversionDefinition'
import { fineSlip } from '../slips'

/** Height of the base of the lowest inversion: see `lowestInversion`. */
export const inversionBaseDefinition = inversionDefinition({
  key: 'inversion-base', name: 'height of an inversion’s base', symbol: 'z_b', unit: 'm', asked: 'The height of the base of the inversion', formula: 'z_b = z_1',
  of: inversion => inversion.base,
  slips: [
    fineSlip('top-for-base', 'top in place of the base', 'This is the top of the inversion: its base is where temperature begins to rise.', ofInversion(inversion => inversion.top)),
    fineSlip('middle', 'middle of the inversion', 'This is the middle of the inversion.', ofInversion(inversion => (inversion.base + inversion.top) / 2)),
  ],
  gives: 100,
})
