/**
 * The form of every quantity: one definition that marking, authoring, the handbook and the evaluator read.
 * SI inside. Numbers carry their unit by the definition: `unit` is the UCUM code of the SI value.
 */

/** How a quantity's numbers behave. A temperature has an arbitrary zero, a difference has not; near zero only absolute widths make sense. A class is no number. */
export type NumberKind = 'temperature' | 'difference' | 'ratio' | 'fraction' | 'class'

export interface InputDefinition {
  name: string
  /** As printed in an ask and in a form: "air temperature". */
  label: string
  symbol: string
  /** UCUM code of the SI value: K, Pa, m, J/kg … */
  unit: string
  /** UCUM code in which people meet it: Cel, hPa, km … */
  shownUnit: string
  kind: NumberKind
  shape: 'number' | 'series'
  /** Inclusive, in SI. */
  range: readonly [number, number]
  isOptional?: true
  /** Enters no value, only what a slip would give: an ask does not name it. */
  isForSlips?: true
  /** What a series must satisfy: a fit needs no order, an integration does. */
  needs?: { least: number, order?: 'none' | 'ascending' | 'descending' }
  /** A student's own earlier value that is at most this far from zero makes the rest trivial (a lapse rate of 0) and is not carried. */
  trivialWithin?: number
}

export type InputValue = number | readonly number[]
export type Inputs = Readonly<Record<string, InputValue>>

/** Constants by the convention's names, SI: cp, cv, R, g, p0, zeroCelsius, neutralTolerance; kappa where it is not R/cp. */
export type Constants = Readonly<Record<string, number>>

/** What a convention says beyond a variant's stated range: compute and show the known error, take the next variant that holds there, or refuse. */
export type BeyondRange = 'compute' | 'next' | 'refuse'

/**
 * How the other quantities that enter are computed: the vapor pressure inside a relative humidity, the latent heat inside a saturated
 * lapse rate. Variant keys by quantity key; the first variant of a definition where none is named.
 */
export interface Formulae { variants: Readonly<Record<string, string>>, beyond: BeyondRange }

/** "None", "not reached" and "not defined" are answers in their own right. */
export type Outcome =
  | { is: 'value', value: number, notes?: readonly string[], more?: Readonly<Record<string, number>> }
  | { is: 'class', key: string, notes?: readonly string[], more?: Readonly<Record<string, number>> }
  | { is: 'none' | 'not_reached' | 'not_defined', why: string }

export interface Source {
  /** With equation or table number: "AMS Glossary, potential temperature". */
  text: string
  status: 'verified' | 'common practice' | 'from memory'
}

export interface Variant {
  key: string
  label: string
  source: Source
  /** Where it holds, and its known error, in words. */
  validity: string
  knownError: string
  /** The stated range, by input, inclusive, in SI: what lies outside is treated as the convention says. An input's own range is the physical one. */
  holds?: Readonly<Record<string, readonly [number, number]>>
  /** @throws {OutOfRangeError | MissingInputError | SeriesError} */
  evaluate: (inputs: Inputs, constants: Constants, formulae: Formulae) => Outcome
}

/** One line of the working: what is done, the formula, and the same with numbers put in. TeX. `value` is in `unit`; the last line's is the value in SI. */
export interface TraceStep { text: string, formula: string, filled: string, value?: number, unit?: string }

/** A known way to go wrong that reproduces a value. */
export interface Slip {
  key: string
  /**
   * A gross slip always differs (a sign, a unit). A fine one shrinks to nothing with good data (a fit turned round): where it comes within
   * one unit of the last digit asked, it makes no difference and says nothing against the band. A constant's (273 for 273.15) is as small as
   * the spread of accepted constants: it is named where it alone explains a value, and says nothing against the band.
   */
  weight: 'gross' | 'fine' | 'constant'
  /** For the class view: "sign turned round". */
  label: string
  /** For the student, in a sentence; may use {value} and {unit}. */
  sentence: string
  /** What one gets by this slip, SI; null where it makes no difference or cannot be made. */
  apply: (inputs: Inputs, constants: Constants, right: number, formulae: Formulae) => number | null
}

export interface QuantityDefinition {
  /** kebab-case, American spelling. */
  key: string
  name: string
  symbol: string
  /** UCUM code of the SI result. */
  unit: string
  /** UCUM code in which it is asked and shown unless an author says otherwise. */
  shownUnit: string
  kind: NumberKind
  /** Below this size (SI) digits are counted as if the value had it, and a relative width is refused. For quantities that pass through zero. */
  nearZero?: number
  /** A wind's direction, 0 to a full turn: 0° and 360° are one answer. */
  isDirection?: true
  inputs: readonly InputDefinition[]
  /** The first is the default. */
  variants: readonly Variant[]
  /** Constants of the convention that enter. */
  constants: readonly string[]
  /** Keys of the quantities whose variant enters the value, those inside them included. */
  uses?: readonly string[]
  /** What is to be said beside the value: a formula inside it beyond its stated range, supersaturation. */
  notes?: (inputs: Inputs, constants: Constants, formulae: Formulae) => readonly string[]
  /** Values at which the answer's class changes, SI, from the convention: Γd, Γm. */
  classLimits?: (inputs: Inputs, constants: Constants, formulae: Formulae) => readonly { label: string, value: number }[]
  /** The classes of an answer that is a class and not a number (static stability). */
  classes?: readonly { key: string, label: string, alsoTyped?: readonly string[] }[]
  /** What is asked, with sign and method, in a sentence without the inputs: "The lapse rate Γ = −∂T/∂z, positive where temperature falls with height, …" */
  ask: string
  trace: (inputs: Inputs, constants: Constants, variant: string, formulae: Formulae) => readonly TraceStep[]
  slips: readonly Slip[]
  /** One worked example in SI with the default convention, repeated by a test: the handbook's calculator starts from it. */
  example: { inputs: Inputs, gives: number | string, within: number }
}

/** Quantities that a course meets together: a chapter of the handbook. */
export interface QuantityGroup { key: string, title: string, quantities: readonly QuantityDefinition[] }
