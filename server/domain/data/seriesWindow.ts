import type { Read } from '../../db/writer'
import type { Observations } from '../../observations/chunks'
import { readSeries, type Series, type SeriesWindow } from '../../observations/pyramid'
import { rootOf } from './rootOf'

/** A window of a version as a plot of some width needs it. */
export async function seriesWindow(read: Read, observations: Observations, input: SeriesWindow & { versionId: string }): Promise<Series> {
  return readSeries(observations, await rootOf(read, input.versionId), input)
}
