import type { BeyondRange } from './definition'

/** A named, versioned, sourced set of constants and variants that a course teaches with. One that does not close (cp − cv = R) is refused. */
export interface Convention {
  key: string
  title: string
  source: string
  constants: Readonly<Record<string, number>>
  /** Which variant of a quantity is taught; the first of its definition where it is not named. */
  variants: Readonly<Record<string, string>>
  /** Beyond the stated range of a variant; computed, with a note, where it is not said. */
  beyond?: BeyondRange
  /** Constants and variants that earn the marks as well: the hull of their values is the formula part of the band. */
  accepted: readonly Alternative[]
}

export interface Alternative {
  label: string
  /** What it is an alternative in: one of each group can hold at once (another cp with another vapor pressure), two of a group cannot. */
  group?: string
  /** Put over the convention's own. Where cp or R are among them and kappa is not, kappa is R/cp again. */
  constants?: Readonly<Record<string, number>>
  /** Quantity key → variant key. */
  variants?: Readonly<Record<string, string>>
}
