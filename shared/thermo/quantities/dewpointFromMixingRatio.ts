import { dewpointFunction, frostPoint } from '../dewpoints'
import { vaporPressureFrom } from '../humidity'
import { mixingRatioInput, pressureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, smallMoistSlip } from '../moistQuantity'
import { kelvinAsCelsiusSlip } from '../moistSlips'
import { inCelsius, inHectopascal } from '../moistTex'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Dewpoint over liquid water from the mixing ratio: eₛ(T_d) = w p/(ε + w). Formula and source: `dewpoints.ts`. */
export const dewpointFromMixingRatioDefinition = moistQuantity({
  key: 'dewpoint-from-mixing-ratio',
  name: 'dewpoint from the mixing ratio',
  symbol: 'T_d',
  unit: 'K', shownUnit: 'Cel', kind: 'temperature',
  inputs: [pressureInput, mixingRatioInput],
  variants: [{ key: 'over-water', label: 'eₛ(T_d) = w p/(ε + w)', source: glossary('dewpoint'), validity: 'over liquid water, also below 0 °C', knownError: '0.05 K by the formula of eₛ', value: ({ given, air, constants, formulae }) => dewpointFunction(constants, formulae)(vaporPressureFrom(given('mixingRatio'), given('pressure'), air.epsilon)) }],
  constants: ['R', 'Rv', 'enhancementFactor'],
  inside: ['es'],
  ask: 'The dewpoint over liquid water, also below 0 °C, of air with the mixing ratio at the pressure.',
  working: ({ given, air }, value) => {
    const e = vaporPressureFrom(given('mixingRatio'), given('pressure'), air.epsilon)
    return [
      { text: 'Vapor pressure, with w in kg per kg', formula: 'e = \\frac{w\\,p}{\\varepsilon + w}', filled: `e = \\frac{${texNumber(given('mixingRatio'))} \\cdot ${texNumber(given('pressure') / 100, 6)}}{${texNumber(air.epsilon)} + ${texNumber(given('mixingRatio'))}} = ${inHectopascal(e)}`, value: e, unit: 'Pa' },
      { text: 'The temperature at which this is saturation', formula: 'e_s(T_d) = e', filled: `e_s(${inCelsius(value)}) = ${inHectopascal(e)}` },
    ]
  },
  slips: [
    smallMoistSlip('without-w', 'w neglected against ε', 'This comes from e = w p/ε: in the denominator stands ε + w.', ({ given, air, constants, formulae }) => dewpointFunction(constants, formulae)(given('mixingRatio') * given('pressure') / air.epsilon)),
    moistSlip('epsilon-left-out', 'ε left out', 'This comes from e = w p: the ratio of the molar masses, ε = 0.622, is missing.', ({ given, constants, formulae }) => dewpointFunction(constants, formulae)(given('mixingRatio') * given('pressure'))),
    fineMoistSlip('frost-point', 'frost point for dewpoint', 'This is the frost point, over ice; the dewpoint refers to liquid water, also below 0 °C.', ({ given, air, constants, formulae, right }) => {
      if (right > 273.15) return null
      const outcome = frostPoint(vaporPressureFrom(given('mixingRatio'), given('pressure'), air.epsilon), constants, formulae)
      return outcome.is === 'value' ? outcome.value : null
    }),
    kelvinAsCelsiusSlip,
  ],
  example: { inputs: { pressure: 100_000, mixingRatio: 0.01 }, gives: 287.0064, within: 0.0001 },
})
