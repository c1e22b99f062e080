/** The definitions of temperature, pressure and density of the standard atmosphere, by geopotential and by geometric height. */
import { exp } from '../numerics/elementary'
import { meter } from '../units/brands'
import { endUnitSlip, feetSlip } from './composedSlips'
import type { Inputs, QuantityDefinition, Slip, TraceStep } from './definition'
import { lengthInput } from './inputKinds'
import { numberOf } from './inputs'
import { oneFormula } from './oneFormula'
import { fineSlip, slip, zeroCelsius } from './slips'
import { geopotentialOfGeometric, lowestStandardHeight, standardAtmosphere, standardConstants, type StandardAir } from './standardAtmosphere'
import { texFactor, texNumber, texQuantity, worked } from './tex'

export interface StandardQuantity { key: string, name: string, symbol: string, of: keyof StandardAir, by: 'geopotential' | 'geometric', ask: string, example: QuantityDefinition['example'] }

const units = { temperature: ['K', 'Cel'], pressure: ['Pa', 'hPa'], density: ['kg/m3', 'kg/m3'] } as const
const { gravity, gasConstant, temperature: groundTemperature, pressure: groundPressure, earthRadius, top } = standardConstants
/** The tropopause of the standard, above which its temperature stays. */
const tropopause = 11_000

export function standardAtmosphereQuantity(of: StandardQuantity): QuantityDefinition {
  const isGeometric = of.by === 'geometric'
  const name = isGeometric ? 'geometricHeight' : 'geopotentialHeight'
  const [unit, shownUnit] = units[of.of]
  const heightOf = (inputs: Inputs) => (isGeometric ? geopotentialOfGeometric(meter(numberOf(inputs, name)), earthRadius) : meter(numberOf(inputs, name)))
  const value = (inputs: Inputs) => standardAtmosphere(heightOf(inputs))[of.of]
  return oneFormula({
    key: of.key, name: of.name, symbol: of.symbol, unit, shownUnit, kind: of.of === 'temperature' ? 'temperature' : 'ratio',
    inputs: [lengthInput(name, `${of.by} height above mean sea level`, isGeometric ? 'z' : 'H', [lowestStandardHeight, isGeometric ? 32_161 : top])],
    constants: [],
    formula: {
      key: 'standard', label: 'standard atmosphere', source: { text: 'ISO 2533:1975; ICAO Doc 7488/3 (1993); U.S. Standard Atmosphere 1976, Eqs. 23, 33a, 33b', status: 'verified' },
      validity: '−2 to 32 km, geopotential', knownError: 'R 287.05 for 287.05287: 0.03 % of the pressure',
    },
    ask: of.ask,
    value,
    working(inputs, _constants, result) {
      const height = heightOf(inputs), air = standardAtmosphere(height)
      const steps: TraceStep[] = []
      if (isGeometric) steps.push(worked('Geopotential height', 'H = \\frac{a\\,z}{a + z}', `H = \\frac{${texNumber(earthRadius, 7)} \\cdot ${texFactor(numberOf(inputs, name), 6)}}{${texNumber(earthRadius, 7)} + ${texFactor(numberOf(inputs, name), 6)}}`, height, 'm', undefined, 7))
      steps.push(...temperatureSteps(height, air))
      if (of.of !== 'temperature') steps.push(pressureStep(height, air))
      if (of.of === 'density') steps.push(worked('Density by the equation of state, with the standard’s R', '\\rho = \\frac{p}{R\\,T}', `\\rho = \\frac{${texNumber(air.pressure, 7)}}{${texNumber(gasConstant, 8)} \\cdot ${texNumber(air.temperature, 6)}}`, result, unit))
      return of.of === 'temperature' ? steps.map((step, at) => (at < steps.length - 1 ? step : { ...step, filled: `${step.filled} = ${texQuantity(result - zeroCelsius, 'Cel')}` })) : steps
    },
    slips: slipsOf(of, name, value, heightOf),
    example: of.example,
  })
}

function temperatureSteps(height: number, air: StandardAir): TraceStep[] {
  if (height <= tropopause) return [worked('Temperature: 6.5 K less for each geopotential kilometer', 'T = T_0 - 0.0065\\,H', `T = ${texNumber(groundTemperature, 6)} - 0.0065 \\cdot ${texFactor(height, 7)}`, air.temperature, 'K')]
  if (height <= 20_000) return [worked('Temperature: constant from 11 to 20 km', 'T', 'T', air.temperature, 'K')]
  return [worked('Temperature: 1 K more for each geopotential kilometer above 20 km', 'T = 216.65 + 0.001\\,(H - 20\\,000)', `T = 216.65 + 0.001 \\cdot (${texNumber(height, 7)} - 20\\,000)`, air.temperature, 'K')]
}

function pressureStep(height: number, air: StandardAir): TraceStep {
  const shown = { value: air.pressure / 100, unit: 'hPa' }
  if (height <= tropopause) {
    return worked('Pressure, hydrostatic with a constant lapse rate', 'p = p_0 \\left(\\frac{T}{T_0}\\right)^{g_0/(0.0065\\,R)}', `p = 1013.25 \\left(\\frac{${texNumber(air.temperature, 6)}}{${texNumber(groundTemperature, 6)}}\\right)^{${texNumber(gravity / (gasConstant * 0.0065), 6)}}`, air.pressure, 'Pa', shown)
  }
  const base = standardAtmosphere(meter(height <= 20_000 ? tropopause : 20_000))
  if (height <= 20_000) {
    return worked('Pressure, hydrostatic and isothermal above 11 km', 'p = p_{11} \\exp\\frac{-g_0\\,(H - 11\\,000)}{R\\,T}', `p = ${texNumber(base.pressure / 100, 6)} \\exp\\frac{-${texNumber(gravity, 6)} \\cdot (${texNumber(height, 7)} - 11\\,000)}{${texNumber(gasConstant, 8)} \\cdot 216.65}`, air.pressure, 'Pa', shown)
  }
  return worked('Pressure, hydrostatic with a constant lapse rate above 20 km', 'p = p_{20} \\left(\\frac{216.65}{T}\\right)^{g_0/(0.001\\,R)}', `p = ${texNumber(base.pressure / 100, 6)} \\left(\\frac{216.65}{${texNumber(air.temperature, 6)}}\\right)^{${texNumber(gravity / (gasConstant * 0.001), 6)}}`, air.pressure, 'Pa', shown)
}

function slipsOf(of: StandardQuantity, name: string, value: (inputs: Inputs) => number, heightOf: (inputs: Inputs) => number): Slip[] {
  const { of: what } = of
  const slips: Slip[] = [feetSlip(value, name)]
  if (what === 'temperature') {
    slips.push(
      slip('sign', 'warmed where it cools', 'The standard atmosphere is colder aloft: your value goes the other way.', (_i, _c, right) => 2 * groundTemperature - right),
      slip('dry-adiabat', '9.8 K km⁻¹ for 6.5', 'This comes from the dry adiabatic lapse rate: the standard atmosphere has 6.5 K km⁻¹.', inputs => groundTemperature - 0.0098 * heightOf(inputs)),
      slip('no-tropopause', '6.5 K km⁻¹ beyond 11 km', 'This goes on with 6.5 K km⁻¹ above 11 km, where the temperature of the standard atmosphere stays.', inputs => (heightOf(inputs) > tropopause ? groundTemperature - 0.0065 * heightOf(inputs) : null)),
      endUnitSlip('Cel'),
    )
    return slips
  }
  const isothermal = (inputs: Inputs, temperature: number) => groundPressure * exp(-gravity * heightOf(inputs) / (gasConstant * temperature)) / (what === 'density' ? gasConstant * standardAtmosphere(meter(heightOf(inputs))).temperature : 1)
  slips.push(
    slip('isothermal', 'one temperature throughout', 'This takes 288.15 K all the way up: the standard atmosphere is colder aloft.', inputs => isothermal(inputs, groundTemperature)),
    slip('local-temperature', 'temperature of the level for the mean', 'This takes the temperature at the level for the whole way to it.', inputs => isothermal(inputs, standardAtmosphere(meter(heightOf(inputs))).temperature)),
  )
  if (what === 'pressure') {
    slips.push(
      slip('from-1000', '1000 hPa at sea level', 'This starts from 1000 hPa: the standard atmosphere has 1013.25 hPa at sea level.', (_i, _c, right) => right * 100_000 / groundPressure),
      slip('pascal-for-hectopascal', 'Pa given as hPa', 'Your number is in pascal; the unit beside it says hectopascal.', (_i, _c, right) => right * 100),
    )
  }
  else {
    slips.push(
      slip('ground-temperature', 'temperature of the ground', 'This puts the temperature of the ground into the equation of state.', (inputs, _c, right) => right * standardAtmosphere(meter(heightOf(inputs))).temperature / groundTemperature),
      slip('hectopascal-for-pascal', 'hPa put in for Pa', 'This is what comes out with the pressure in hPa.', (_i, _c, right) => right / 100),
    )
  }
  if (of.by === 'geometric') slips.push(fineSlip('geometric-for-geopotential', 'geometric height taken as geopotential', 'This takes the geometric height for the geopotential one.', inputs => (numberOf(inputs, name) > top ? null : standardAtmosphere(meter(numberOf(inputs, name)))[what])))
  return slips
}
