import type { Convention } from '../convention'
import { bolton1980 } from './bolton1980'
import { closed1004 } from './closed1004'
import { sevenHalves } from './sevenHalves'
import { wmo8 } from './wmo8'

export const conventions: readonly Convention[] = [closed1004, sevenHalves, bolton1980, wmo8]
export const defaultConvention = closed1004
export const findConvention = (key: string): Convention | null => conventions.find(convention => convention.key === key) ?? null
