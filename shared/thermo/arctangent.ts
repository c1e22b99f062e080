import { atan2 } from '../numerics/angles'

/** The arctangent in radians, by the numerics that are the same everywhere. @example arctangent(1) // π/4 */
export const arctangent = (x: number): number => atan2(x, 1)
