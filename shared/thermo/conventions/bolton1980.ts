import type { Convention } from '../convention'
import { closed1004 } from './closed1004'

/** Constants and formulae of one paper for moist air, so that all of a course's moist quantities come from one source. */
export const bolton1980: Convention = {
  ...closed1004,
  key: 'bolton-1980',
  title: 'Bolton (1980): cp 1005.7, R 287.04, κ 0.2854',
  source: 'Bolton (1980), Mon. Wea. Rev. 108, 1046–1053: κ and the equations 2, 10, 15, 39; cp and R as taught beside it, common practice; g as adopted in 1901',
  constants: { ...closed1004.constants, cp: 1005.7, cv: 718.66, R: 287.04, kappa: 0.2854, g: 9.80665 },
  variants: {
    'saturation-vapor-pressure': 'bolton',
    'latent-heat-of-vaporization': 'linear',
    'lifting-condensation-level-temperature': 'bolton',
    'lifting-condensation-level-pressure': 'bolton',
    'lifting-condensation-level-height': 'bolton',
    'equivalent-potential-temperature': 'bolton-39',
    'saturation-equivalent-potential-temperature': 'bolton-39',
  },
}
