import { createHmac } from 'node:crypto'

const words = [
  'amber', 'anvil', 'apron', 'aspen', 'badge', 'barley', 'basin', 'beacon', 'birch', 'bramble', 'brook', 'candle', 'canvas', 'cedar', 'cellar', 'chalk',
  'cobble', 'copper', 'cotton', 'cradle', 'cricket', 'ember', 'fennel', 'ferry', 'flint', 'gable', 'garnet', 'granite', 'gravel', 'hazel', 'hollow', 'indigo',
  'juniper', 'kettle', 'ladder', 'lantern', 'linen', 'lumber', 'maple', 'marble', 'meadow', 'mortar', 'nettle', 'orchard', 'otter', 'paddle', 'pebble', 'pepper',
  'pillar', 'quarry', 'quiver', 'ribbon', 'saddle', 'shingle', 'sparrow', 'spruce', 'thimble', 'timber', 'turnip', 'velvet', 'walnut', 'willow', 'window', 'wicker',
] as const

/** The passphrase of one of the demo's people: four different words and a number, made from the demo's secret, which each installation draws for itself. */
export function demoPassphrase(secret: string, email: string): string {
  const drawn = createHmac('sha256', secret).update(email).digest()
  const left: string[] = [...words]
  const taken = [0, 1, 2, 3].flatMap(at => left.splice((drawn[at] ?? 0) % left.length, 1))
  return `${taken.join('-')}-${10 + (drawn[4] ?? 0) % 90}`
}
