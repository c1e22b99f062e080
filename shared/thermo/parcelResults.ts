/** What is asked of a lifted parcel: its levels, its energies and its lifted index. */
import { exp, log } from '../numerics/elementary'
import type { Inputs, Outcome, Slip, Source, Variant } from './definition'
import { parcelTemperatureAt } from './parcelAscent'
import { parcelContext, type Origin, type ParcelContext } from './parcelContext'
import { endOfData, energyStep, levelStep, type ParcelResult } from './parcelDefinition'
import { constantSlip, fineSlip, signSlip, slip } from './slips'
import { atPressure } from './sounding'
import { texFactor, texQuantity } from './tex'

const ln10 = 2.302585092994046
const glossary = (entry: string): Source => ({ text: `AMS Glossary of Meteorology, "${entry}"; rules stated in the ask`, status: 'common practice' })

type Ascending = Pick<Variant, 'key' | 'label' | 'validity' | 'knownError' | 'source'>
const pseudoadiabatic = (entry: string): Ascending => ({
  key: 'pseudoadiabatic', label: 'along the pseudoadiabat, liquid water', source: glossary(entry),
  validity: 'rows without gaps in falling pressure', knownError: 'latent heat by temperature or constant, up to 7 % of CAPE and 0.35 K in the lifted index',
})

/** The same result of another ascent: with the other treatment of moisture in density, or of the surface parcel. */
function otherAscents(of: (context: ParcelContext, origin: Origin, isVirtual: boolean) => Outcome, weigh: typeof fineSlip = fineSlip) {
  const valueOf = (inputs: Inputs, constants: Parameters<Slip['apply']>[1], formulae: Parameters<Slip['apply']>[3], origin: Origin, isVirtual: boolean) => {
    const context = parcelContext(inputs, constants, formulae)
    const outcome = of(context, origin, isVirtual)
    if (outcome.is !== 'value' || outcome.value === 0) return null
    // a level of free convection at the condensation level is told by the slip that takes the one for the other
    const lcl = context.ascent(origin, isVirtual)?.lcl.pressure ?? 0
    return Math.abs(outcome.value - lcl) <= 1e-9 * lcl ? null : outcome.value
  }
  return (origin: Origin, isVirtual: boolean): Slip[] => [
    isVirtual
      ? weigh('virtual-left-out', 'virtual correction left out', 'This leaves the virtual correction out: the ask takes the virtual temperature of parcel and surroundings.', (inputs, constants, _right, formulae) => valueOf(inputs, constants, formulae, origin, false))
      : weigh('virtual-put-in', 'virtual correction put in', 'This has the virtual correction in it: the ask takes the temperatures themselves.', (inputs, constants, _right, formulae) => valueOf(inputs, constants, formulae, origin, true)),
    ...origin === 'surface' ? [] : [fineSlip('surface-parcel', 'surface parcel in place of the one asked', 'This is the result of the surface parcel: the ask takes another one.', (inputs, constants, _right, formulae) => valueOf(inputs, constants, formulae, 'surface', isVirtual))],
  ]
}

function levelSlip(key: string, label: string, sentence: string, origin: Origin, isVirtual: boolean, level: 'lcl' | 'lfc' | 'el'): Slip {
  return fineSlip(key, label, sentence, (inputs, constants, _right, formulae) => {
    const ascent = parcelContext(inputs, constants, formulae).ascent(origin, isVirtual)
    return ascent && (level === 'lcl' ? ascent.lcl.pressure : ascent[level])
  })
}

export const lclPressureResult: ParcelResult = {
  key: 'lcl-pressure', name: 'pressure of the lifting condensation level', symbol: 'p_LCL', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', hasVirtual: false,
  ask: 'The pressure of the lifting condensation level of a parcel.',
  variants: [pseudoadiabatic('lifting condensation level')],
  outcome(context, origin) {
    const parcel = context.parcel(origin)
    return parcel ? { is: 'value', value: context.lcl(parcel).pressure } : endOfData(null) ?? { is: 'not_reached', why: '' }
  },
  trace: (_context, _origin, _isVirtual, value) => [levelStep('Pressure of the condensation level', 'p_{LCL}', value)],
  slips: origin => origin === 'surface' ? [] : [fineSlip('surface-parcel', 'surface parcel in place of the one asked', 'This is the level of the surface parcel: the ask takes another one.', (inputs, constants, _right, formulae) => {
    const context = parcelContext(inputs, constants, formulae), parcel = context.parcel('surface')
    return parcel && context.lcl(parcel).pressure
  })],
}

export const lclTemperatureResult: ParcelResult = {
  key: 'lcl-temperature', name: 'temperature at the lifting condensation level', symbol: 'T_LCL', unit: 'K', shownUnit: 'Cel', kind: 'temperature', hasVirtual: false,
  ask: 'The temperature at the lifting condensation level of a parcel.',
  variants: [pseudoadiabatic('lifting condensation level')],
  outcome(context, origin) {
    const parcel = context.parcel(origin)
    return parcel ? { is: 'value', value: context.lcl(parcel).temperature } : endOfData(null) ?? { is: 'not_reached', why: '' }
  },
  trace: (_context, _origin, _isVirtual, value) => [{ text: 'Temperature at the condensation level', formula: 'T_{LCL}', filled: `T_{LCL} = ${texQuantity(value, 'K', 6)}`, value, unit: 'K' }],
  slips: origin => origin === 'surface' ? [] : [fineSlip('surface-parcel', 'surface parcel in place of the one asked', 'This is the level of the surface parcel: the ask takes another one.', (inputs, constants, _right, formulae) => {
    const context = parcelContext(inputs, constants, formulae), parcel = context.parcel('surface')
    return parcel && context.lcl(parcel).temperature
  })],
}

function lfcOf(context: ParcelContext, origin: Origin, isVirtual: boolean): Outcome {
  const ascent = context.ascent(origin, isVirtual)
  if (ascent && ascent.lfc !== null) return { is: 'value', value: ascent.lfc }
  return endOfData(ascent) ?? { is: 'none', why: 'The parcel is nowhere warmer than its surroundings.' }
}

export const lfcResult: ParcelResult = {
  key: 'lfc', name: 'level of free convection', symbol: 'p_LFC', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', hasVirtual: true,
  ask: 'The pressure of the level of free convection, the lowest one at or above the condensation level where the parcel becomes warmer than its surroundings; "none" where it never does, "not reached" where the data end below 300 hPa before it does.',
  variants: [pseudoadiabatic('level of free convection')],
  outcome: lfcOf,
  trace: (_context, _origin, _isVirtual, value) => [levelStep('The lowest level at or above it where the parcel becomes warmer', 'p_{LFC}', value)],
  slips: (origin, isVirtual) => [
    levelSlip('lcl-for-lfc', 'condensation level for it', 'This is the lifting condensation level: the parcel is not free there yet.', origin, isVirtual, 'lcl'),
    levelSlip('el-for-lfc', 'equilibrium level for it', 'This is the equilibrium level, where the parcel becomes colder again.', origin, isVirtual, 'el'),
    ...otherAscents(lfcOf)(origin, isVirtual),
  ],
}

function elOf(context: ParcelContext, origin: Origin, isVirtual: boolean): Outcome {
  const ascent = context.ascent(origin, isVirtual)
  const end = endOfData(ascent)
  if (end || !ascent) return end ?? { is: 'none', why: '' }
  if (ascent.isWarmAtTop) return { is: 'not_reached', why: 'The parcel is still warmer than its surroundings at the top of the data.' }
  return ascent.el === null ? { is: 'none', why: 'There is no level of free convection, and so no equilibrium level.' } : { is: 'value', value: ascent.el }
}

export const elResult: ParcelResult = {
  key: 'el', name: 'equilibrium level', symbol: 'p_EL', unit: 'Pa', shownUnit: 'hPa', kind: 'ratio', hasVirtual: true,
  ask: 'The pressure of the equilibrium level, the highest one where the parcel becomes colder than its surroundings; "none" without a level of free convection, "not reached" where the data end while the parcel is warmer.',
  variants: [pseudoadiabatic('equilibrium level')],
  outcome: elOf,
  trace: (_context, _origin, _isVirtual, value) => [levelStep('The highest level where the parcel becomes colder', 'p_{EL}', value)],
  slips: (origin, isVirtual) => [
    levelSlip('lfc-for-el', 'level of free convection for it', 'This is the level of free convection: the equilibrium level is where the parcel becomes colder again.', origin, isVirtual, 'lfc'),
    // as small as the spread of accepted formulae
    ...otherAscents(elOf, constantSlip)(origin, isVirtual),
  ],
}

function capeOf(context: ParcelContext, origin: Origin, isVirtual: boolean, variant = 'whole'): Outcome {
  const ascent = context.ascent(origin, isVirtual)
  const end = endOfData(ascent)
  if (end || !ascent) return end ?? { is: 'not_reached', why: '' }
  if (!ascent.isWarmAtTop) return { is: 'value', value: ascent.cape }
  if (variant !== 'to-data-top') return { is: 'not_reached', why: `The data end at ${Math.round(ascent.top / 100)} hPa, below the equilibrium level: the area up to there is no CAPE.` }
  return { is: 'value', value: ascent.cape, notes: [`Up to the top of the data at ${Math.round(ascent.top / 100)} hPa, below the equilibrium level.`] }
}

export const capeResult: ParcelResult = {
  key: 'cape', name: 'convective available potential energy', symbol: 'CAPE', unit: 'J/kg', shownUnit: 'J/kg', kind: 'difference', nearZero: 50, hasVirtual: true,
  ask: 'CAPE = R ∫ (T_p − T_e) d ln p, the sum of the positive areas from the level of free convection to the equilibrium level, with zero crossings as nodes; positive area below the condensation level does not count; 0 without a level of free convection, "not reached" where the data end below the equilibrium level.',
  variants: [
    { ...pseudoadiabatic('convective available potential energy'), key: 'whole', label: 'to the equilibrium level, which the data have to reach' },
    { ...pseudoadiabatic('convective available potential energy'), key: 'to-data-top', label: 'to the equilibrium level or the top of the data, whichever is lower' },
  ],
  outcome: capeOf,
  trace(context, origin, isVirtual, value) {
    const ascent = context.ascent(origin, isVirtual)
    const steps = ascent && ascent.lfc !== null ? [levelStep('Level of free convection', 'p_{LFC}', ascent.lfc)] : []
    if (ascent && ascent.el !== null) steps.push(levelStep('Equilibrium level', 'p_{EL}', ascent.el))
    return [...steps, energyStep('Sum of the positive areas between them', '\\mathrm{CAPE} = R \\int \\max(0,\\,T_p - T_e)\\,d\\ln p', '\\mathrm{CAPE}', value)]
  },
  slips: (origin, isVirtual) => [
    slip('sign', 'sign turned round', 'CAPE is positive: it is energy that the parcel gains.', (_i, _c, right) => (right === 0 ? null : -right)),
    slip('base-ten', 'log₁₀ p for ln p', 'This integrates over log₁₀ p: the natural logarithm is needed.', (_i, _c, right) => (right === 0 ? null : right / ln10)),
    slip('no-energy', 'no energy found', 'Nothing was found here: the parcel does become warmer than its surroundings.', (_i, _c, right) => (right === 0 ? null : 0)),
    fineSlip('cin-added', 'CIN taken off', 'This is the whole area, with the negative one below taken off: CAPE is the positive area alone.', (inputs, constants, right, formulae) => {
      if (right === 0) return null
      const ascent = parcelContext(inputs, constants, formulae).ascent(origin, isVirtual)
      return ascent && right + ascent.cin
    }),
    ...otherAscents((context, from, withVirtual) => capeOf(context, from, withVirtual, 'to-data-top'))(origin, isVirtual),
  ],
}

function cinOf(context: ParcelContext, origin: Origin, isVirtual: boolean): Outcome {
  const ascent = context.ascent(origin, isVirtual)
  const end = endOfData(ascent)
  if (end || !ascent) return end ?? { is: 'not_reached', why: '' }
  return ascent.lfc === null ? { is: 'not_defined', why: 'There is no level of free convection that the parcel could be lifted to.' } : { is: 'value', value: ascent.cin }
}

export const cinResult: ParcelResult = {
  key: 'cin', name: 'convective inhibition', symbol: 'CIN', unit: 'J/kg', shownUnit: 'J/kg', kind: 'difference', nearZero: 10, hasVirtual: true,
  ask: 'CIN = R ∫ (T_p − T_e) d ln p, the sum of the negative areas from the start to the level of free convection, with its sign (CIN ≤ 0); negative area above does not count; "not defined" without a level of free convection.',
  variants: [pseudoadiabatic('convective inhibition')],
  outcome: cinOf,
  trace(context, origin, isVirtual, value) {
    const ascent = context.ascent(origin, isVirtual)
    return [
      ...ascent && ascent.lfc !== null ? [levelStep('Level of free convection', 'p_{LFC}', ascent.lfc)] : [],
      energyStep('Sum of the negative areas below it', '\\mathrm{CIN} = R \\int \\min(0,\\,T_p - T_e)\\,d\\ln p', '\\mathrm{CIN}', value),
    ]
  },
  slips: (origin, isVirtual) => [
    slip('sign', 'sign turned round', 'CIN is asked with its sign: it is energy that has to be spent, at most 0.', (_i, _c, right) => (right === 0 ? null : -right)),
    slip('base-ten', 'log₁₀ p for ln p', 'This integrates over log₁₀ p: the natural logarithm is needed.', (_i, _c, right) => (right === 0 ? null : right / ln10)),
    ...otherAscents(cinOf)(origin, isVirtual),
  ],
}

const indexPressure = 50_000

interface At500 { environment: number, parcel: number }

function at500(context: ParcelContext, origin: Origin, isVirtual: boolean): At500 | Outcome {
  const { sounding, air } = context
  const parcel = context.parcel(origin)
  if (!parcel) return endOfData(null) ?? { is: 'not_reached', why: '' }
  const environment = atPressure(sounding, isVirtual ? sounding.virtualTemperature : sounding.temperature, indexPressure)
  if (environment === null) return (sounding.pressure[0] ?? 0) < indexPressure ? { is: 'not_defined', why: 'The ground lies above 500 hPa.' } : { is: 'not_reached', why: 'The data end below 500 hPa.' }
  if (parcel.pressure < indexPressure) return { is: 'not_defined', why: 'The parcel starts above 500 hPa.' }
  return { environment, parcel: parcelTemperatureAt(parcel, context.lcl(parcel), indexPressure, isVirtual, air) }
}

function liftedIndexOf(context: ParcelContext, origin: Origin, isVirtual: boolean): Outcome {
  const found = at500(context, origin, isVirtual)
  return 'is' in found ? found : { is: 'value', value: found.environment - found.parcel }
}

export const liftedIndexResult: ParcelResult = {
  key: 'lifted-index', name: 'lifted index', symbol: 'LI', unit: 'K', shownUnit: 'K', kind: 'difference', nearZero: 1, hasVirtual: true,
  ask: 'The lifted index, the temperature of the surroundings less that of the parcel at 500 hPa: negative where the parcel is warmer; "not reached" where the data end below 500 hPa.',
  variants: [{ ...pseudoadiabatic('lifted index') }],
  outcome: liftedIndexOf,
  trace(context, origin, isVirtual, value) {
    const found = at500(context, origin, isVirtual)
    if ('is' in found) return []
    const parcelSymbol = isVirtual ? 'T_{v,p}' : 'T_p'
    return [
      { text: 'Parcel at 500 hPa', formula: parcelSymbol, filled: `${parcelSymbol} = ${texQuantity(found.parcel, 'K', 6)}`, value: found.parcel, unit: 'K' },
      { text: 'Surroundings less parcel', formula: `LI = ${isVirtual ? 'T_{v,e}' : 'T_e'} - ${parcelSymbol}`, filled: `LI = ${texQuantity(found.environment, 'K', 6)} - ${texQuantity(found.parcel, 'K', 6)} = ${texFactor(value)}\\,\\mathrm{K}`, value, unit: 'K' },
    ]
  },
  slips: (origin, isVirtual) => [
    signSlip('The lifted index is the surroundings less the parcel: negative where the parcel is warmer.'),
    fineSlip('dry-all-the-way', 'lifted dry all the way', 'This lifts the parcel dry all the way: above its condensation level it follows the pseudoadiabat.', (inputs, constants, _right, formulae) => {
      const context = parcelContext(inputs, constants, formulae), parcel = context.parcel(origin), found = at500(context, origin, isVirtual)
      if (!parcel || 'is' in found) return null
      const factor = isVirtual ? (1 + parcel.mixingRatio / context.air.epsilon) / (1 + parcel.mixingRatio) : 1
      return found.environment - parcel.temperature * exp(context.air.kappa * log(indexPressure / parcel.pressure)) * factor
    }),
    // as small as the spread of accepted formulae
    ...otherAscents(liftedIndexOf, constantSlip)(origin, isVirtual),
  ],
}
