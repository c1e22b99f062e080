import type { Plant } from '../faults/plantedBuild'

/** One round's raw numbers. */
export interface Round { numerator: number, denominator: number }

/** A figure without a machine in it: what something costs over what it costs at best, both measured here. */
export interface Ratio {
  id: string
  /** Where an id has several figures. */
  part?: string
  /** What is divided by what, in words. */
  says: string
  /** The highest value that passes; the least, where more is better. */
  bar: number
  isMoreBetter?: true
  /** Makes the denominator again. */
  command: string
  /** A bug in the built server that takes it over its bar: were it not seen, the figure would see nothing. "own": the measure plants one itself. */
  plant: Plant | 'own'
  /** Numerator and denominator by turns, so that what else the machine does meets both; `entry` is another built server than the one in place. */
  measure: (given: { isShort: boolean, entry?: string, isPlanted?: boolean }) => Promise<Round[]>
}

export interface Figure { id: string, part?: string, ratio: number, bar: number, ok: boolean, rounds: number, spread: number, numerator: number, denominator: number, command: string }

/** The median round decides; spread is how far the rounds lie apart, over the median. */
export function figureOf({ id, part, bar, isMoreBetter, command }: Ratio, rounds: readonly Round[]): Figure {
  const ratios = rounds.map(round => round.numerator / round.denominator)
  const ratio = median(ratios)
  if (!Number.isFinite(ratio) || ratio <= 0) throw new Error(`${id} ${part ?? ''}: ${JSON.stringify(rounds)} is no measurement.`)
  return {
    id, ...(part === undefined ? {} : { part }), ratio: rounded(ratio), bar, ok: isMoreBetter ? ratio >= bar : ratio <= bar, rounds: rounds.length, spread: rounded((Math.max(...ratios) - Math.min(...ratios)) / ratio),
    numerator: rounded(median(rounds.map(round => round.numerator))), denominator: rounded(median(rounds.map(round => round.denominator))), command,
  }
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b)
  const [low, high] = [sorted[Math.floor((sorted.length - 1) / 2)], sorted[Math.ceil((sorted.length - 1) / 2)]]
  if (low === undefined || high === undefined) throw new Error('There is no median of nothing.')
  return (low + high) / 2
}

const rounded = (value: number): number => Number(value.toPrecision(4))
