import type { Inputs } from '../definition'
import { heightsOf, layerInputs, lineOf, temperaturesOf } from '../layer'
import { oneFormula } from '../oneFormula'
import { fineSlip, slip, zeroCelsius } from '../slips'
import { texNumber, texQuantity } from '../tex'

/**
 * Intercept of the straight line by least squares of T on z: its temperature at height 0 of the datum of the heights.
 *
 *   T₀ = T̄ − (dT/dz) z̄
 *
 * Source: common practice (ordinary least squares). It depends on what heights are counted from; the slope does not.
 *
 * @example z 100, 150, 200, 250, 300 m; T 15.0, 14.6, 14.1, 13.7, 12.9 °C: 16.10 °C
 */
export const fittedTemperatureAtZeroHeightDefinition = oneFormula({
  key: 'fitted-temperature-at-zero-height',
  name: 'fitted temperature at height zero',
  symbol: 'T₀',
  unit: 'K',
  shownUnit: 'Cel',
  kind: 'temperature',
  inputs: layerInputs(3),
  constants: [],
  formula: {
    key: 'ordinary', label: 'ordinary least squares of T on z, at z = 0',
    source: { text: 'ordinary least squares; NIST StRD linear regression for the arithmetic', status: 'common practice' },
    validity: 'any layer with two heights', knownError: 'none: the rows alone decide',
  },
  value: intercept,
  ask: 'The temperature at height 0 of the straight line by ordinary least squares of temperature on height over all your rows; height 0 is that of the heights as given.',
  working(inputs, _constants, value) {
    const line = lineOf(inputs)
    return [
      { text: `Means of the ${line.count} rows`, formula: '\\bar z,\\ \\bar T', filled: `\\bar z = ${texQuantity(line.meanX, 'm', 6)},\\quad \\bar T = ${texQuantity(line.meanY - zeroCelsius, 'Cel')}` },
      { text: 'Slope', formula: '\\frac{dT}{dz} = \\frac{\\sum (z - \\bar z)(T - \\bar T)}{\\sum (z - \\bar z)^2}', filled: `\\frac{dT}{dz} = \\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(line.slope * 1000, 'K/km')}` },
      { text: 'At height 0', formula: 'T_0 = \\bar T - \\frac{dT}{dz}\\,\\bar z', filled: `T_0 = ${texQuantity(value - zeroCelsius, 'Cel', 5)}`, value, unit: 'K' },
    ]
  },
  slips: [
    slip('slope-turned', 'slope with its sign turned', 'This goes down the line in the wrong direction: T₀ = T̄ − (dT/dz) z̄.', inputs => 2 * lineOf(inputs).meanY - intercept(inputs)),
    fineSlip('lowest-row', 'lowest row in place of the intercept', 'This is the temperature of the lowest row: the ask takes the line at height 0.', lowestTemperature),
    fineSlip('mean', 'mean in place of the intercept', 'This is the mean temperature of the rows: the ask takes the line at height 0.', inputs => lineOf(inputs).meanY),
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 289.25, within: 1e-9 },
})

function intercept(inputs: Inputs): number {
  const line = lineOf(inputs)
  return line.meanY - line.slope * line.meanX
}

function lowestTemperature(inputs: Inputs): number | null {
  const heights = heightsOf(inputs), temperatures = temperaturesOf(inputs)
  let lowest = 0
  heights.forEach((height, at) => {
    if (height < (heights[lowest] ?? height)) lowest = at
  })
  return temperatures[lowest] ?? null
}
