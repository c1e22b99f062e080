import { lagOneDefinition } from '../lagOneDefinition'
import { theilSenRate } from '../theilSen'

/** Lag-1 correlation of the residuals about a line by the Theil–Sen estimator: see `lagOneCorrelationAbout`. */
export const lapseRateTheilSenLagOneCorrelationDefinition = lagOneDefinition({
  key: 'lapse-rate-theil-sen-lag-one-correlation',
  name: 'lag-1 correlation of the residuals of a lapse rate by the Theil–Sen estimator',
  line: 'the line with the Theil–Sen lapse rate',
  source: { text: 'Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32; Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389', status: 'from memory' },
  rate: inputs => theilSenRate(inputs).rate,
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290.0, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.323305, within: 0.000001 },
})
