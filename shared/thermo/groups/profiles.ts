import type { QuantityGroup } from '../definition'
import { lapseRateEndPointsDefinition } from '../quantities/lapseRateEndPoints'
import { lapseRateLeastSquaresDefinition } from '../quantities/lapseRateLeastSquares'
import { lapseRateStandardErrorDefinition } from '../quantities/lapseRateStandardError'
import { staticStabilityDefinition } from '../quantities/staticStability'

export const profiles: QuantityGroup = {
  key: 'profiles',
  title: 'Profiles',
  quantities: [
    lapseRateEndPointsDefinition,
    lapseRateLeastSquaresDefinition,
    lapseRateStandardErrorDefinition,
    staticStabilityDefinition,
  ],
}
