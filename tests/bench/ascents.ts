/** What is measured of ascents and of equivalent potential temperatures: here, and by the plain C program beside it. */
import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { formulaeOf } from '#shared/marking/alternatives'
import { exp, pow } from '#shared/numerics/elementary'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { equivalentPotentialTemperature } from '#shared/thermo/equivalentPotential'
import { lclFunction } from '#shared/thermo/liftingCondensation'
import { moistAir, type MoistAir } from '#shared/thermo/moistAir'
import { mixedLayerParcel, mostUnstableParcel, surfaceParcel } from '#shared/thermo/parcel'
import { lift, type Ascent } from '#shared/thermo/parcelAscent'
import { makeSounding, roomForSounding, type Sounding } from '#shared/thermo/sounding'

const { constants } = defaultConvention, formulae = formulaeOf(defaultConvention)
const source = fileURLToPath(new URL('./ascent.c', import.meta.url))

export interface Columns { pressure: number[], temperature: number[], dewpoint: number[] }

/** An invented warm afternoon from 1000 to 100 hPa, in so many levels. */
export function afternoon(levels: number): Columns {
  const pressure = Array.from({ length: levels }, (_, at) => Math.round(100_000_000 * exp(-2.3 * at / (levels - 1))) / 1000)
  const temperature = pressure.map((p) => {
    const level = p / 100_000
    const lapsing = 303 * pow(0.9, 0.2857) * pow(level / 0.9, 0.178) + 1.5 * Math.max(0, 1 - (0.9 - level) / 0.15)
    return Number((level > 0.9 ? 303 * pow(level, 0.2857) : Math.max(205, lapsing)).toFixed(2))
  })
  const dewpoint = pressure.map((p, at) => Number((p > 90_000 ? 294.5 - 12 * (1 - p / 100_000) : (temperature[at] ?? 0) - 6 - 40 * (0.9 - p / 100_000)).toFixed(2)))
  return { pressure, temperature, dewpoint }
}

/** Air that is made of the convention anew at each use of its saturation vapor pressure: right, and slow. What a bench must see. */
const lookedUpEachTime = (air: MoistAir): MoistAir => ({ ...air, es: temperature => moistAir(constants, formulae).es(temperature) })

export class Ascents {
  private readonly air: MoistAir
  private readonly lclOf = lclFunction(constants, formulae)
  private readonly room: Sounding
  constructor(private readonly columns: Columns, private readonly isPlanted = false) {
    const air = moistAir(constants, formulae)
    this.air = isPlanted ? lookedUpEachTime(air) : air
    this.room = roomForSounding(columns.pressure.length)
  }

  /** The sounding made ready, and its surface, mixed-layer and most unstable parcels lifted with virtual correction. */
  three(moved: number): Ascent[] {
    const { pressure, temperature, dewpoint } = this.columns
    const first = temperature[0] ?? 0
    temperature[0] = first + moved
    const sounding = makeSounding(pressure, temperature, dewpoint, this.air, Infinity, this.room)
    const mixed = mixedLayerParcel(sounding, 10_000, this.air)
    if (!mixed) throw new Error('The sounding is too short for its mixed layer.')
    const found = [surfaceParcel(sounding), mixed, mostUnstableParcel(sounding, this.air)].map(one => lift(sounding, one, this.lclOf(one.temperature, one.dewpoint, one.pressure), true, this.air))
    temperature[0] = first
    return found
  }

  /** CPU seconds of so many repeats. */
  time(repeats: number): number {
    const start = process.cpuUsage()
    for (let n = 0; n < repeats; n++) this.three(1e-6 * (n % 1000))
    return seconds(start)
  }

  /** The equivalent potential temperature at a million points: CPU seconds, and the sum of all. The bug planted is a convention read anew for each point. */
  million(): { seconds: number, sum: number } {
    const start = process.cpuUsage()
    let sum = 0
    if (this.isPlanted) for (let n = 0; n < 1_000_000; n++) sum += moistAir(constants, formulae).kappa
    sum = 0
    for (let n = 0; n < 1_000_000; n++) sum += equivalentPotentialTemperature(250 + 50 * (n / 1_000_000), 245 + 48 * (n / 1_000_000), 70_000 + 30_000 * ((n % 1000) / 1000), this.air)
    return { seconds: seconds(start), sum }
  }
}

export function seconds(start: NodeJS.CpuUsage): number {
  const { user, system } = process.cpuUsage(start)
  return (user + system) / 1e6
}

export interface InC { ascents: number, thetas: number, thetaSum: number, found: number[] }

/** Which exp, log and pow the C program has: those of the product in C (elementary.h), step by step, or those of the C library. */
export type FunctionsInC = 'same' | 'library'

/** The C program, compiled with -O2, on the same sounding. */
export class AscentsInC {
  private readonly dir = mkdtempSync(join(tmpdir(), 'tetherhouse-ascent-'))
  private readonly program = join(this.dir, 'ascent')
  private readonly file = join(this.dir, 'sounding.txt')
  constructor({ pressure, temperature, dewpoint }: Columns, functions: FunctionsInC) {
    // products and sums are not contracted: the same bits are asked of both
    execFileSync('gcc', ['-O2', '-ffp-contract=off', ...functions === 'same' ? ['-DSAME'] : [], '-o', this.program, source, '-lm'])
    const { cp, R, Rv, g } = constants
    writeFileSync(this.file, [`${cp} ${R} ${Rv} ${g} ${moistAir(constants, formulae).kappa}`, pressure.length, ...pressure.map((p, at) => `${p} ${temperature[at]} ${dewpoint[at]}`)].join('\n'))
  }

  run(repeats: number): InC {
    return JSON.parse(execFileSync(this.program, [this.file, String(repeats)], { encoding: 'utf8' }))
  }

  remove(): void {
    rmSync(this.dir, { recursive: true, force: true })
  }
}

/** @throws {Error} where the two do not agree: to the bit with the same functions, to nine digits with those of a library */
export function assertSame(ours: readonly number[], theirs: readonly number[], functions: FunctionsInC): void {
  if (ours.length !== theirs.length) throw new Error(`${ours.length} results here, ${theirs.length} in C`)
  ours.forEach((value, at) => {
    const other = theirs[at] ?? NaN
    if (functions === 'same' ? !Object.is(value, other) : !(Math.abs(value - other) <= 1e-9 * Math.abs(other))) throw new Error(`Result ${at} is ${value} here and ${other} in C.`)
  })
}

export const numbersOf = (ascents: readonly Ascent[]): number[] => ascents.flatMap(({ lcl, lfc, el, cape, cin }) => [lcl.pressure, lfc ?? NaN, el ?? NaN, cape, cin])
