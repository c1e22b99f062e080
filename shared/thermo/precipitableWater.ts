/** Water vapor in a column, as the depth of the liquid that it would make: 1 mm is 1 kg m⁻². */
import type { Constants, Formulae, Inputs, InputDefinition, QuantityDefinition, Source } from './definition'
import { constant, epsilonOf } from './constants'
import { numberOf } from './inputs'
import { parcelContext } from './parcelContext'
import { exampleSounding } from './parcelDefinition'
import { constantSlip, fineSlip, slip } from './slips'
import { soundingInputs, surfacePressureInput } from './sounding'
import { texNumber, texQuantity } from './tex'

/** kg m⁻³, by definition of the unit: 1 kg m⁻² of water is called 1 mm. */
const waterDensity = 1000
const source: Source = { text: 'AMS Glossary of Meteorology, "precipitable water"', status: 'verified' }

export type Humidity = 'q' | 'w'

/**
 * Precipitable water of a sounding.
 *
 *   PW = 1/(ρ g) ∫ q dp     trapezoids in p between rows; q = w/(1 + w), or w itself where the ask says so
 *
 * Source: AMS Glossary of Meteorology, "precipitable water". SI (m). It is that of the layer that the data span.
 *
 * @example precipitableWater(exampleSounding, constants, formulae, 'q') // 0.0398 m
 */
export function precipitableWater(inputs: Inputs, constants: Constants, formulae: Formulae, humidity: Humidity): number {
  const { sounding } = parcelContext(inputs, constants, formulae)
  let sum = 0, before = 0
  for (let row = 0; row < sounding.count; row++) {
    const w = sounding.mixingRatio[row] ?? 0, here = humidity === 'q' ? w / (1 + w) : w
    if (row > 0) sum += 0.5 * (before + here) * ((sounding.pressure[row - 1] ?? 0) - (sounding.pressure[row] ?? 0))
    before = here
  }
  return sum / (constant(constants, 'g') * waterDensity)
}

/**
 * Precipitable water of a layer with one mixing ratio.
 *
 *   PW = q (p₁ − p₂)/(ρ g)
 *
 * Source: as `precipitableWater`.
 *
 * @example layerPrecipitableWater(0.008, 100000, 70000, { g: 9.81 }, 'w') // 0.024465 m
 */
export function layerPrecipitableWater(mixingRatio: number, bottom: number, top: number, constants: Constants, humidity: Humidity): number {
  return (humidity === 'q' ? mixingRatio / (1 + mixingRatio) : mixingRatio) * (bottom - top) / (constant(constants, 'g') * waterDensity)
}

const inWords = { q: 'specific humidity q', w: 'mixing ratio w' } as const
const other = (humidity: Humidity): Humidity => (humidity === 'q' ? 'w' : 'q')
const shared = { symbol: 'PW', unit: 'm', shownUnit: 'mm', kind: 'ratio', nearZero: 0.0001 } as const

export function soundingWaterDefinition(humidity: Humidity, example: { gives: number, within: number }): QuantityDefinition {
  return {
    ...shared,
    key: `precipitable-water${humidity === 'q' ? '' : '-by-mixing-ratio'}`,
    name: `precipitable water of a sounding by ${inWords[humidity]}`,
    inputs: [...soundingInputs, surfacePressureInput],
    variants: [{
      key: 'trapezoids', label: 'trapezoids in p between rows', source, validity: 'the layer that the data span', knownError: 'the spacing of the rows: 1 %',
      evaluate: (inputs, constants, formulae) => ({ is: 'value', value: precipitableWater(inputs, constants, formulae, humidity) }),
    }],
    constants: ['g', 'R', 'Rv', 'enhancementFactor'],
    uses: ['saturation-vapor-pressure'],
    ask: `The precipitable water of the layer that your rows span, PW = (1/ρg) ∫ ${humidity} dp with the ${inWords[humidity]}, trapezoids in p between rows, as the depth of liquid water (1 mm is 1 kg m⁻²).`,
    trace(inputs, constants, _variant, formulae) {
      const { sounding } = parcelContext(inputs, constants, formulae), value = precipitableWater(inputs, constants, formulae, humidity)
      return [
        { text: 'Humidity at the bottom', formula: 'w = \\frac{\\varepsilon e}{p - e}', filled: `w = ${texQuantity((sounding.mixingRatio[0] ?? 0) * 1000, 'g/kg')},\\quad \\varepsilon = ${texNumber(epsilonOf(constants))}` },
        { text: 'Sum over the layers', formula: `PW = \\frac{1}{\\rho g} \\sum \\bar ${humidity}\\,\\Delta p`, filled: `PW = ${texQuantity(value * 1000, 'mm')}`, value, unit: 'm' },
      ]
    },
    slips: [
      constantSlip('other-humidity', `${other(humidity)} in place of ${humidity}`, `This takes the ${inWords[other(humidity)]}: the ask takes the ${inWords[humidity]}.`, (inputs, constants, _right, formulae) => precipitableWater(inputs, constants, formulae, other(humidity))),
      slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right * constant(constants, 'g')),
      slip('hectopascal', 'hPa in place of Pa', 'The pressures went in in hectopascal: pascal are needed.', (_i, _c, right) => right / 100),
      slip('grams', 'g kg⁻¹ in place of kg kg⁻¹', 'The humidity went in in g/kg: kg/kg is needed.', (_i, _c, right) => right * 1000),
      slip('centimeters', 'cm given as mm', 'Your number is in centimeters; the unit beside it says millimeters.', (_i, _c, right) => right / 10),
      fineSlip('saturated', 'T for the dewpoint', 'This takes the humidity of saturated air, from T: the dewpoint gives the actual one.', (inputs, constants, _right, formulae) => precipitableWater({ ...inputs, dewpoint: inputs.temperature ?? [] }, constants, formulae, humidity)),
    ],
    example: { inputs: exampleSounding, ...example },
  }
}

const layerInputs: readonly InputDefinition[] = [
  { name: 'mixingRatio', label: 'mean mixing ratio of the layer', symbol: 'w', unit: 'kg/kg', shownUnit: 'g/kg', kind: 'ratio', shape: 'number', range: [0, 0.06] },
  { name: 'pressureBottom', label: 'pressure at the bottom', symbol: 'p_1', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [1000, 110_000] },
  { name: 'pressureTop', label: 'pressure at the top', symbol: 'p_2', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [100, 110_000] },
]

export function layerWaterDefinition(humidity: Humidity, example: { gives: number, within: number }): QuantityDefinition {
  const of = (inputs: Inputs, constants: Constants, by: Humidity = humidity) => layerPrecipitableWater(numberOf(inputs, 'mixingRatio'), numberOf(inputs, 'pressureBottom'), numberOf(inputs, 'pressureTop'), constants, by)
  return {
    ...shared,
    kind: 'difference',
    key: `layer-precipitable-water${humidity === 'q' ? '' : '-by-mixing-ratio'}`,
    name: `precipitable water of a layer by ${inWords[humidity]}`,
    inputs: layerInputs,
    variants: [{
      key: 'one-value', label: 'one mixing ratio for the layer', source, validity: 'a layer with little change of mixing ratio', knownError: 'none: the mean decides',
      evaluate: (inputs, constants) => ({ is: 'value', value: of(inputs, constants) }),
    }],
    constants: ['g'],
    ask: `The precipitable water of the layer alone, PW = ${humidity} (p₁ − p₂)/(ρ g) with the ${inWords[humidity]} of its mean mixing ratio, as the depth of liquid water (1 mm is 1 kg m⁻²).`,
    trace(inputs, constants) {
      const w = numberOf(inputs, 'mixingRatio'), value = of(inputs, constants), taken = humidity === 'q' ? w / (1 + w) : w
      return [
        { text: 'Humidity', formula: humidity === 'q' ? 'q = \\frac{w}{1 + w}' : 'w', filled: `${humidity} = ${texQuantity(taken * 1000, 'g/kg')}` },
        { text: 'Water in the layer', formula: `PW = \\frac{${humidity} (p_1 - p_2)}{\\rho g}`, filled: `PW = \\frac{${texNumber(taken)} \\times ${texNumber(numberOf(inputs, 'pressureBottom') - numberOf(inputs, 'pressureTop'))}}{1000 \\times ${texNumber(constant(constants, 'g'), 6)}}\\,\\mathrm{m} = ${texQuantity(value * 1000, 'mm')}`, value, unit: 'm' },
      ]
    },
    slips: [
      constantSlip('other-humidity', `${other(humidity)} in place of ${humidity}`, `This takes the ${inWords[other(humidity)]}: the ask takes the ${inWords[humidity]}.`, (inputs, constants) => of(inputs, constants, other(humidity))),
      slip('sign', 'layer upside down', 'The layer is taken upside down: the bottom has the higher pressure.', (_i, _c, right) => -right),
      slip('gravity-left-out', 'g left out', 'The acceleration of gravity is left out.', (_i, constants, right) => right * constant(constants, 'g')),
      slip('hectopascal', 'hPa in place of Pa', 'The pressures went in in hectopascal: pascal are needed.', (_i, _c, right) => right / 100),
      slip('grams', 'g kg⁻¹ in place of kg kg⁻¹', 'The humidity went in in g/kg: kg/kg is needed.', (_i, _c, right) => right * 1000),
      slip('centimeters', 'cm given as mm', 'Your number is in centimeters; the unit beside it says millimeters.', (_i, _c, right) => right / 10),
    ],
    example: { inputs: { mixingRatio: 0.008, pressureBottom: 100_000, pressureTop: 70_000 }, ...example },
  }
}
