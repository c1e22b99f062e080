import type { Convention } from '../convention'
import { closed1004 } from './closed1004'

export const conventions: readonly Convention[] = [closed1004]
export const defaultConvention = closed1004
export const findConvention = (key: string): Convention | null => conventions.find(convention => convention.key === key) ?? null
