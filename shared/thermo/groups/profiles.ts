import type { QuantityGroup } from '../definition'
import { bruntVaisalaFrequencyDefinition } from '../quantities/bruntVaisalaFrequency'
import { bruntVaisalaFrequencySquaredDefinition } from '../quantities/bruntVaisalaFrequencySquared'
import { bruntVaisalaFrequencySquaredFromLapseRateDefinition } from '../quantities/bruntVaisalaFrequencySquaredFromLapseRate'
import { bulkRichardsonNumberDefinition } from '../quantities/bulkRichardsonNumber'
import { bulkRichardsonNumberFromWindsDefinition } from '../quantities/bulkRichardsonNumberFromWinds'
import { fittedTemperatureAtZeroHeightDefinition } from '../quantities/fittedTemperatureAtZeroHeight'
import { freezingLevelDefinition } from '../quantities/freezingLevel'
import { gradientRichardsonNumberDefinition } from '../quantities/gradientRichardsonNumber'
import { inversionBaseDefinition } from '../quantities/inversionBase'
import { inversionStrengthDefinition } from '../quantities/inversionStrength'
import { inversionTopDefinition } from '../quantities/inversionTop'
import { lapseRateEndPointsDefinition } from '../quantities/lapseRateEndPoints'
import { lapseRateEndPointsStandardErrorDefinition } from '../quantities/lapseRateEndPointsStandardError'
import { lapseRateInflatedStandardErrorDefinition } from '../quantities/lapseRateInflatedStandardError'
import { lapseRateLagOneCorrelationDefinition } from '../quantities/lapseRateLagOneCorrelation'
import { lapseRateLeastSquaresDefinition } from '../quantities/lapseRateLeastSquares'
import { lapseRateStandardErrorDefinition } from '../quantities/lapseRateStandardError'
import { lapseRateTheilSenDefinition } from '../quantities/lapseRateTheilSen'
import { lapseRateTheilSenStandardErrorDefinition } from '../quantities/lapseRateTheilSenStandardError'
import { mixedLayerDepthBulkRichardsonDefinition } from '../quantities/mixedLayerDepthBulkRichardson'
import { mixedLayerDepthGradientDefinition } from '../quantities/mixedLayerDepthGradient'
import { mixedLayerDepthParcelDefinition } from '../quantities/mixedLayerDepthParcel'
import { potentialTemperatureGradientDefinition } from '../quantities/potentialTemperatureGradient'
import { staticStabilityDefinition } from '../quantities/staticStability'
import { vectorWindDifferenceDefinition } from '../quantities/vectorWindDifference'
import { layerStabilityDefinition } from '../quantities/layerStability'
import { equivalentPotentialTemperatureGradientDefinition } from '../quantities/equivalentPotentialTemperatureGradient'
import { potentialStabilityDefinition } from '../quantities/potentialStability'
import { lapseRateEndPointsLagOneCorrelationDefinition } from '../quantities/lapseRateEndPointsLagOneCorrelation'
import { lapseRateEndPointsInflatedStandardErrorDefinition } from '../quantities/lapseRateEndPointsInflatedStandardError'
import { lapseRateTheilSenLagOneCorrelationDefinition } from '../quantities/lapseRateTheilSenLagOneCorrelation'
import { lapseRateTheilSenInflatedStandardErrorDefinition } from '../quantities/lapseRateTheilSenInflatedStandardError'
import { lapseRateBinnedLeastSquaresDefinition } from '../quantities/lapseRateBinnedLeastSquares'
import { virtualTemperatureLapseRateEndPointsDefinition } from '../quantities/virtualTemperatureLapseRateEndPoints'
import { virtualTemperatureLapseRateLeastSquaresDefinition } from '../quantities/virtualTemperatureLapseRateLeastSquares'
import { virtualTemperatureLapseRateTheilSenDefinition } from '../quantities/virtualTemperatureLapseRateTheilSen'
import { staticStabilityByVirtualTemperatureDefinition } from '../quantities/staticStabilityByVirtualTemperature'
import { virtualPotentialTemperatureGradientDefinition } from '../quantities/virtualPotentialTemperatureGradient'
import { bruntVaisalaFrequencySquaredFromVirtualLapseRateDefinition } from '../quantities/bruntVaisalaFrequencySquaredFromVirtualLapseRate'

export const profiles: QuantityGroup = {
  key: 'profiles',
  title: 'Profiles',
  quantities: [
    lapseRateEndPointsDefinition,
    lapseRateEndPointsStandardErrorDefinition,
    lapseRateEndPointsLagOneCorrelationDefinition,
    lapseRateEndPointsInflatedStandardErrorDefinition,
    lapseRateLeastSquaresDefinition,
    lapseRateStandardErrorDefinition,
    fittedTemperatureAtZeroHeightDefinition,
    lapseRateTheilSenDefinition,
    lapseRateTheilSenStandardErrorDefinition,
    lapseRateTheilSenLagOneCorrelationDefinition,
    lapseRateTheilSenInflatedStandardErrorDefinition,
    lapseRateLagOneCorrelationDefinition,
    lapseRateInflatedStandardErrorDefinition,
    lapseRateBinnedLeastSquaresDefinition,
    virtualTemperatureLapseRateEndPointsDefinition,
    virtualTemperatureLapseRateLeastSquaresDefinition,
    virtualTemperatureLapseRateTheilSenDefinition,
    staticStabilityDefinition,
    staticStabilityByVirtualTemperatureDefinition,
    layerStabilityDefinition,
    potentialStabilityDefinition,
    equivalentPotentialTemperatureGradientDefinition,
    potentialTemperatureGradientDefinition,
    virtualPotentialTemperatureGradientDefinition,
    bruntVaisalaFrequencySquaredDefinition,
    bruntVaisalaFrequencySquaredFromLapseRateDefinition,
    bruntVaisalaFrequencySquaredFromVirtualLapseRateDefinition,
    bruntVaisalaFrequencyDefinition,
    gradientRichardsonNumberDefinition,
    bulkRichardsonNumberDefinition,
    bulkRichardsonNumberFromWindsDefinition,
    vectorWindDifferenceDefinition,
    inversionBaseDefinition,
    inversionTopDefinition,
    inversionStrengthDefinition,
    mixedLayerDepthParcelDefinition,
    mixedLayerDepthBulkRichardsonDefinition,
    mixedLayerDepthGradientDefinition,
    freezingLevelDefinition,
  ],
}
