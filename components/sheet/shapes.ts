/** One set of shapes for states, quality flags and plans. Each is drawn on 14 × 14. */
export interface Shape { path?: string, line?: string, fill?: true, width?: number, dash?: string, circle?: number }

export const shapes = {
  disk: { circle: 4.6, fill: true }, // right, saved, kept
  ring: { circle: 4.4 }, // empty
  half: { circle: 4.4, path: 'M7 2.6a4.4 4.4 0 0 1 0 8.8z' }, // in part, lagging, offline
  triangle: { line: 'M7 2 12.4 11.6H1.6z' }, // look, stuck, moved
  cross: { line: 'M2.5 2.5l9 9M11.5 2.5l-9 9', width: 2 }, // wrong, spike, refused, erased
  box: { line: 'M2.5 2.5h9v9h-9z', dash: '3 1.8' }, // missing
  diamond: { line: 'M7 1.5 12.5 7 7 12.5 1.5 7z' }, // disputed, clock
  ruled: { path: 'M7 1.5 12.5 7 7 12.5 1.5 7z', fill: true }, // ruled
  dash: { line: 'M3.5 7h7', width: 2 }, // good
  arrow: { line: 'M1 7h11M8.5 3.5 12 7l-3.5 3.5' }, // carried
  plus: { line: 'M7 2v10M2 7h10', width: 1.8 }, // new
  down: { line: 'M3.5 5.5 7 9l3.5-3.5' },
} as const satisfies Record<string, Shape>

export type ShapeName = keyof typeof shapes
export type Tone = 'moss' | 'brass' | 'alarm' | 'sky' | 'pencil' | 'ink'

/** The shape that a notice wears when none is named. */
export const shapeOfTone: Record<Tone, ShapeName> = { moss: 'disk', brass: 'triangle', alarm: 'cross', sky: 'plus', pencil: 'ring', ink: 'diamond' }
