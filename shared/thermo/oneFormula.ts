import type { Constants, Formulae, Inputs, QuantityDefinition, TraceStep, Variant } from './definition'

/** A quantity that has one formula: what is put in, what comes out, and how it is worked. */
export interface OneFormula extends Omit<QuantityDefinition, 'variants' | 'trace'> {
  formula: Omit<Variant, 'evaluate'>
  /** SI. @throws {OutOfRangeError} where the inputs do not go together */
  value: (inputs: Inputs, constants: Constants, formulae: Formulae) => number
  /** Ends in the value. */
  working: (inputs: Inputs, constants: Constants, value: number, formulae: Formulae) => readonly TraceStep[]
}

/** The definition of a quantity with one formula. */
export function oneFormula({ formula, value, working, ...rest }: OneFormula): QuantityDefinition {
  return {
    ...rest,
    variants: [{ ...formula, evaluate: (inputs, constants, formulae) => ({ is: 'value', value: value(inputs, constants, formulae) }) }],
    trace: (inputs, constants, _variant, formulae) => working(inputs, constants, value(inputs, constants, formulae), formulae),
  }
}
