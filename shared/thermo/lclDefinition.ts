/** The lifting condensation level: its temperature, its pressure, its height above the start. One calculation, three quantities. */
import type { QuantityDefinition } from './definition'
import { lclFunction, lclTemperatureKey, type LiftingCondensationLevel } from './liftingCondensation'
import { dewpointInput, pressureInput, temperatureInput } from './moistInputs'
import { foggy, moistQuantity, type Hand, type MoistSlip, type MoistVariant } from './moistQuantity'
import { inCelsius, inHectopascal } from './moistTex'
import { texNumber, texQuantity } from './tex'

interface LclQuantity extends Pick<QuantityDefinition, 'key' | 'name' | 'symbol' | 'unit' | 'shownUnit' | 'kind' | 'ask' | 'example' | 'nearZero'> {
  part: keyof LiftingCondensationLevel
  more?: readonly MoistVariant[]
  slips: readonly MoistSlip[]
}

/** The level as the question's own variant computes it. */
export const lclOf = ({ given, constants, formulae, variant }: Hand): LiftingCondensationLevel => lclFunction(constants, formulae, variant)(given('temperature'), given('dewpoint'), given('pressure'))

const solution: Readonly<Record<string, { text: string, formula: string }>> = {
  bolton: { text: 'Temperature at the level, by Bolton’s equation 15', formula: 'T_L = \\frac{1}{\\frac{1}{T_d - 56} + \\frac{\\ln(T/T_d)}{800}} + 56' },
  romps: { text: 'Temperature at the level, by Romps’ closed form', formula: 'T_L = c\\,\\left[W_{-1}\\left(\\mathit{RH}^{1/a}\\,c\\,e^{c}\\right)\\right]^{-1} T' },
  solved: { text: 'Where the mixing ratio is that of saturation along the dry adiabat, found by a bracket', formula: 'w_s\\left(T_L,\\ p\\,(T_L/T)^{1/\\kappa}\\right) = w' },
}

export function lclDefinition({ part, more = [], slips, ...named }: LclQuantity): QuantityDefinition {
  const value = (hand: Hand) => lclOf(hand)[part]
  const bolton: MoistVariant = { key: 'bolton', label: 'Bolton (1980), Eq. 15', source: { text: 'Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 15', status: 'verified' }, validity: 'temperatures of −35 to 35 °C', knownError: '0.1 K, 0.8 hPa; the height by the dry rate 1 % low', holds: { temperature: [238.15, 308.15] }, value }
  const romps: MoistVariant = { key: 'romps', label: 'Romps (2017), Eq. 22', source: { text: 'Romps (2017), J. Atmos. Sci. 74, 3891–3900, Eq. 22, with its constants', status: 'verified' }, validity: 'unsaturated air', knownError: '5 m', value }
  const solved: MoistVariant = { key: 'solved', label: 'w = wₛ along the dry adiabat', source: { text: 'AMS Glossary of Meteorology, "lifting condensation level", solved by a bracket', status: 'common practice' }, validity: 'unsaturated air', knownError: '0.1 K by the formula of eₛ; the height by the dry rate 1 % low', value }
  return moistQuantity({
    ...named,
    inputs: [pressureInput, temperatureInput, dewpointInput],
    // the height of the vapor's own heat capacity first: the dry one leaves it 1 % low
    variants: [...part === 'heightAboveStart' ? [romps, bolton] : [bolton, romps], solved, ...more],
    constants: part === 'heightAboveStart' ? ['R', 'Rv', 'cp', 'g', 'kappa'] : ['R', 'Rv', 'cp', 'kappa'],
    inside: ['es'],
    remarks: ({ given }) => [foggy(given('temperature'), given('dewpoint'))],
    working: (hand, value) => {
      const { given, air, variant } = hand
      if (variant === 'espy') return [{ text: 'The 125 m per kelvin rule', formula: 'z_L = 125\\,(T - T_d)', filled: `z_L = 125 \\cdot ${texNumber(given('temperature') - given('dewpoint'))} = ${texQuantity(value, 'm')}` }]
      const lcl = lclOf(hand), how = solution[variant] ?? solution.bolton
      const first = { text: how?.text ?? '', formula: how?.formula ?? '', filled: `T_L = ${texQuantity(lcl.temperature, 'K', 6)} = ${inCelsius(lcl.temperature)}`, value: lcl.temperature, unit: 'K' }
      const exponent = variant === 'romps' ? 'c_{pm}/R_m' : '1/\\kappa'
      if (part === 'temperature') return [first]
      if (part === 'pressure') return [first, { text: 'Along the dry adiabat, with the temperatures in kelvin', formula: `p_L = p\\left(\\frac{T_L}{T}\\right)^{${exponent}}`, filled: `p_L = ${texNumber(given('pressure') / 100, 6)}\\left(\\frac{${texNumber(lcl.temperature, 6)}}{${texNumber(given('temperature'), 6)}}\\right)^{${exponent}} = ${inHectopascal(value)}` }]
      return [first, { text: 'At the dry adiabatic lapse rate, above the parcel’s start', formula: variant === 'romps' ? 'z_L = \\frac{c_{pm}}{g}\\,(T - T_L)' : 'z_L = \\frac{c_p}{g}\\,(T - T_L)', filled: `z_L = ${variant === 'romps' ? '\\frac{c_{pm}}{g}' : `\\frac{${texNumber(air.cp, 6)}}{${texNumber(air.g, 6)}}`} \\cdot ${texNumber(given('temperature') - lcl.temperature)} = ${texQuantity(value, 'm')}` }]
    },
    slips,
  })
}

export { lclTemperatureKey }
