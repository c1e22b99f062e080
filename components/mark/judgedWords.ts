import type { JudgedAs } from '#shared/schemas/marks'
import type { ShapeName, Tone } from '../sheet/shapes'

/** How a value came out, as a shape and a word. */
export const judgedTag: Record<JudgedAs, { word: string, shape: ShapeName, tone: Tone }> = {
  within: { word: 'within', shape: 'disk', tone: 'moss' },
  right: { word: 'right', shape: 'disk', tone: 'moss' },
  accepted: { word: 'accepted by a ruling', shape: 'ruled', tone: 'moss' },
  above: { word: 'above', shape: 'cross', tone: 'alarm' },
  below: { word: 'below', shape: 'cross', tone: 'alarm' },
  wrong: { word: 'not right', shape: 'cross', tone: 'alarm' },
  empty: { word: 'empty', shape: 'ring', tone: 'pencil' },
  not_read: { word: 'could not be read', shape: 'cross', tone: 'alarm' },
  not_judged: { word: 'not judged', shape: 'triangle', tone: 'brass' },
}
