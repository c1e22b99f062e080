import { vaporPressureFrom } from '../humidity'
import { mixingRatioInput, pressureInput } from '../moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip } from '../moistQuantity'
import { kilopascalSlip, pascalSlip } from '../moistSlips'
import { inHectopascal } from '../moistTex'
import { glossary } from '../sources'
import { texNumber } from '../tex'

/** Vapor pressure of air with a mixing ratio: e = w p/(ε + w). Source: AMS Glossary, "mixing ratio", solved for e. */
export const vaporPressureFromMixingRatioDefinition = moistQuantity({
  key: 'vapor-pressure-from-mixing-ratio',
  name: 'vapor pressure from the mixing ratio',
  symbol: 'e',
  unit: 'Pa', shownUnit: 'hPa', kind: 'ratio',
  inputs: [pressureInput, mixingRatioInput],
  variants: [
    { key: 'exact', label: 'w p/(ε + w)', source: glossary('mixing ratio'), validity: 'any', knownError: '0.1 % by the gas constants', value: ({ given, air }) => vaporPressureFrom(given('mixingRatio'), given('pressure'), air.epsilon) },
    { key: 'approximate', label: 'w p/ε, as an approximation', source: { text: 'common practice: w neglected against ε', status: 'common practice' }, validity: 'cold or dry air', knownError: '1.6 % at 10 g/kg', value: ({ given, air }) => given('mixingRatio') * given('pressure') / air.epsilon },
  ],
  constants: ['R', 'Rv'],
  ask: 'The vapor pressure e of air with the mixing ratio at the pressure.',
  working: ({ given, air, variant }, value) => [variant === 'approximate'
    ? { text: 'With w neglected against ε', formula: 'e = \\frac{w\\,p}{\\varepsilon}', filled: `e = \\frac{${texNumber(given('mixingRatio'))} \\cdot ${texNumber(given('pressure') / 100, 6)}}{${texNumber(air.epsilon)}} = ${inHectopascal(value)}` }
    : { text: 'The mixing ratio solved for e, with w in kg per kg', formula: 'e = \\frac{w\\,p}{\\varepsilon + w}', filled: `e = \\frac{${texNumber(given('mixingRatio'))} \\cdot ${texNumber(given('pressure') / 100, 6)}}{${texNumber(air.epsilon)} + ${texNumber(given('mixingRatio'))}} = ${inHectopascal(value)}` }],
  slips: [
    fineMoistSlip('without-w', 'w neglected against ε', 'This is w p/ε: in the denominator stands ε + w.', ({ given, air, variant }) => variant === 'approximate' ? null : given('mixingRatio') * given('pressure') / air.epsilon),
    moistSlip('grams', 'g kg⁻¹ put in for kg kg⁻¹', 'This is what comes out with w in g per kg: the formula takes kg per kg.', ({ given, again }) => again({ mixingRatio: 1000 * given('mixingRatio') })),
    moistSlip('inverted-epsilon', 'ε turned round', 'This comes from 1/ε, the ratio of the gas constants the other way round.', ({ given, air }) => vaporPressureFrom(given('mixingRatio'), given('pressure'), 1 / air.epsilon)),
    moistSlip('epsilon-left-out', 'ε for 1', 'This is w p/(1 + w): the ratio of the molar masses, ε = 0.622, is missing.', ({ given }) => vaporPressureFrom(given('mixingRatio'), given('pressure'), 1)),
    pascalSlip, kilopascalSlip,
  ],
  example: { inputs: { pressure: 100_000, mixingRatio: 0.01 }, gives: 1582.566, within: 0.001 },
})
