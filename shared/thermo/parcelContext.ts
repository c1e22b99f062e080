/** What the quantities of one sounding share: it is made ready once for a set of constants and formulae, and each parcel lifted once. */
import type { Constants, Formulae, InputDefinition, Inputs } from './definition'
import { lclFunction, lclTemperatureKey, type LiftingCondensationLevel } from './liftingCondensation'
import { numberOf } from './inputs'
import { moistAir, type MoistAir } from './moistAir'
import { mixedLayerParcel, mostUnstableParcel, statedParcel, surfaceParcel, type Parcel } from './parcel'
import { lift, type Ascent } from './parcelAscent'
import { soundingInputs, soundingOf, surfacePressureInput, type Sounding } from './sounding'

export type Origin = 'surface' | 'mixed-layer' | 'most-unstable' | 'stated'

export const equivalentKey = 'equivalent-potential-temperature'
/** What any ascent rests on. */
export const ascentConstants: readonly string[] = ['cp', 'R', 'Rv', 'g', 'kappa', 'latentHeat', 'cpv', 'cw', 'enhancementFactor']
export const ascentUses: readonly string[] = ['saturation-vapor-pressure', 'latent-heat-of-vaporization', lclTemperatureKey]

export const mixedLayerDepthInput: InputDefinition = { name: 'mixedLayerDepth', label: 'depth of the layer that the parcel is the mean of', symbol: 'Δp', unit: 'Pa', shownUnit: 'hPa', kind: 'difference', shape: 'number', range: [500, 40_000] }
const statedInputs: readonly InputDefinition[] = [
  { name: 'parcelPotentialTemperature', label: 'potential temperature of the parcel', symbol: 'θ_p', unit: 'K', shownUnit: 'K', kind: 'temperature', shape: 'number', range: [230, 360] },
  { name: 'parcelMixingRatio', label: 'mixing ratio of the parcel', symbol: 'w_p', unit: 'kg/kg', shownUnit: 'g/kg', kind: 'ratio', shape: 'number', range: [0.00001, 0.05], trivialWithin: 0 },
]

export interface OriginInWords { title: string, short: string, ask: string, inputs: readonly InputDefinition[] }

export const origins: Readonly<Record<Origin, OriginInWords>> = {
  'surface': { title: 'surface parcel', short: 'the surface parcel', ask: 'the parcel of the lowest row at or above the ground', inputs: [...soundingInputs, surfacePressureInput] },
  'mixed-layer': {
    title: 'mixed-layer parcel', short: 'the mixed-layer parcel',
    ask: 'the parcel with the means of θ and w over the lowest layer of the given depth (weighted by pressure, trapezoids between rows, θ and w linear in ln p), started at the pressure of the ground',
    inputs: [...soundingInputs, mixedLayerDepthInput, surfacePressureInput],
  },
  'most-unstable': { title: 'most unstable parcel', short: 'the most unstable parcel', ask: 'the parcel of the row with the largest θe within 300 hPa above the ground', inputs: [...soundingInputs, surfacePressureInput] },
  'stated': { title: 'parcel with stated θ and w', short: 'the stated parcel', ask: 'the parcel with the given θ and w, started at the pressure of the ground', inputs: [...soundingInputs, ...statedInputs, surfacePressureInput] },
}

export class ParcelContext {
  readonly air: MoistAir
  readonly sounding: Sounding
  private readonly lclOf: (temperature: number, dewpoint: number, pressure: number) => LiftingCondensationLevel
  private readonly parcels = new Map<Origin, Parcel | null>()
  private readonly ascents = new Map<string, Ascent | null>()

  constructor(private readonly inputs: Inputs, readonly constants: Constants, readonly formulae: Formulae) {
    this.air = moistAir(constants, formulae)
    this.sounding = soundingOf(inputs, this.air)
    this.lclOf = lclFunction(constants, formulae)
  }

  /** Null where the data end within the layer that the parcel is the mean of. */
  parcel(origin: Origin): Parcel | null {
    const known = this.parcels.get(origin)
    if (known !== undefined) return known
    const made = this.makeParcel(origin)
    this.parcels.set(origin, made)
    return made
  }

  private makeParcel(origin: Origin): Parcel | null {
    const { sounding, air, inputs } = this
    switch (origin) {
      case 'surface': return surfaceParcel(sounding)
      case 'mixed-layer': return mixedLayerParcel(sounding, numberOf(inputs, 'mixedLayerDepth'), air)
      case 'most-unstable': return mostUnstableParcel(sounding, air, this.formulae.variants[equivalentKey])
      case 'stated': return statedParcel(numberOf(inputs, 'parcelPotentialTemperature'), numberOf(inputs, 'parcelMixingRatio'), sounding.pressure[0] ?? 0, air)
    }
  }

  lcl(parcel: Parcel): LiftingCondensationLevel {
    return this.lclOf(parcel.temperature, parcel.dewpoint, parcel.pressure)
  }

  ascent(origin: Origin, isVirtual: boolean): Ascent | null {
    const key = `${origin} ${isVirtual}`
    const known = this.ascents.get(key)
    if (known !== undefined) return known
    const parcel = this.parcel(origin)
    const made = parcel && lift(this.sounding, parcel, this.lcl(parcel), isVirtual, this.air)
    this.ascents.set(key, made)
    return made
  }
}

/** Contexts of the inputs in hand: a judgement asks for one many times. Inputs are never changed by those who hold them. */
const made = new WeakMap<Inputs, ParcelContext[]>()
const mostKept = 64

export function parcelContext(inputs: Inputs, constants: Constants, formulae: Formulae): ParcelContext {
  const kept = made.get(inputs) ?? []
  const known = kept.find(one => one.constants === constants && one.formulae === formulae)
  if (known) return known
  const context = new ParcelContext(inputs, constants, formulae)
  if (kept.length >= mostKept) kept.shift()
  kept.push(context)
  made.set(inputs, kept)
  return context
}
