import type { LabBody } from '#shared/schemas/lab'
import { readLabFile } from '../labFile/readLabFile'

/** A lab that comes with the program: ready to be taken, given dates and posted. */
export interface ReadyLab { key: string, body: LabBody }

/** The texts of the library by key; wherever they lie, they are read like a text that an author brings. */
export type LibraryTexts = ReadonlyMap<string, string>

/** @throws {Error} when a text of the library is no lab: a fault of the program, not of whoever asks */
export function readyLabs(texts: LibraryTexts): ReadyLab[] {
  return [...texts].map(([key, text]) => {
    const { body, faults } = readLabFile(text)
    if (!body) throw new Error(`The ready lab ${key} cannot be read: line ${faults[0]?.line ?? 0}, ${faults[0]?.message ?? ''}`)
    return { key, body }
  }).sort((a, b) => a.key < b.key ? -1 : 1)
}
