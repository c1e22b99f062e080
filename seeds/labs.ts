import { readFileSync } from 'node:fs'
import { z } from 'zod'
import { labBody, type LabBody, type SupplyItem } from '#shared/schemas/lab'

/** The ready labs: a text in `content/labs/<key>.md`, its steps beside it. */
export const readyLabs = ['morning-inversion', 'weighing-a-layer', 'heated-layer', 'lid-comes-off'] as const
export type ReadyLab = (typeof readyLabs)[number]

const withoutSupply = z.object({ title: z.string(), steps: z.array(z.unknown()) })
const read = (name: string) => readFileSync(new URL(`../content/labs/${name}`, import.meta.url), 'utf8')

/** A ready lab with the flights and layers from which its shares are drawn. */
export function readyLab(key: ReadyLab, supply: readonly SupplyItem[]): LabBody {
  const { title, steps } = withoutSupply.parse(JSON.parse(read(`${key}.json`)))
  return labBody.parse({ title, text: read(`${key}.md`), steps, supply })
}

/** Layers of a flight's way up, by their bounds in meters. */
export const layersOf = (versionId: string, bounds: readonly (readonly [number, number])[]): SupplyItem[] => bounds.map(([lowM, highM]) => ({ versionId, leg: 'up' as const, lowM, highM }))

/** In the inversion of the early flights; in what floats of it on the middle ones; above it, where the residual layer ends under the cap. */
export const layers = {
  inversion: [[0, 80], [0, 100], [10, 120], [20, 110], [20, 90]],
  deep: [[10, 210], [20, 260], [40, 300], [100, 340]],
  floating: [[60, 120], [65, 130], [70, 125]],
} as const
