import type { Convention } from '../thermo/convention'
import type { Inputs, TraceStep } from '../thermo/definition'

export type { Alternative, Convention } from '../thermo/convention'

/** A typed value as it was read. `valueSi` is in the SI unit of the asked quantity. */
export interface ReadAnswer {
  typed: string
  reading: 'ok' | 'class' | 'none' | 'not_reached' | 'not_defined' | 'empty' | 'unreadable' | 'wrong_dimension' | 'ambiguous'
  /** For a class: its place in the quantity's `classes`. */
  valueSi: number | null
  /** The typed number converted to the asked unit as an exact decimal, so that a band's edge is compared in decimals. */
  decimal: string | null
  unitUcum: string | null
  /** Significant digits as typed, in the student's favor. */
  digits: number | null
  /** Half a unit of the last typed digit, SI. Never widens the student's own band; is carried into later ones. */
  halfUnitSi: number | null
  /** "read as −9.6 K km⁻¹", or what is wrong and what is asked. */
  message: string
}

export interface Granted { absoluteSi?: number, relative?: number }

/** Everything that a judgement rests on: kept with the mark, so that it can be made again. */
export interface StepQuestion {
  quantity: string
  /** Pins a variant; otherwise the convention's. */
  variant?: string
  /** From the share, the text and constants; SI. */
  inputs: Inputs
  convention: Convention
  granted: Granted
  /** Significant digits asked for. */
  digits: number
  /** UCUM code in which the step asks. */
  unit: string
  maxMilli: number
  /** Part of the marks for a named slip, in thousandths; 0 unless the author grants it. */
  slipMilli?: number
  /** Inputs that come from the student's own earlier steps. Judged on the true value and on this, the better counts. */
  carried?: Readonly<Record<string, { valueSi: number, halfUnitSi: number } | { notCarried: string }>>
  /** Part of `maxMilli` that a right value earns only with the digits asked. */
  digitsMilli?: number
  /** A value within so many half-widths of the band that no slip explains earns part. */
  near?: { widths: number, milli: number }
  /** Half a division of the axis from which an input was read off, SI, by input; `result` for the value itself. */
  readOff?: Readonly<Record<string, number>>
  /** Where the student read an instrument of their own: what either may be off, SI. */
  accuracy?: { stationSi: number, ownSi: number }
  /** Half a unit of what the student read on an instrument of their own and goes on from, SI, by input: it is in no data, so its digits are all there is. */
  ownRead?: Readonly<Record<string, number>>
  /** In place of a quantity: options of which one or several are right. `quantity` then is `choice`. */
  choice?: { options: readonly { key: string, label: string }[], right: readonly string[], why: readonly string[] }
  /** What rulings have added: a slip that counts as right here, an interval, or a variant. */
  accepted?: readonly Accepted[]
}

export type Accepted =
  | { kind: 'slip', slip: string, ruling: string }
  | { kind: 'value', lowSi: number, highSi: number, ruling: string }
  | { kind: 'variant', variant: string, ruling: string }

/** One contribution to the band's width, named, with what it adds below and above the reference (SI, both ≥ 0). */
export interface BandPart { key: 'granted' | 'formulae' | 'rounding' | 'carried' | 'reading' | 'accepted', label: string, below: number, above: number }

export interface Band {
  /** SI doubles. */
  center: number
  low: number
  high: number
  /** Decimals in `unit`, rounded outwards to 1e-9 relative: what the typed decimal is compared with, edge included. */
  lowDecimal: string
  highDecimal: string
  unit: string
  parts: readonly BandPart[]
}

export interface Judgement {
  outcome: 'value' | 'class' | 'none' | 'not_reached' | 'not_defined' | 'refused'
  refusalCode: string | null
  /** What was refused and why, or why there is no value; for the author, and for the worked value. */
  reason: string | null
  /** Classes that earn the marks, by key, the reference's own first; empty unless outcome is class. */
  classes: readonly string[]
  /** The band of the true value; null unless outcome is value. */
  band: Band | null
  /** The band of the value that follows from the student's own earlier one, where it was carried. */
  carriedBand: Band | null
  carriedNote: string | null
  isAccepted: boolean
  /** Which of the two bands (or a ruling) the value lies in. */
  acceptedBy: 'band' | 'carried' | 'ruling' | 'word' | null
  /** The one slip that alone explains the value; null where two do equally, or the band does. */
  slip: { key: string, label: string, sentence: string, value: number } | null
  /** Values of every slip that can be made here, for the height bar and the proof run. */
  slipValues: readonly { key: string, label: string, value: number }[]
  pointsMilli: number
  trace: readonly TraceStep[]
  notes: readonly string[]
}
