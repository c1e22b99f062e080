import type { Convention } from '../convention'
import { closed1004 } from './closed1004'

/** Dry air as an ideal gas of molecules of two atoms: cp = 7/2 R, so that κ is 2/7 and the convention closes exactly. */
export const sevenHalves: Convention = {
  ...closed1004,
  key: 'seven-halves',
  title: 'cp 7/2 R = 1004.5, cv 717.5, R 287, g 9.81',
  source: 'common practice: an ideal gas of molecules of two atoms, κ = 2/7',
  constants: { ...closed1004.constants, cp: 1004.5, cv: 717.5, R: 287 },
}
