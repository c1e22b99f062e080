// npm run bench [-- --json] [--short] [--only P5,P5/cpu] [--plant]: ratios against their bars; exit 0 only when all are met.
// --plant measures each on a build with a bug in it that must take it over its bar: a figure that still passes then sees nothing.
import { plantedBuild } from '../faults/plantedBuild'
import { whyNoTracer } from '../fixtures/tracer'
import { figureOf, type Figure, type Ratio } from './ratio'
import { ratios } from './registry'

const has = (flag: string) => process.argv.includes(flag)
const asJson = has('--json')
const onlyAt = process.argv.indexOf('--only')
const only = onlyAt === -1 ? null : (process.argv[onlyAt + 1] ?? '').split(',')
const nameOf = ({ id, part }: { id: string, part?: string }) => part === undefined ? id : `${id}/${part}`
const isAsked = (ratio: Ratio, name: string) => name === ratio.id || name === nameOf(ratio)

const unknown = only?.filter(name => !ratios.some(ratio => isAsked(ratio, name))) ?? []
if (unknown.length > 0) stop(`There is no figure ${unknown.join(', ')}; there are ${ratios.map(nameOf).join(', ')}.`)
const missing = whyNoTracer()
if (missing !== null) stop(missing)

const figures: Figure[] = []
for (const ratio of ratios.filter(each => only === null || only.some(name => isAsked(each, name)))) {
  const planted = has('--plant') && ratio.plant !== 'own' ? plantedBuild(ratio.plant) : null
  const rounds = await ratio.measure({ isShort: has('--short'), isPlanted: has('--plant'), ...(planted ? { entry: planted.entry } : {}) }).finally(planted?.remove)
  const figure = figureOf(ratio, rounds)
  figures.push(figure)
  if (asJson) console.log(JSON.stringify(figure))
  else {
    console.log(`${nameOf(figure).padEnd(16)} ${String(figure.ratio).padStart(8)}  bar ${String(figure.bar).padEnd(5)} ${figure.ok ? 'ok ' : 'BAD'}  spread ${figure.spread.toFixed(2)}  ${ratio.says}`)
    console.log(`${''.padEnd(16)} ${rounds.map(({ numerator, denominator }) => `${short(numerator)}/${short(denominator)}`).join('  ')}`)
  }
}
const isWell = figures.every(figure => figure.ok)
if (!asJson) console.log(`figures=${figures.length} ok=${isWell}`)
process.exit(isWell ? 0 : 1)

function short(value: number): string {
  return String(Number(value.toPrecision(3)))
}

function stop(why: string): never {
  console.error(why)
  process.exit(2)
}
