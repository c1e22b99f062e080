import { lagOneDefinition } from '../lagOneDefinition'
import { endPointRate, endsOf } from '../layer'

/** Lag-1 correlation of the residuals about the line between the end points of a layer: see `lagOneCorrelationAbout`. */
export const lapseRateEndPointsLagOneCorrelationDefinition = lagOneDefinition({
  key: 'lapse-rate-end-points-lag-one-correlation',
  name: 'lag-1 correlation of the residuals of a lapse rate by end points',
  line: 'the straight line between the lowest and the highest row',
  source: { text: 'Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32', status: 'from memory' },
  rate: inputs => endPointRate(endsOf(inputs)),
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290.0, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.602541, within: 0.000001 },
})
