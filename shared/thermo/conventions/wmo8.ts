import type { Convention } from '../convention'
import { closed1004 } from './closed1004'

/** The formulae of the guide by which stations measure: for courses on instruments. Beyond their stated range the next formula is taken. */
export const wmo8: Convention = {
  ...closed1004,
  key: 'wmo-8',
  title: 'WMO-No. 8: vapor pressure, psychrometer; cp 1005, R 287.05, g 9.80665',
  source: 'WMO-No. 8, Guide to Instruments and Methods of Observation, for vapor pressures and psychrometers; constants of dry air by common practice',
  constants: { ...closed1004.constants, cp: 1005, cv: 717.95, R: 287.05, g: 9.80665 },
  variants: {
    'saturation-vapor-pressure': 'wmo',
    'saturation-vapor-pressure-over-ice': 'wmo',
    'vapor-pressure-from-psychrometer': 'wmo',
    'vapor-pressure-from-ice-psychrometer': 'wmo',
    'relative-humidity-from-psychrometer': 'wmo',
    'relative-humidity-from-ice-psychrometer': 'wmo',
  },
  beyond: 'next',
}
