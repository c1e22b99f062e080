import { inversionDefinition, ofInversion } from '../inversionDefinition'
import { fineSlip } from '../slips'

/** Height of the top of the lowest inversion: see `lowestInversion`. */
export const inversionTopDefinition = inversionDefinition({
  key: 'inversion-top', name: 'height of an inversion’s top', symbol: 'z_t', unit: 'm', asked: 'The height of the top of the inversion', formula: 'z_t = z_2',
  of: inversion => inversion.top,
  slips: [
    fineSlip('base-for-top', 'base in place of the top', 'This is the base of the inversion: its top is where temperature is highest.', ofInversion(inversion => inversion.base)),
    fineSlip('depth', 'depth in place of the height', 'This is the depth of the inversion, not the height of its top.', ofInversion(inversion => inversion.top - inversion.base)),
    fineSlip('middle', 'middle of the inversion', 'This is the middle of the inversion.', ofInversion(inversion => (inversion.base + inversion.top) / 2)),
  ],
  gives: 300,
})
