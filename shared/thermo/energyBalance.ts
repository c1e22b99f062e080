/**
 * The first law of dry air in three forms, each solved for any one of its terms, per kilogram:
 *
 *   internal energy   q = cv ΔT + w          w the work done by the air
 *   enthalpy          q = cp ΔT − α Δp       α the mean specific volume of a small change
 *   geopotential      q = cp ΔT + g Δz       in hydrostatic balance, where −α Δp = g Δz
 *
 * Source: AMS Glossary of Meteorology, "first law of thermodynamics"; the forms by common practice.
 * Valid where the specific heats are constant (200–350 K, to 0.3 %), and the second form where Δp is small beside p.
 */
import { constant } from './constants'
import { differenceAsTemperatureSlip } from './composedSlips'
import type { Constants, InputDefinition, Inputs, QuantityDefinition, Slip } from './definition'
import { numberOf } from './inputs'
import { lengthInput, specificEnergyInput, specificVolumeInput, temperatureChangeInput } from './inputKinds'
import { oneFormula } from './oneFormula'
import { joulesSlip, kilojoulesSlip, signSlip, slip } from './slips'
import { texFactor, texNumber, worked } from './tex'

export type Form = 'internal-energy' | 'enthalpy' | 'geopotential'
export type Term = 'heat' | 'temperatureChange' | 'other'

interface FormOf { coefficient: 'cp' | 'cv', formula: string, other: { name: string, tex: string }, inputs: readonly InputDefinition[] }
const forms: Readonly<Record<Form, FormOf>> = {
  'internal-energy': { coefficient: 'cv', formula: 'q = c_v\\,\\Delta T + w', other: { name: 'work', tex: 'w' }, inputs: [specificEnergyInput('work', 'work done by the air, per kilogram', 'w')] },
  'enthalpy': {
    coefficient: 'cp', formula: 'q = c_p\\,\\Delta T - \\alpha\\,\\Delta p', other: { name: 'pressureChange', tex: '\\Delta p' },
    inputs: [specificVolumeInput('specificVolume', 'mean specific volume', 'α'), { name: 'pressureChange', label: 'change of pressure', symbol: 'Δp', unit: 'Pa', shownUnit: 'hPa', kind: 'difference', shape: 'number', range: [-50_000, 50_000] }],
  },
  'geopotential': { coefficient: 'cp', formula: 'q = c_p\\,\\Delta T + g\\,\\Delta z', other: { name: 'heightDifference', tex: '\\Delta z' }, inputs: [lengthInput('heightDifference', 'change of height', 'Δz', [-20_000, 20_000])] },
}

/** What the other term is multiplied by: 1 for work, −α for a change of pressure, g for one of height. */
function weightOf(form: Form, inputs: Inputs, constants: Constants): number {
  if (form === 'internal-energy') return 1
  return form === 'enthalpy' ? -numberOf(inputs, 'specificVolume') : constant(constants, 'g')
}

/**
 * One term of the first law from the two others, SI: q, ΔT, or what stands beside cp ΔT or cv ΔT (w, Δp, Δz).
 * @example firstLawTerm('geopotential', 'temperatureChange', { heat: 0, heightDifference: 1000 }, { cp: 1004, g: 9.81 }) // −9.771 K
 */
export function firstLawTerm(form: Form, unknown: Term, inputs: Inputs, constants: Constants): number {
  const c = constant(constants, forms[form].coefficient), weight = weightOf(form, inputs, constants)
  if (unknown === 'heat') return c * numberOf(inputs, 'temperatureChange') + weight * numberOf(inputs, forms[form].other.name)
  if (unknown === 'temperatureChange') return (numberOf(inputs, 'heat') - weight * numberOf(inputs, forms[form].other.name)) / c
  return (numberOf(inputs, 'heat') - c * numberOf(inputs, 'temperatureChange')) / weight
}

export interface FirstLawQuantity { key: string, name: string, symbol: string, form: Form, unknown: Term, ask: string, signSentence: string, example: QuantityDefinition['example'] }

const unitsOf = (form: Form, unknown: Term): { unit: string, shownUnit: string, nearZero: number, factor: number } => {
  if (unknown === 'temperatureChange') return { unit: 'K', shownUnit: 'K', nearZero: 1, factor: 1 }
  if (unknown === 'heat' || form === 'internal-energy') return { unit: 'J/kg', shownUnit: 'kJ/kg', nearZero: 1000, factor: 1000 }
  return form === 'enthalpy' ? { unit: 'Pa', shownUnit: 'hPa', nearZero: 100, factor: 100 } : { unit: 'm', shownUnit: 'm', nearZero: 10, factor: 1 }
}

/** The definition of one form solved for one term. */
export function firstLawQuantity(of: FirstLawQuantity): QuantityDefinition {
  const { form, unknown } = of
  const shape = forms[form], { factor, ...units } = unitsOf(form, unknown)
  const value = (inputs: Inputs, constants: Constants) => firstLawTerm(form, unknown, inputs, constants)
  const tex = unknown === 'heat' ? 'q' : unknown === 'temperatureChange' ? '\\Delta T' : shape.other.tex
  return oneFormula({
    key: of.key, name: of.name, symbol: of.symbol, ...units, kind: 'difference',
    inputs: [
      ...(unknown === 'heat' ? [] : [specificEnergyInput('heat', 'heat taken up by the air, per kilogram', 'q')]),
      ...(unknown === 'temperatureChange' ? [] : [temperatureChangeInput()]),
      ...shape.inputs.filter(input => unknown !== 'other' || input.name !== shape.other.name),
    ],
    constants: form === 'geopotential' ? [shape.coefficient, 'g'] : [shape.coefficient],
    formula: {
      key: 'first-law', label: `first law, ${form === 'internal-energy' ? 'internal energy' : form === 'enthalpy' ? 'enthalpy' : 'enthalpy with geopotential'}`,
      source: { text: 'AMS Glossary of Meteorology, "first law of thermodynamics"', status: 'common practice' },
      validity: form === 'enthalpy' ? '200–350 K, Δp small beside p' : '200–350 K', knownError: 'cp 1004 to 1005.7: 0.17 % of the term with ΔT',
    },
    ask: of.ask, value,
    working(inputs, constants, result) {
      const c = constant(constants, shape.coefficient)
      const put = (name: string) => texFactor(numberOf(inputs, name), 6)
      const other = form === 'internal-energy' ? '' : form === 'enthalpy' ? `${texNumber(numberOf(inputs, 'specificVolume'))} \\cdot ` : `${texNumber(constant(constants, 'g'), 6)} \\cdot `
      const minus = form === 'enthalpy'
      const solved = {
        heat: { formula: shape.formula, filled: () => `q = ${texNumber(c, 6)} \\cdot ${put('temperatureChange')} ${minus ? '-' : '+'} ${other}${put(shape.other.name)}` },
        temperatureChange: { formula: `\\Delta T = \\frac{q ${minus ? '+ \\alpha\\,\\Delta p' : form === 'geopotential' ? '- g\\,\\Delta z' : '- w'}}{${shape.coefficient === 'cp' ? 'c_p' : 'c_v'}}`, filled: () => `\\Delta T = \\frac{${put('heat')} ${minus ? '+' : '-'} ${other}${put(shape.other.name)}}{${texNumber(c, 6)}}` },
        other: {
          formula: form === 'internal-energy' ? 'w = q - c_v\\,\\Delta T' : minus ? '\\Delta p = \\frac{c_p\\,\\Delta T - q}{\\alpha}' : '\\Delta z = \\frac{q - c_p\\,\\Delta T}{g}',
          filled: () => {
            const difference = `${put('heat')} - ${texNumber(c, 6)} \\cdot ${put('temperatureChange')}`
            if (form === 'internal-energy') return `w = ${difference}`
            return minus ? `\\Delta p = \\frac{${texNumber(c, 6)} \\cdot ${put('temperatureChange')} - ${put('heat')}}{${texNumber(numberOf(inputs, 'specificVolume'))}}` : `\\Delta z = \\frac{${difference}}{${texNumber(constant(constants, 'g'), 6)}}`
          },
        },
      }[unknown]
      return [worked(`First law, solved for ${unknown === 'heat' ? 'the heat' : unknown === 'temperatureChange' ? 'the change of temperature' : of.name}`, solved.formula, solved.filled(), result, units.unit, { value: result / factor, unit: tex === '\\Delta T' ? 'K' : units.shownUnit })]
    },
    slips: firstLawSlips(of, value),
    example: of.example,
  })
}

const leftOut: Readonly<Record<Form, string>> = {
  'internal-energy': 'This leaves out the term with the work.',
  'enthalpy': 'This leaves out the term α Δp, or takes Δp in hPa, which makes it a hundred times too small.',
  'geopotential': 'This leaves out the term g Δz, or takes Δz in km, which makes it a thousand times too small.',
}

function firstLawSlips({ form, unknown, signSentence }: FirstLawQuantity, value: (inputs: Inputs, constants: Constants) => number): Slip[] {
  const shape = forms[form]
  // with nothing to change there is no such slip; and where the other term is all there is, turning it is turning the result
  const changed = (name: string, change: (value: number) => number) => (inputs: Inputs, constants: Constants) =>
    (numberOf(inputs, name) === 0 ? null : value({ ...inputs, [name]: change(numberOf(inputs, name)) }, constants))
  const first = unknown === 'heat' ? 'temperatureChange' : 'heat'
  const otherTurned = (inputs: Inputs, constants: Constants) => (numberOf(inputs, first) === 0 ? null : changed(shape.other.name, x => -x)(inputs, constants))
  const otherCoefficient = shape.coefficient === 'cp' ? 'cv' : 'cp'
  const slips = [
    signSlip(signSentence),
    slip(`${otherCoefficient}-for-${shape.coefficient}`, `${otherCoefficient} for ${shape.coefficient}`, `This comes from ${otherCoefficient} where this form of the first law has ${shape.coefficient}.`, (inputs, constants) =>
      value(inputs, { ...constants, [shape.coefficient]: constant(constants, otherCoefficient) })),
  ]
  if (unknown !== 'other') {
    slips.push(
      slip('other-term-sign', 'sign of one term turned round', `This has the sign of the term with ${shape.other.name === 'work' ? 'the work' : shape.other.name === 'pressureChange' ? 'the change of pressure' : 'the change of height'} turned round.`, otherTurned),
      slip('other-term-left-out', 'one term left out', leftOut[form], changed(shape.other.name, () => 0)),
    )
  }
  else {
    slips.push(
      slip('heat-sign', 'sign of the heat turned round', 'This counts the heat taken up as given off.', (inputs, constants) => (numberOf(inputs, 'temperatureChange') === 0 ? null : changed('heat', q => -q)(inputs, constants))),
      slip('heat-left-out', 'heat left out', 'This leaves the heat out, as if the change were adiabatic.', changed('heat', () => 0)),
    )
  }
  if (unknown !== 'temperatureChange') slips.push(differenceAsTemperatureSlip(value, 'temperatureChange'))
  // with the heat in kJ its term all but vanishes: where leaving it out is a slip of its own, the two cannot be told apart
  if (unknown === 'temperatureChange') slips.push(slip('kilojoules-put-in', 'kJ put in for J', 'This comes from the heat in kJ beside constants in J.', changed('heat', q => q / 1000)))
  if (unitsOf(form, unknown).unit === 'J/kg') slips.push(joulesSlip, kilojoulesSlip)
  return slips
}
