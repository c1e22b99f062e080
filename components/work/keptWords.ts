import type { DraftField } from '~/stores/draft'
import type { ShapeName, Tone } from '../sheet/shapes'

/** Whether the server has what stands in a field, as a shape and a word. */
export function keptWords({ state, saved }: DraftField, zone: string): { shape: ShapeName, tone: Tone, word: string } {
  if (state === 'saved') return saved.savedAt && saved.typed !== '' ? { shape: 'disk', tone: 'moss', word: `saved ${clockInZone(saved.savedAt, zone)}` } : { shape: 'ring', tone: 'pencil', word: 'not begun' }
  if (state === 'typing' || state === 'saving') return { shape: 'ring', tone: 'pencil', word: 'saving' }
  if (state === 'no_connection') return { shape: 'half', tone: 'brass', word: 'kept in this browser' }
  if (state === 'conflict') return { shape: 'triangle', tone: 'brass', word: 'two texts' }
  return { shape: 'cross', tone: 'alarm', word: 'not saved' }
}
