/** Two bodies of air mixed at one pressure: temperature, vapor pressure, relative humidity of the mixture, which may be supersaturated. */
import type { QuantityDefinition } from './definition'
import { mixingRatioFrom, specificHumidityFrom } from './humidity'
import { pressureInput, relativeHumidityInput, temperatureInput } from './moistInputs'
import { moistQuantity, supersaturated, type Hand, type MoistSlip } from './moistQuantity'
import { glossary } from './sources'
import { inCelsius, inHectopascal } from './moistTex'
import { texNumber, texQuantity } from './tex'

export type MixturePart = 'temperature' | 'vapor-pressure' | 'relative-humidity'

const first = 'First', second = 'Second'
export const massOf = ({ given }: Hand, which: string) => given(`mass${which}`)
export const shareOf = (hand: Hand): number => massOf(hand, first) / (massOf(hand, first) + massOf(hand, second))
export const vaporOf = ({ given, air }: Hand, which: string): number => given(`relativeHumidity${which}`) * air.es(given(`temperature${which}`))
const humidityOf = (hand: Hand, which: string): number => specificHumidityFrom(mixingRatioFrom(vaporOf(hand, which), hand.given('pressure'), hand.air.epsilon))
export const blend = (hand: Hand, a: number, b: number): number => shareOf(hand) * a + (1 - shareOf(hand)) * b

export const mixedTemperature = (hand: Hand): number => blend(hand, hand.given('temperatureFirst'), hand.given('temperatureSecond'))

/**
 * Vapor pressure of the mixture: the vapor is kept, q = Σ m q/Σ m, and e = q p/(ε + (1 − ε) q); or, as books draw it on a straight line, the mean of e by mass.
 *
 * Source: AMS Glossary of Meteorology, "mixing cloud"; common practice. The two differ by less than 2 %.
 */
export function mixedVaporPressure(hand: Hand): number {
  if (hand.variant === 'mean-vapor-pressure') return blend(hand, vaporOf(hand, first), vaporOf(hand, second))
  const q = blend(hand, humidityOf(hand, first), humidityOf(hand, second)), { epsilon } = hand.air
  return q * hand.given('pressure') / (epsilon + (1 - epsilon) * q)
}

const mass = (which: string, words: string) => ({ name: `mass${which}`, label: `mass of the ${words} air`, symbol: words === 'first' ? 'm₁' : 'm₂', unit: 'kg', shownUnit: 'kg', kind: 'ratio' as const, shape: 'number' as const, range: [0.001, 1e9] as const })
const temperature = (which: string, words: string) => ({ ...temperatureInput, name: `temperature${which}`, label: `temperature of the ${words} air`, symbol: words === 'first' ? 'T₁' : 'T₂' })
const humidity = (which: string, words: string) => ({ ...relativeHumidityInput, name: `relativeHumidity${which}`, label: `relative humidity of the ${words} air, e/es`, symbol: words === 'first' ? 'RH₁' : 'RH₂' })

interface Mixture extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'unit' | 'shownUnit' | 'kind' | 'ask' | 'example'> { part: MixturePart, slips: readonly MoistSlip[] }

export function isobaricMixingDefinition({ part, slips, ...named }: Mixture): QuantityDefinition {
  const isMoist = part !== 'temperature'
  const relative = (hand: Hand) => mixedVaporPressure(hand) / hand.air.es(mixedTemperature(hand))
  const value = (hand: Hand) => part === 'temperature' ? mixedTemperature(hand) : part === 'vapor-pressure' ? mixedVaporPressure(hand) : relative(hand)
  return moistQuantity({
    ...named,
    inputs: [mass(first, 'first'), temperature(first, 'first'), mass(second, 'second'), temperature(second, 'second'), ...isMoist ? [humidity(first, 'first'), humidity(second, 'second'), pressureInput] : []],
    variants: isMoist
      ? [
          { key: 'vapor-kept', label: 'mean of the specific humidities by mass', source: glossary('mixing cloud', 'common practice'), validity: 'mixing at one pressure without condensation', knownError: '0.2 % by the heat capacity of the vapor', value },
          { key: 'mean-vapor-pressure', label: 'mean of the vapor pressures by mass', source: { text: 'common practice: the straight line between two states in a diagram of e on T', status: 'common practice' }, validity: 'mixing at one pressure without condensation', knownError: '1 %', value },
        ]
      : [{ key: 'by-mass', label: 'mean of the temperatures by mass', source: glossary('mixing cloud', 'common practice'), validity: 'mixing at one pressure without condensation', knownError: '0.1 K by the heat capacity of the vapor', value }],
    constants: isMoist ? (part === 'vapor-pressure' ? ['R', 'Rv', 'enhancementFactor'] : ['R', 'Rv']) : [],
    inside: isMoist ? ['es'] : [],
    notedAt: isMoist ? { es: given => [given('temperatureFirst'), given('temperatureSecond')] } : {},
    remarks: hand => isMoist ? [supersaturated(relative(hand))] : [],
    working: (hand, result) => {
      const T = mixedTemperature(hand), m1 = massOf(hand, first), m2 = massOf(hand, second)
      const temperatureStep = { text: 'Temperature of the mixture, by mass', formula: 'T = \\frac{m_1 T_1 + m_2 T_2}{m_1 + m_2}', filled: `T = \\frac{${texNumber(m1)} \\cdot ${texNumber(hand.given('temperatureFirst'), 6)} + ${texNumber(m2)} \\cdot ${texNumber(hand.given('temperatureSecond'), 6)}}{${texNumber(m1)} + ${texNumber(m2)}} = ${texQuantity(T, 'K', 6)} = ${inCelsius(T)}`, value: T, unit: 'K' }
      if (!isMoist) return [temperatureStep]
      const e = mixedVaporPressure(hand)
      const vaporStep = {
        text: hand.variant === 'mean-vapor-pressure' ? 'Vapor pressure of the mixture, by mass' : 'Vapor pressure of the mixture: the vapor is kept',
        formula: hand.variant === 'mean-vapor-pressure' ? 'e = \\frac{m_1 e_1 + m_2 e_2}{m_1 + m_2}' : 'q = \\frac{m_1 q_1 + m_2 q_2}{m_1 + m_2},\\ e = \\frac{q\\,p}{\\varepsilon + (1 - \\varepsilon)\\,q}',
        filled: `e_1 = ${inHectopascal(vaporOf(hand, first))},\\ e_2 = ${inHectopascal(vaporOf(hand, second))},\\ e = ${inHectopascal(e)}`, value: e, unit: 'Pa',
      }
      if (part === 'vapor-pressure') return [vaporStep]
      return [temperatureStep, vaporStep, { text: 'Over saturation at the temperature of the mixture; above 100 % it is supersaturated', formula: '\\mathit{RH} = \\frac{e}{e_s(T)}', filled: `\\mathit{RH} = \\frac{${texNumber(e / 100)}}{${texNumber(hand.air.es(T) / 100)}} = ${texQuantity(result * 100, '%')}` }]
    },
    slips,
  })
}
