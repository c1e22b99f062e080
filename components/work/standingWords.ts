import type { LabStanding } from '#shared/schemas/marks'
import type { ShapeName, Tone } from '../sheet/shapes'

/** Where a lab stands for a student, as a shape and a word. */
export const standingTag: Record<LabStanding, { word: string, shape: ShapeName, tone: Tone }> = {
  open: { word: 'due', shape: 'ring', tone: 'ink' },
  submitted: { word: 'handed in', shape: 'disk', tone: 'moss' },
  late_open: { word: 'past due, still open', shape: 'triangle', tone: 'brass' },
  missing: { word: 'missing', shape: 'box', tone: 'alarm' },
  excused: { word: 'excused', shape: 'dash', tone: 'pencil' },
  not_counted: { word: 'not counted', shape: 'dash', tone: 'pencil' },
  released: { word: 'marks released', shape: 'disk', tone: 'moss' },
  withdrawn: { word: 'withdrawn', shape: 'cross', tone: 'pencil' },
}
