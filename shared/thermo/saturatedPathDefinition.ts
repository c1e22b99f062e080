/** Saturated ascent and descent along the pseudoadiabat: one path, two quantities by their direction. */
import type { QuantityDefinition } from './definition'
import { OutOfRangeError } from './errors'
import { pressureInput, temperatureInput } from './moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, type Hand } from './moistQuantity'
import { kelvinAsCelsiusSlip } from './moistSlips'
import { inCelsius } from './moistTex'
import { pseudoadiabaticSlope, pseudoadiabaticTemperature } from './pseudoadiabat'
import { log, pow } from '../numerics/elementary'
import { glossary } from './sources'
import { texNumber, texQuantity } from './tex'

interface SaturatedPath extends Pick<QuantityDefinition, 'key' | 'name' | 'ask' | 'example'> { direction: 'up' | 'down' }

const from = ({ given }: Hand) => given('pressureStart')
const to = ({ given }: Hand) => given('pressureEnd')
const start = ({ given }: Hand) => given('temperature')

export function saturatedPathDefinition({ direction, ...named }: SaturatedPath): QuantityDefinition {
  const path = (hand: Hand): number => {
    if (direction === 'up' ? to(hand) > from(hand) : to(hand) < from(hand)) throw new OutOfRangeError('pressureEnd', to(hand), `pressures ${direction === 'up' ? 'up to' : 'from'} ${from(hand)} Pa, that of the start: the other way is another quantity`)
    return pseudoadiabaticTemperature(start(hand), from(hand), to(hand), hand.air)
  }
  return moistQuantity({
    ...named,
    symbol: 'T',
    unit: 'K', shownUnit: 'Cel', kind: 'temperature',
    inputs: [
      { ...pressureInput, name: 'pressureStart', label: 'pressure at the start', symbol: 'p₁' },
      { ...temperatureInput, label: 'temperature at the start, saturated' },
      { ...pressureInput, name: 'pressureEnd', label: 'pressure at the end', symbol: 'p₂' },
    ],
    variants: [{ key: 'pseudoadiabat', label: 'pseudoadiabat, integrated in ln p', source: glossary('adiabatic lapse rate'), validity: 'saturated air over liquid water', knownError: '0.6 K over 600 hPa by the latent heat', value: path }],
    constants: ['R', 'Rv', 'cp', 'cpv', 'latentHeat', 'cw', 'enhancementFactor'],
    inside: ['es', 'L'],
    notedAt: { es: given => [given('temperature')], L: given => [given('temperature')] },
    working: (hand, value) => {
      const slope = (T: number, p: number) => pseudoadiabaticSlope(T, p, hand.air)
      return [
        { text: 'At the start', formula: '\\frac{dT}{d\\ln p} = \\frac{R T + L w_s}{c_p + \\frac{L^2 w_s \\varepsilon}{R T^2}}', filled: `\\frac{dT}{d\\ln p} = ${texQuantity(slope(start(hand), from(hand)), 'K')}`, value: slope(start(hand), from(hand)), unit: 'K' },
        { text: `In equal steps of ln p, fourth-order Runge–Kutta, with T, L and ws anew at each; at the end it is ${texNumber(slope(value, to(hand)), 4)} K`, formula: 'T_2 = T_1 + \\int_{p_1}^{p_2} \\frac{dT}{d\\ln p}\\,d\\ln p', filled: `T_2 = ${inCelsius(start(hand))} ${value < start(hand) ? '-' : '+'} ${texQuantity(Math.abs(value - start(hand)), 'K')} = ${inCelsius(value)}` },
      ]
    },
    slips: [
      fineMoistSlip('dry', 'dry adiabat', 'This goes along the dry adiabat: saturated air that condenses or evaporates water changes its temperature less.', hand => start(hand) * pow(to(hand) / from(hand), hand.air.kappa)),
      moistSlip('wrong-way', direction === 'up' ? 'warmed where it cools' : 'cooled where it warms', direction === 'up' ? 'Air cools as it rises: your value goes the other way.' : 'Air warms as it sinks: your value goes the other way.', hand => to(hand) === from(hand) ? null : 2 * start(hand) - hand.right),
      fineMoistSlip('constant-rate', 'rate of the start all the way', 'This keeps the rate of the start all the way: it changes as the air goes along.', hand => start(hand) + pseudoadiabaticSlope(start(hand), from(hand), hand.air) * log(to(hand) / from(hand))),
      fineMoistSlip('six', '6 K km⁻¹ all the way', 'This takes 6 K for each kilometer of the air’s own column: the saturated rate depends on temperature and pressure.', hand => start(hand) + 0.006 * hand.air.R * start(hand) / hand.air.g * log(to(hand) / from(hand))),
      moistSlip('change-only', 'change for temperature', 'This is the change of temperature: add it to the temperature at the start.', hand => to(hand) === from(hand) ? null : 273.15 + hand.right - start(hand)),
      kelvinAsCelsiusSlip,
    ],
  })
}

