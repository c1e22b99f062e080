/**
 * A parcel lifted through a sounding: dry to its condensation level, along the pseudoadiabat above, and what its buoyancy adds up to.
 *
 *   CAPE = R ∫ max(0, T_p − T_e) d ln p  above the level of free convection,  CIN = R ∫ min(0, T_p − T_e) d ln p  from the start to it
 *
 * With virtual correction T stands for Tv on both sides. Source: AMS Glossary of Meteorology, "convective available potential energy",
 * "convective inhibition". Rules, which the asks state: the level of free convection is the lowest one at or above the condensation level
 * where the parcel becomes warmer; the equilibrium level is the highest one where it becomes colder; CAPE is the sum of the positive areas
 * between them, CIN of the negative areas below; positive area below the condensation level and negative area between positive ones count for nothing.
 *
 * The integration is deterministic: nodes at every row, at the condensation level, and in equal parts of ln p of at most 0.05 between; trapezoids
 * in ln p, with the zero crossings as nodes. The surroundings are linear in ln p between rows (T, or Tv).
 */
import { exp, log } from '../numerics/elementary'
import type { LiftingCondensationLevel } from './liftingCondensation'
import type { MoistAir } from './moistAir'
import type { Parcel } from './parcel'
import { longestStep, slopeAt } from './pseudoadiabat'
import type { Sounding } from './sounding'

export interface Ascent {
  lcl: LiftingCondensationLevel
  /** Pa; null where there is none in the data. */
  lfc: number | null
  /** Pa; null where there is none, or the data end below it. */
  el: number | null
  /** J kg⁻¹, up to the top of the data. */
  cape: number
  /** J kg⁻¹, ≤ 0; from the start to the level of free convection, or to the top of the data where there is none. */
  cin: number
  /** The parcel is still warmer at the top of the data. */
  isWarmAtTop: boolean
  /** Pa. */
  top: number
}

/** A parcel this close to its surroundings, K, is neither warmer nor colder: rounding of doubles about 300 K is 1e-13. */
const neutral = 1e-9

let room = 512
let nodeLog = new Float64Array(room)
let nodePressure = new Float64Array(room)
/** Of the surroundings, then the parcel's less theirs. */
let nodeExcess = new Float64Array(room)
let nodeCount = 0

function makeRoom(least: number): void {
  if (least <= room) return
  room = 2 * least
  nodeLog = new Float64Array(room)
  nodePressure = new Float64Array(room)
  nodeExcess = new Float64Array(room)
}

/** Adds the nodes from the last one to a level, in equal parts of ln p. */
function addSegment(toLog: number, toPressure: number, toColumn: number): void {
  const last = nodeCount - 1
  const fromLog = nodeLog[last] ?? 0, fromColumn = nodeExcess[last] ?? 0
  const whole = toLog - fromLog
  const parts = Math.ceil(-whole / longestStep)
  for (let n = 1; n < parts; n++) {
    const share = n / parts
    nodeLog[nodeCount] = fromLog + share * whole
    nodePressure[nodeCount] = exp(fromLog + share * whole)
    nodeExcess[nodeCount] = fromColumn + share * (toColumn - fromColumn)
    nodeCount++
  }
  nodeLog[nodeCount] = toLog
  nodePressure[nodeCount] = toPressure
  nodeExcess[nodeCount] = toColumn
  nodeCount++
}

/** Nodes of the surroundings from the parcel's start to the top of the data; gives the node of the condensation level, or the count where the data end below it. */
function layNodes(sounding: Sounding, column: Float64Array, parcel: Parcel, lclPressure: number): number {
  const { count, pressure, logPressure } = sounding
  const start = log(parcel.pressure), lclLog = log(lclPressure)
  makeRoom(count + 4 + Math.ceil((start - (logPressure[count - 1] ?? 0)) / longestStep))
  let at = 0
  while (at < count - 1 && (pressure[at + 1] ?? 0) >= parcel.pressure) at++
  nodeCount = 1
  nodeLog[0] = start
  nodePressure[0] = parcel.pressure
  nodeExcess[0] = between(logPressure, column, at, start)
  let lclNode = lclLog >= start ? 0 : -1
  for (let level = at + 1; level < count; level++) {
    const toLog = logPressure[level] ?? 0
    if (lclNode < 0 && toLog <= lclLog) {
      if (toLog < lclLog) addSegment(lclLog, lclPressure, between(logPressure, column, level - 1, lclLog))
      else addSegment(toLog, pressure[level] ?? 0, column[level] ?? 0)
      lclNode = nodeCount - 1
      if (toLog === lclLog) continue
    }
    addSegment(toLog, pressure[level] ?? 0, column[level] ?? 0)
  }
  return lclNode < 0 ? nodeCount : lclNode
}

/** A column's value in the layer above row `at`, linear in ln p. */
function between(logPressure: Float64Array, column: Float64Array, at: number, where: number): number {
  const from = logPressure[at] ?? 0, to = logPressure[at + 1] ?? from, below = column[at] ?? 0
  return to === from ? below : below + (where - from) / (to - from) * ((column[at + 1] ?? below) - below)
}

/** What a saturated step leaves for the next one: temperature, eₛ, and the slope there. In an array, so that no step allocates. */
const state = new Float64Array(3)

function startSaturated(T: number, p: number, air: MoistAir): void {
  const e = air.es(T)
  state[0] = T
  state[1] = e
  state[2] = slopeAt(T, p, e, air)
}

/**
 * One step of Runge and Kutta along the pseudoadiabat, fourth order in ln p; the middle of a step in ln p is the geometric mean of its ends.
 * The fourth evaluation is the first of the next step; all stand in one loop, which an engine can keep in registers.
 */
function saturatedStep(from: number, to: number, h: number, air: MoistAir): void {
  const middle = Math.sqrt(from * to)
  const T = state[0] ?? 0
  let slope = state[2] ?? 0, sum = slope, here = T, e = 0
  for (let stage = 1; stage <= 4; stage++) {
    here = T + (stage === 4 ? h / 6 * sum : (stage === 3 ? h : 0.5 * h) * slope)
    e = air.es(here)
    slope = slopeAt(here, stage < 3 ? middle : to, e, air)
    sum += stage < 3 ? 2 * slope : slope
  }
  state[0] = here
  state[1] = e
  state[2] = slope
}

/** Puts the parcel's excess over its surroundings in the nodes, K. */
function liftThroughNodes(parcel: Parcel, lcl: LiftingCondensationLevel, lclNode: number, isVirtual: boolean, air: MoistAir): void {
  const { kappa, epsilon } = air
  const start = nodeLog[0] ?? 0
  const dryFactor = isVirtual ? (1 + parcel.mixingRatio / epsilon) / (1 + parcel.mixingRatio) : 1
  const dryNodes = Math.min(lclNode, nodeCount)
  for (let n = 0; n < dryNodes; n++) nodeExcess[n] = parcel.temperature * exp(kappa * ((nodeLog[n] ?? 0) - start)) * dryFactor - (nodeExcess[n] ?? 0)
  if (lclNode >= nodeCount) return
  nodeExcess[lclNode] = lcl.temperature * dryFactor - (nodeExcess[lclNode] ?? 0)
  startSaturated(lcl.temperature, nodePressure[lclNode] ?? 0, air)
  for (let n = lclNode + 1; n < nodeCount; n++) {
    const p = nodePressure[n] ?? 0
    saturatedStep(nodePressure[n - 1] ?? 0, p, (nodeLog[n] ?? 0) - (nodeLog[n - 1] ?? 0), air)
    const T = state[0] ?? 0, e = state[1] ?? 0, w = epsilon * e / (p - e)
    nodeExcess[n] = (isVirtual ? T * (1 + w / epsilon) / (1 + w) : T) - (nodeExcess[n] ?? 0)
  }
}

/**
 * The ascent of a parcel through a sounding.
 *
 * @example lift(sounding, surfaceParcel(sounding), lcl(T, Td, p), true, air).cape // J kg⁻¹
 * @throws {OutOfRangeError} where water would boil
 */
export function lift(sounding: Sounding, parcel: Parcel, lcl: LiftingCondensationLevel, isVirtual: boolean, air: MoistAir): Ascent {
  const lclNode = layNodes(sounding, isVirtual ? sounding.virtualTemperature : sounding.temperature, parcel, lcl.pressure)
  liftThroughNodes(parcel, lcl, lclNode, isVirtual, air)
  const { R } = air
  let lfcLog = NaN, elLog = NaN, positive = 0, negative = 0
  if (lclNode === 0 && (nodeExcess[0] ?? 0) > neutral) lfcLog = nodeLog[0] ?? 0
  for (let n = 1; n < nodeCount; n++) {
    const below = nodeExcess[n - 1] ?? 0, above = nodeExcess[n] ?? 0
    const from = nodeLog[n - 1] ?? 0, depth = from - (nodeLog[n] ?? 0)
    const isRising = above > neutral && !(below > neutral), isFalling = below > neutral && !(above > neutral)
    // the part of the step below the crossing, where there is one
    const crosses = (below > 0 && above < 0) || (below < 0 && above > 0)
    const share = crosses ? below / (below - above) : 1
    const hasLfc = lfcLog === lfcLog
    if (crosses) {
      const first = 0.5 * R * below * share * depth, second = 0.5 * R * above * (1 - share) * depth
      if (first < 0 && !hasLfc) negative += first
      if (first > 0 && hasLfc) positive += first
      if (isRising && !hasLfc && n > lclNode) lfcLog = from - share * depth
      const isFree = lfcLog === lfcLog
      if (second > 0 && isFree) positive += second
      if (second < 0 && !isFree) negative += second
    }
    else {
      if (isRising && !hasLfc && n > lclNode) lfcLog = from
      const area = 0.5 * R * (below + above) * depth, isFree = lfcLog === lfcLog
      if (area < 0 && !isFree) negative += area
      if (area > 0 && isFree) positive += area
    }
    if (isFalling && lfcLog === lfcLog) elLog = from - share * depth
    if (n === lclNode && above > neutral && lfcLog !== lfcLog) lfcLog = nodeLog[n] ?? 0
  }
  const isWarmAtTop = (nodeExcess[nodeCount - 1] ?? 0) > neutral && lfcLog === lfcLog
  return {
    lcl,
    lfc: lfcLog === lfcLog ? exp(lfcLog) : null,
    el: elLog === elLog && !isWarmAtTop ? exp(elLog) : null,
    cape: positive, cin: negative, isWarmAtTop, top: nodePressure[nodeCount - 1] ?? 0,
  }
}

/**
 * The temperature of a lifted parcel at a pressure above its start; its virtual temperature where asked.
 *
 * @example parcelTemperatureAt(parcel, lcl, 50000, false, air)
 */
export function parcelTemperatureAt(parcel: Parcel, lcl: LiftingCondensationLevel, pressure: number, isVirtual: boolean, air: MoistAir): number {
  if (pressure >= lcl.pressure) {
    const T = parcel.temperature * exp(air.kappa * (log(pressure) - log(parcel.pressure)))
    return isVirtual ? T * (1 + parcel.mixingRatio / air.epsilon) / (1 + parcel.mixingRatio) : T
  }
  const start = log(lcl.pressure), whole = log(pressure) - start, parts = Math.ceil(-whole / longestStep)
  startSaturated(lcl.temperature, lcl.pressure, air)
  let p = lcl.pressure
  for (let n = 1; n <= parts; n++) {
    const next = n === parts ? pressure : exp(start + n / parts * whole)
    saturatedStep(p, next, whole / parts, air)
    p = next
  }
  const T = state[0] ?? 0, e = state[1] ?? 0
  if (!isVirtual) return T
  const w = air.epsilon * e / (pressure - e)
  return T * (1 + w / air.epsilon) / (1 + w)
}
