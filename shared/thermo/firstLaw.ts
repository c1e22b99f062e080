/**
 * The first law for dry air, per kilogram and for a given mass: the definitions of one process differ by a coefficient and a sign.
 *
 *   q = Δu + w     w is the work done by the air, q the heat that it takes up
 *   isobaric:   q = Δh = cp ΔT,  w = R ΔT,  Δu = cv ΔT
 *   isochoric:  q = Δu = cv ΔT,  w = 0,  Δh = cp ΔT
 *   adiabatic:  q = 0,  Δu = cv ΔT,  Δh = cp ΔT,  w = −cv ΔT,  T₂ = T₁ (p₂/p₁)^κ
 *   polytropic: Δu = cv ΔT,  Δh = cp ΔT,  T₂ = T₁ (p₂/p₁)^((n−1)/n)     its work and heat: `polytropic.ts`
 *   isothermal: Δu = Δh = 0                                              its work and heat: `isothermal.ts`
 *
 * Source: AMS Glossary of Meteorology, "first law of thermodynamics"; coefficients by common practice.
 * Valid where the specific heats are constant (200–350 K, to 0.3 %). Limits: no water vapor, no phase change.
 */
import { pow } from '../numerics/elementary'
import { kelvin, pascal } from '../units/brands'
import { constant, kappaOf } from './constants'
import type { Constants, InputDefinition, Formulae, Inputs, QuantityDefinition, Slip, TraceStep } from './definition'
import { numberOf } from './inputs'
import { poissonTemperature } from './poisson'
import { joulesSlip, kilojoulesSlip, signSlip, slip, zeroCelsius } from './slips'
import { texFactor, texNumber, texQuantity } from './tex'

type Coefficient = 'cp' | 'cv' | 'R'
export type Process = 'isobaric' | 'isochoric' | 'isothermal' | 'adiabatic' | 'polytropic'
const texOf: Readonly<Record<Coefficient, string>> = { cp: 'c_p', cv: 'c_v', R: 'R' }
const printed: Readonly<Record<Coefficient, string>> = { cp: 'cp', cv: 'cv', R: 'R' }

export interface ProcessQuantity {
  key: string
  name: string
  symbol: string
  /** TeX of the symbol. */
  tex: string
  process: Exclude<Process, 'isothermal'>
  coefficient: Coefficient
  /** −1 for the work of an adiabatic process: w = −cv ΔT. */
  sign: 1 | -1
  ask: string
  /** For the sign slip: what the other sign means. */
  signSentence: string
  example: QuantityDefinition['example']
}

const temperature = (name: string, label: string, symbol: string): InputDefinition =>
  ({ name, label, symbol, unit: 'K', shownUnit: 'Cel', kind: 'temperature', shape: 'number', range: [100, 1000] })
const pressure = (name: string, label: string, symbol: string): InputDefinition =>
  ({ name, label, symbol, unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', shape: 'number', range: [1000, 1_000_000] })

const byTemperatures = [temperature('temperatureStart', 'temperature at the start', 'T₁'), temperature('temperatureEnd', 'temperature at the end', 'T₂')]
const pressures = [pressure('pressureStart', 'pressure at the start', 'p₁'), pressure('pressureEnd', 'pressure at the end', 'p₂')]
export const processInputs: Readonly<Record<Process, readonly InputDefinition[]>> = {
  isobaric: byTemperatures,
  isochoric: byTemperatures,
  isothermal: [temperature('temperature', 'temperature, which stays', 'T'), ...pressures],
  adiabatic: [temperature('temperatureStart', 'temperature at the start', 'T₁'), ...pressures],
  polytropic: [temperature('temperatureStart', 'temperature at the start', 'T₁'), ...pressures, { name: 'polytropicExponent', label: 'exponent n of p αⁿ = constant', symbol: 'n', unit: '1', shownUnit: '1', kind: 'ratio', shape: 'number', range: [0.2, 20] }],
}

const start = (inputs: Inputs) => numberOf(inputs, 'temperatureStart')

function endOf(process: ProcessQuantity['process'], inputs: Inputs, constants: Constants): number {
  if (process === 'isobaric' || process === 'isochoric') return numberOf(inputs, 'temperatureEnd')
  if (process === 'polytropic') return start(inputs) * pow(numberOf(inputs, 'pressureEnd') / numberOf(inputs, 'pressureStart'), polytropicPower(inputs))
  return poissonTemperature(kelvin(start(inputs)), pascal(numberOf(inputs, 'pressureStart')), pascal(numberOf(inputs, 'pressureEnd')), constants)
}

/** (n − 1)/n, the exponent of T₂ = T₁ (p₂/p₁)^((n−1)/n). */
export const polytropicPower = (inputs: Inputs): number => (numberOf(inputs, 'polytropicExponent') - 1) / numberOf(inputs, 'polytropicExponent')

/** ΔT of the process, K. */
export const changeOf = (process: ProcessQuantity['process'], inputs: Inputs, constants: Constants): number => endOf(process, inputs, constants) - start(inputs)

/** The definition per kilogram, J kg⁻¹. */
export function perKilogram(of: ProcessQuantity): QuantityDefinition {
  const value = (inputs: Inputs, constants: Constants) => of.sign * constant(constants, of.coefficient) * changeOf(of.process, inputs, constants)
  return {
    key: of.key,
    name: of.name,
    symbol: of.symbol,
    unit: 'J/kg',
    shownUnit: 'kJ/kg',
    kind: 'difference',
    nearZero: 1000,
    inputs: processInputs[of.process],
    variants: [{
      key: 'first-law',
      label: `${of.sign < 0 ? '−' : ''}${printed[of.coefficient]} ΔT`,
      source: { text: 'AMS Glossary of Meteorology, "first law of thermodynamics"', status: 'common practice' },
      validity: '200–350 K, where the specific heats of dry air are constant',
      knownError: 'cp 1004 to 1005.7: 0.17 %',
      evaluate: (inputs, constants) => ({ is: 'value', value: value(inputs, constants) }),
    }],
    constants: of.process === 'adiabatic' ? ['cp', 'cv', 'R', 'kappa'] : [of.coefficient],
    ask: of.ask,
    trace: (inputs, constants) => processTrace(of, inputs, constants, value(inputs, constants)),
    slips: processSlips(of),
    example: of.example,
  }
}

/** The same for a given mass, J: another dimension, and so another quantity. */
export function forGivenMass(base: QuantityDefinition, name: string, example: QuantityDefinition['example']): QuantityDefinition {
  const withoutMass = (inputs: Inputs): Inputs => Object.fromEntries(Object.entries(inputs).filter(([key]) => key !== 'mass'))
  const mass = (inputs: Inputs) => numberOf(inputs, 'mass')
  return {
    ...base,
    key: `${base.key}-of-mass`,
    name,
    symbol: base.symbol.replace('q', 'Q').replace('w', 'W').replace('u', 'U').replace('h', 'H'),
    unit: 'J',
    shownUnit: 'kJ',
    inputs: [{ name: 'mass', label: 'mass of air', symbol: 'm', unit: 'kg', shownUnit: 'kg', kind: 'ratio', shape: 'number', range: [1e-6, 1e9] }, ...base.inputs],
    variants: base.variants.map(variant => ({
      ...variant,
      label: `mass times ${variant.label}`,
      evaluate: (inputs, constants, formulae) => {
        const outcome = variant.evaluate(withoutMass(inputs), constants, formulae)
        return outcome.is === 'value' ? { ...outcome, value: mass(inputs) * outcome.value } : outcome
      },
    })),
    ask: base.ask.replace(' per kilogram of dry air', ' for the whole mass of dry air, not per kilogram'),
    trace(inputs, constants, variant, formulae) {
      const steps = base.trace(withoutMass(inputs), constants, variant, formulae)
      const last = steps[steps.length - 1]
      const perKg = last?.value ?? 0
      const total = mass(inputs) * perKg
      return [...steps, { text: 'For the whole mass', formula: 'm \\cdot (\\text{value per kilogram})', filled: `${texNumber(mass(inputs))} \\cdot ${texFactor(perKg / 1000)}\\,\\mathrm{kJ} = ${texQuantity(total / 1000, 'kJ')}`, value: total, unit: 'J' }]
    },
    slips: [
      ...base.slips.map(one => ({
        ...one,
        apply: (inputs: Inputs, constants: Constants, right: number, formulae: Formulae) => {
          const perKg = one.apply(withoutMass(inputs), constants, right / mass(inputs), formulae)
          return perKg === null ? null : perKg * mass(inputs)
        },
      })),
      slip('mass-left-out', 'mass left out', 'This is the value for one kilogram: multiply it by the mass.', (inputs, _c, right) => mass(inputs) === 1 || right === 0 ? null : right / mass(inputs)),
      slip('mass-divided', 'divided by the mass', 'This is divided by the mass where it has to be multiplied.', (inputs, _c, right) => mass(inputs) === 1 || right === 0 ? null : right / mass(inputs) / mass(inputs)),
    ],
    example,
  }
}

function processTrace(of: ProcessQuantity, inputs: Inputs, constants: Constants, value: number): TraceStep[] {
  const steps = changeSteps(of.process, inputs, constants)
  const change = changeOf(of.process, inputs, constants)
  const minus = of.sign < 0 ? '-' : ''
  steps.push({
    text: 'First law', formula: `${of.tex} = ${minus}${texOf[of.coefficient]}\\,\\Delta T`,
    filled: `${of.tex} = ${minus}${texNumber(constant(constants, of.coefficient), 6)} \\cdot ${texFactor(change)} = ${texQuantity(value / 1000, 'kJ/kg')}`, value, unit: 'J/kg',
  })
  return steps
}

/** ΔT worked out: by what the process does to the temperature, then the difference. */
export function changeSteps(process: ProcessQuantity['process'], inputs: Inputs, constants: Constants): TraceStep[] {
  const steps: TraceStep[] = []
  const end = endOf(process, inputs, constants)
  if (process === 'adiabatic' || process === 'polytropic') {
    const [text, tex, exponent] = process === 'adiabatic' ? ['by Poisson’s relation', '\\kappa', kappaOf(constants)] as const : ['along p αⁿ = constant', '(n-1)/n', polytropicPower(inputs)] as const
    steps.push({
      text: `Temperature at the end, ${text}`, formula: `T_2 = T_1 \\left(\\frac{p_2}{p_1}\\right)^{${tex}}`,
      filled: `T_2 = ${texNumber(start(inputs))} \\left(\\frac{${texNumber(numberOf(inputs, 'pressureEnd') / 100)}}{${texNumber(numberOf(inputs, 'pressureStart') / 100)}}\\right)^{${texNumber(exponent)}} = ${texQuantity(end, 'K', 6)}`, value: end, unit: 'K',
    })
  }
  const change = end - start(inputs)
  steps.push({ text: 'Change of temperature', formula: '\\Delta T = T_2 - T_1', filled: `\\Delta T = ${texNumber(end, 6)} - ${texNumber(start(inputs), 6)} = ${texQuantity(change, 'K')}`, value: change, unit: 'K' })
  return steps
}

function processSlips(of: ProcessQuantity): Slip[] {
  const other = (coefficient: Coefficient) => slip(`${coefficient.toLowerCase()}-for-${of.coefficient.toLowerCase()}`, `${printed[coefficient]} for ${printed[of.coefficient]}`,
    `This comes from ${printed[coefficient]} ΔT in place of ${printed[of.coefficient]} ΔT.`,
    (inputs, constants) => of.sign * constant(constants, coefficient) * changeOf(of.process, inputs, constants))
  const slips = [signSlip(of.signSentence), ...(['cp', 'cv', 'R'] as const).filter(one => one !== of.coefficient).map(other), joulesSlip, kilojoulesSlip]
  if (of.process === 'isobaric' || of.process === 'isochoric') {
    slips.push(slip('difference-as-temperature', '273.15 added to a difference', 'A difference of temperatures is the same in °C and in K: 273.15 is not added to it.', (inputs, constants, right) =>
      right + of.sign * constant(constants, of.coefficient) * zeroCelsius))
    return slips
  }
  const along = (end: (inputs: Inputs, constants: Constants) => number | null) => (inputs: Inputs, constants: Constants) => {
    const value = end(inputs, constants)
    return value === null || !Number.isFinite(value) ? null : of.sign * constant(constants, of.coefficient) * (value - start(inputs))
  }
  const ratio = (inputs: Inputs) => numberOf(inputs, 'pressureEnd') / numberOf(inputs, 'pressureStart')
  if (of.process === 'polytropic') {
    const ratioTo = (inputs: Inputs, exponent: number) => start(inputs) * pow(ratio(inputs), exponent)
    slips.push(
      slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C: the formula takes kelvin.', along(inputs => zeroCelsius + (start(inputs) - zeroCelsius) * pow(ratio(inputs), polytropicPower(inputs)))),
      slip('inverted-ratio', 'ratio of pressures turned round', 'This comes from p₁/p₂ in place of p₂/p₁.', along(inputs => ratioTo(inputs, -polytropicPower(inputs)))),
      slip('exponent-of-volume', 'n − 1 for (n − 1)/n', 'This takes the exponent n − 1, which belongs to the ratio of volumes; that of pressures has (n − 1)/n.', along(inputs => ratioTo(inputs, numberOf(inputs, 'polytropicExponent') - 1))),
      slip('adiabatic-exponent', 'adiabatic for polytropic', 'This takes the exponent R/cp of a dry adiabat: the process has its own n.', along((inputs, constants) => ratioTo(inputs, kappaOf(constants)))),
    )
    return slips
  }
  slips.push(
    slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperature in °C in Poisson’s relation, which takes kelvin.', along((inputs, constants) => zeroCelsius + (start(inputs) - zeroCelsius) * pow(ratio(inputs), kappaOf(constants)))),
    slip('inverted-ratio', 'ratio of pressures turned round', 'This comes from p₁/p₂ in place of p₂/p₁.', along((inputs, constants) => start(inputs) * pow(ratio(inputs), -kappaOf(constants)))),
    slip('inverted-exponent', 'exponent turned round', 'This comes from the exponent cp/R in place of R/cp.', along((inputs, constants) => start(inputs) * pow(ratio(inputs), 1 / kappaOf(constants)))),
  )
  return slips
}
