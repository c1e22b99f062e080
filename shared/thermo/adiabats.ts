/**
 * Poisson's relations of dry air between any two of p, T and α along a dry adiabat, each solved for either.
 *
 *   T₂/T₁ = (p₂/p₁)^κ = (α₁/α₂)^(R/cv)     p₂/p₁ = (α₁/α₂)^(cp/cv)
 *
 * Source: AMS Glossary of Meteorology, "Poisson equation". All exponents follow from κ: R/cv = κ/(1 − κ), cp/cv = 1/(1 − κ).
 * Valid where cp is constant (150–400 K, to 0.3 %). Limits: no water vapor, no phase change.
 */
import { pow } from '../numerics/elementary'
import { celsiusSlip, endUnitSlip, swappedSlip } from './composedSlips'
import { kappaOf } from './constants'
import type { Constants, InputDefinition, Inputs, NumberKind, QuantityDefinition, Slip } from './definition'
import { numberOf } from './inputs'
import { pressureInput, specificVolumeInput, temperatureInput } from './inputKinds'
import { oneFormula } from './oneFormula'
import { slip, zeroCelsius } from './slips'
import { texNumber, worked } from './tex'

export type StateVariable = 'temperature' | 'pressure' | 'specificVolume'

interface Shown { symbol: string, tex: string, unit: string, shownUnit: string, factor: number, kind: NumberKind, name: string }
const shown: Readonly<Record<StateVariable, Shown>> = {
  temperature: { symbol: 'T₂', tex: 'T', unit: 'K', shownUnit: 'Cel', factor: 1, kind: 'temperature', name: 'temperature' },
  pressure: { symbol: 'p₂', tex: 'p', unit: 'Pa', shownUnit: 'hPa', factor: 100, kind: 'ratio', name: 'pressure' },
  specificVolume: { symbol: 'α₂', tex: '\\alpha', unit: 'm3/kg', shownUnit: 'm3/kg', factor: 1, kind: 'ratio', name: 'specific volume' },
}

/**
 * The exponent m in x₂ = x₁ (y₂/y₁)^m along a dry adiabat.
 * @example adiabaticExponent('pressure', 'temperature', { kappa: 2 / 7 }) // 3.5
 */
export function adiabaticExponent(of: StateVariable, from: StateVariable, constants: Constants): number {
  const kappa = kappaOf(constants)
  const ofTemperature: Readonly<Record<StateVariable, number>> = { temperature: 1, pressure: kappa, specificVolume: -kappa / (1 - kappa) }
  return ofTemperature[from] / ofTemperature[of]
}

/**
 * x₂ = x₁ (y₂/y₁)^m, the state at the end of a dry-adiabatic change.
 * @example adiabaticState('specificVolume', 0.84, 'pressure', 100000, 70000, { kappa: 2 / 7 }) // 1.08374 m³ kg⁻¹
 */
export function adiabaticState(of: StateVariable, start: number, from: StateVariable, fromStart: number, fromEnd: number, constants: Constants): number {
  return start * pow(fromEnd / fromStart, adiabaticExponent(of, from, constants))
}

const exponentTex: Readonly<Record<string, string>> = {
  'temperature pressure': 'R/c_p', 'pressure temperature': 'c_p/R', 'temperature specificVolume': '-R/c_v', 'specificVolume temperature': '-c_v/R',
  'pressure specificVolume': '-c_p/c_v', 'specificVolume pressure': '-c_v/c_p',
}

function input(variable: StateVariable, at: 'Start' | 'End'): InputDefinition {
  const when = at === 'Start' ? 'at the start' : 'at the end', index = at === 'Start' ? '₁' : '₂'
  if (variable === 'temperature') return temperatureInput(`temperature${at}`, `temperature ${when}`, `T${index}`)
  if (variable === 'pressure') return pressureInput(`pressure${at}`, `pressure ${when}`, `p${index}`)
  return specificVolumeInput(`specificVolume${at}`, `specific volume ${when}`, `α${index}`)
}

export interface AdiabaticRelation { key: string, name: string, of: StateVariable, from: StateVariable, ask: string, moreSlips?: readonly Slip[], example: QuantityDefinition['example'] }

/** The definition of one of the relations: x₂ from x₁, y₁ and y₂. */
export function adiabaticRelation({ key, name, of, from, ask, moreSlips = [], example }: AdiabaticRelation): QuantityDefinition {
  const names = { start: `${of}Start`, fromStart: `${from}Start`, fromEnd: `${from}End` }
  const value = (inputs: Inputs, constants: Constants) =>
    adiabaticState(of, numberOf(inputs, names.start), from, numberOf(inputs, names.fromStart), numberOf(inputs, names.fromEnd), constants)
  const x = shown[of], y = shown[from]
  return oneFormula({
    key, name, symbol: x.symbol, unit: x.unit, shownUnit: x.shownUnit, kind: x.kind,
    inputs: [input(of, 'Start'), input(from, 'Start'), input(from, 'End')],
    constants: ['R', 'cp', 'kappa'],
    formula: {
      key: 'poisson', label: 'Poisson’s relation', source: { text: 'AMS Glossary of Meteorology, "Poisson equation"', status: 'verified' },
      validity: '150–400 K, no water vapor', knownError: 'κ 0.2854 to 0.286: 0.02 % of the temperature for each 30 % of the pressure',
    },
    ask, value,
    working(inputs, constants, result) {
      const exponent = adiabaticExponent(of, from, constants)
      const start = numberOf(inputs, names.start) / x.factor, before = numberOf(inputs, names.fromStart) / y.factor, after = numberOf(inputs, names.fromEnd) / y.factor
      const power = exponentTex[`${of} ${from}`] ?? ''
      return [
        { text: 'Exponent', formula: power, filled: `${power} = ${texNumber(exponent)}`, value: exponent, unit: '1' },
        worked('Poisson’s relation, with temperatures in kelvin', `${x.tex}_2 = ${x.tex}_1 \\left(\\frac{${y.tex}_2}{${y.tex}_1}\\right)^{${power}}`, `${x.tex}_2 = ${texNumber(start, 6)} \\left(\\frac{${texNumber(after, 6)}}{${texNumber(before, 6)}}\\right)^{${texNumber(exponent)}}`, result, x.unit, { value: result / x.factor, unit: of === 'pressure' ? 'hPa' : x.unit }),
      ]
    },
    slips: [...relationSlips(of, from, names, value), ...moreSlips],
    example,
  })
}

function relationSlips(of: StateVariable, from: StateVariable, names: { start: string, fromStart: string, fromEnd: string }, value: (inputs: Inputs, constants: Constants) => number): Slip[] {
  const raised = (power: (exponent: number, constants: Constants) => number) => (inputs: Inputs, constants: Constants) => {
    const result = numberOf(inputs, names.start) * pow(numberOf(inputs, names.fromEnd) / numberOf(inputs, names.fromStart), power(adiabaticExponent(of, from, constants), constants))
    return Number.isFinite(result) ? result : null
  }
  const slips = [
    swappedSlip(value, names.fromStart, names.fromEnd, 'inverted-ratio', 'ratio turned round', 'This has the ratio of start and end turned round.'),
    slip('inverted-exponent', 'exponent turned round', 'This comes from the exponent turned round, its inverse.', raised(exponent => 1 / exponent)),
    slip('exponent-left-out', 'exponent left out', 'This takes the two in plain proportion: along a dry adiabat the ratio has an exponent.', raised(exponent => (exponent < 0 ? -1 : 1))),
  ]
  if (of === 'pressure' || of === 'temperature') {
    slips.push(slip('other-pair', 'exponent of another pair', 'This takes the exponent that belongs to another pair of p, T and α.', raised((exponent, constants) =>
      (exponent < 0 ? -1 : 1) * Math.abs(adiabaticExponent(of, from === 'specificVolume' ? (of === 'pressure' ? 'temperature' : 'pressure') : 'specificVolume', constants)))))
  }
  if (of === 'temperature') slips.push(celsiusSlip(value, names.start, 'Cel'), endUnitSlip('Cel'))
  if (from === 'temperature') {
    slips.push(slip('celsius-for-kelvin', 'Celsius put in for kelvin', 'This is what comes out with the temperatures in °C: the formula takes kelvin.', (inputs, constants) => {
      const before = numberOf(inputs, names.fromStart) - zeroCelsius, after = numberOf(inputs, names.fromEnd) - zeroCelsius
      if (!(before !== 0 && after / before > 0)) return null
      const result = numberOf(inputs, names.start) * pow(after / before, adiabaticExponent(of, from, constants))
      return Number.isFinite(result) ? result : null
    }))
  }
  return slips
}
