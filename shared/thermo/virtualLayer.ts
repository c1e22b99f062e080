/** A layer of moist air: rows with a mixing ratio, whose temperatures are made virtual before a rate is taken. */
import { epsilonOf } from './constants'
import type { Constants, Formulae, InputDefinition, Inputs } from './definition'
import { virtualTemperatureFrom } from './humidity'
import { seriesOf } from './inputs'
import { heightsOf, layerInputs, temperaturesOf } from './layer'

export const virtualTemperatureKey = 'virtual-temperature'

/** A row without vapor is allowed: its virtual temperature is its temperature. */
export function moistLayerInputs(least: number): readonly InputDefinition[] {
  return [
    ...layerInputs(least),
    { name: 'mixingRatio', label: 'mixing ratios of the rows', symbol: 'w', unit: '1', shownUnit: 'g/kg', kind: 'ratio', shape: 'series', range: [0, 0.2], needs: { least, order: 'none' } },
  ]
}

/**
 * The rows with Tv in the place of T, by the convention's form of the virtual temperature.
 *
 *   Tv = T (1 + w/ε)/(1 + w), or T (1 + 0.61 w) where the convention names that approximation
 *
 * Source: AMS Glossary of Meteorology, "virtual temperature". SI, any order of rows.
 *
 * @example virtualRows({ height: [0, 500], temperature: [288.15, 284.15], mixingRatio: [0.012, 0.008] }, constants, formulae).temperature // [290.227, 285.522]
 */
export function virtualRows(inputs: Inputs, constants: Constants, formulae: Formulae): Inputs {
  const w = seriesOf(inputs, 'mixingRatio'), epsilon = epsilonOf(constants), isLinear = formulae.variants[virtualTemperatureKey] === 'linear'
  const temperature = temperaturesOf(inputs).map((T, at) => {
    const ratio = w[at] ?? 0
    return isLinear ? T * (1 + 0.61 * ratio) : virtualTemperatureFrom(T, ratio, epsilon)
  })
  return { height: heightsOf(inputs), temperature }
}

/** The rows as they are, without their vapor: what one takes who forgets it. */
export const plainRows = (inputs: Inputs): Inputs => ({ height: heightsOf(inputs), temperature: temperaturesOf(inputs) })

/** The rows with Tv made of °C, and in kelvin again: the factor belongs to kelvin. */
export function rowsVirtualInCelsius(inputs: Inputs, constants: Constants, formulae: Formulae): Inputs {
  const celsius = temperaturesOf(inputs).map(T => T - zeroCelsius)
  const { temperature } = virtualRows({ ...inputs, temperature: celsius }, constants, formulae)
  return { height: heightsOf(inputs), temperature: Array.isArray(temperature) ? temperature.map((T: number) => T + zeroCelsius) : [] }
}

const zeroCelsius = 273.15
