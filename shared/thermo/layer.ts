/** What the lapse rates of a layer have in common: heights and temperatures of the rows as served, in any order. */
import { straightLine, type Line } from '../numerics/regression'
import { dryRateOf, constant } from './constants'
import type { Constants, InputDefinition, Inputs } from './definition'
import { SeriesError } from './errors'
import { seriesOf } from './inputs'
import { kelvin, kelvinPerMeter, meter, type Kelvin, type KelvinPerMeter, type Meter } from '../units/brands'

export function layerInputs(least: number): readonly InputDefinition[] {
  return [
    { name: 'height', label: 'heights of the rows', symbol: 'z', unit: 'm', shownUnit: 'm', kind: 'difference', shape: 'series', range: [-500, 100_000], needs: { least, order: 'none' } },
    { name: 'temperature', label: 'air temperatures of the rows', symbol: 'T', unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'series', range: [100, 400], needs: { least, order: 'none' } },
  ]
}

export const heightsOf = (inputs: Inputs): readonly number[] => seriesOf(inputs, 'height')
export const temperaturesOf = (inputs: Inputs): readonly number[] => seriesOf(inputs, 'temperature')

/** T on z over the rows. @throws {SeriesError} where all heights are alike */
export function lineOf(inputs: Inputs): Line {
  const line = straightLine(heightsOf(inputs), temperaturesOf(inputs))
  if (!line) throw new SeriesError('height', 'all rows have the same height; a lapse rate needs a layer')
  return line
}

export interface Ends { lowHeight: Meter, highHeight: Meter, lowTemperature: Kelvin, highTemperature: Kelvin, lowCount: number, highCount: number }

/** The lowest and the highest row, by height and never by order; rows at one height count with their mean. @throws {SeriesError} */
export function endsOf(inputs: Inputs): Ends {
  const heights = heightsOf(inputs)
  const temperatures = temperaturesOf(inputs)
  let low = Infinity, high = -Infinity
  for (const z of heights) {
    if (z < low) low = z
    if (z > high) high = z
  }
  if (!(high > low)) throw new SeriesError('height', 'all rows have the same height; a lapse rate needs a layer')
  const meanAt = (z: number) => {
    let sum = 0, count = 0
    heights.forEach((height, at) => {
      if (height !== z) return
      sum += temperatures[at] ?? 0
      count++
    })
    return { temperature: kelvin(sum / count), count }
  }
  const bottom = meanAt(low), top = meanAt(high)
  return { lowHeight: meter(low), highHeight: meter(high), lowTemperature: bottom.temperature, highTemperature: top.temperature, lowCount: bottom.count, highCount: top.count }
}

/**
 * Γ = −(T₂ − T₁)/(z₂ − z₁) between two heights.
 * @example endPointRate({ lowHeight: 20, highHeight: 220, lowTemperature: 291.15, highTemperature: 289.35, … }) // 0.009 K m⁻¹
 */
export function endPointRate(ends: Ends): KelvinPerMeter {
  return kelvinPerMeter((ends.lowTemperature - ends.highTemperature) / (ends.highHeight - ends.lowHeight))
}

/** Where the class of an unsaturated layer changes: Γd, with the tolerance of a neutral layer on both sides. */
export function dryClassLimits(_inputs: Inputs, constants: Constants): readonly { label: string, value: number }[] {
  const rate = dryRateOf(constants)
  const tolerance = constant(constants, 'neutralTolerance')
  return [
    { label: 'Γd less the tolerance of a neutral layer', value: rate - tolerance },
    { label: 'Γd with the tolerance of a neutral layer', value: rate + tolerance },
  ]
}
