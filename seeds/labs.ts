import { readdirSync, readFileSync } from 'node:fs'
import type { LabBody, SupplyItem } from '#shared/schemas/lab'
import { readyLabs, type LibraryTexts } from '../server/domain/labs/library/readyLabs'

/** The ready labs that the demo's courses took. */
export type ReadyLab = 'morning-inversion' | 'weighing-a-layer' | 'heated-layer' | 'lid-comes-off'

const folder = new URL('../content/labs/', import.meta.url)

/** The texts of the library, by key. */
export function libraryTexts(): LibraryTexts {
  return new Map(readdirSync(folder).filter(name => name.endsWith('.md')).map(name => [name.replace(/\.md$/, ''), readFileSync(new URL(name, folder), 'utf8')]))
}

/** A ready lab with the flights and layers from which its shares are drawn. */
export function readyLab(key: ReadyLab, supply: readonly SupplyItem[]): LabBody {
  const found = readyLabs(libraryTexts()).find(lab => lab.key === key)
  if (!found) throw new Error(`The library has no lab ${key}.`)
  return { ...found.body, supply: [...supply] }
}

/** Layers of a flight's way up, by their bounds in meters. */
export const layersOf = (versionId: string, bounds: readonly (readonly [number, number])[]): SupplyItem[] => bounds.map(([lowM, highM]) => ({ versionId, leg: 'up' as const, lowM, highM }))

/** In the inversion of the early flights; in what floats of it on the middle ones; above it, where the residual layer ends under the cap. */
export const layers = {
  inversion: [[0, 80], [0, 100], [10, 120], [20, 110], [20, 90]],
  deep: [[10, 210], [20, 260], [40, 300], [100, 340]],
  floating: [[60, 120], [65, 130], [70, 125]],
} as const
