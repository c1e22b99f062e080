import { describe, expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import type { Constants, Inputs } from '#shared/thermo/definition'
import { findQuantity } from '#shared/thermo/registry'
import { formatQuantity } from '#shared/units/formatQuantity'
import { fromSi, getUnit } from '#shared/units/ucum'
import { fromDouble, toDouble } from '#shared/numerics/rational'
import { judgeTyped, stepOf } from '../../../fixtures/marking/ask'

/** Spreads of constants that honest answers show: whoever works with either end is right, by the ask as it stands, with the digits asked. */
const ends: readonly [row: string, quantity: string, inputs: Inputs, constants: readonly Constants[]][] = [
  ['dry lapse rate, 9.81/1004 and 9.80665/1005.7', 'dry-adiabatic-lapse-rate', {}, [{ g: 9.81, cp: 1004 }, { g: 9.80665, cp: 1005.7 }]],
  ['cp 1004 and 1005.7', 'isobaric-heat', { temperatureStart: 283.15, temperatureEnd: 293.15 }, [{ cp: 1004 }, { cp: 1005.7 }]],
  ['κ 0.2854 and 2/7, at 850 hPa', 'potential-temperature', { pressure: 85_000, temperature: 293.15 }, [{ kappa: 0.2854 }, { kappa: 2 / 7 }]],
  ['κ 0.2854 and 2/7, at 300 hPa', 'potential-temperature', { pressure: 30_000, temperature: 230 }, [{ kappa: 0.2854 }, { kappa: 2 / 7 }]],
  ['g 9.81 and 9.80665', 'hypsometric-thickness', { pressureBottom: 100_000, pressureTop: 50_000, meanVirtualTemperature: 270 }, [{ g: 9.81 }, { g: 9.80665 }]],
  ['von Kármán 0.40 and 0.41', 'logarithmic-wind-speed', { frictionVelocity: 0.35, measurementHeight: 10, roughnessLength: 0.03 }, [{ vonKarman: 0.4 }, { vonKarman: 0.41 }]],
]

describe('both ends of a spread of constants are accepted', () => {
  it.each(ends)('%s', (_row, quantity, inputs, each) => {
    const definition = findQuantity(quantity)!
    for (const more of each) {
      const outcome = evaluateQuantity(definition, inputs, { ...defaultConvention.constants, ...more })
      if (outcome.is !== 'value') throw new Error(`${quantity} is ${outcome.is}`)
      const shown = toDouble(fromSi(fromDouble(outcome.value), getUnit(definition.shownUnit), definition.kind !== 'temperature'))
      const typed = formatQuantity(shown, definition.shownUnit, definition.kind === 'temperature' ? 4 : 3).text
      expect(judgeTyped(stepOf(quantity, inputs), typed).isAccepted, `${typed} by ${JSON.stringify(more)}`).toBe(true)
    }
  })
})
