/**
 * The saturation vapor pressure and the latent heat that stand inside other quantities, as the convention computes them. Ask for the function once,
 * outside of a loop: what it gives is plain numbers in and out (K to Pa, K to J kg⁻¹).
 *
 *   const es = saturationPressureFunction(constants, formulae)
 *   es(293.15) // 2336.95 Pa
 */
import { enhancementOf } from './constants'
import type { Constants, Formulae, QuantityDefinition } from './definition'
import { chooseVariant, variantOf } from './evaluate'
import { sublimationForms, vaporizationForms } from './latentHeat'
import { latentHeatOfSublimationDefinition } from './quantities/latentHeatOfSublimation'
import { latentHeatOfVaporizationDefinition } from './quantities/latentHeatOfVaporization'
import { saturationVaporPressureDefinition } from './quantities/saturationVaporPressure'
import { saturationVaporPressureOverIceDefinition } from './quantities/saturationVaporPressureOverIce'
import { overIceForms, overWaterForms, type SaturationForm } from './saturation'

export const overWaterKey = saturationVaporPressureDefinition.key
export const overIceKey = saturationVaporPressureOverIceDefinition.key
export const vaporizationKey = latentHeatOfVaporizationDefinition.key
export const sublimationKey = latentHeatOfSublimationDefinition.key

type OfTemperature = (temperatureK: number) => number

/** A function of the temperature by a convention's variant; beyond its range by what the convention says. @throws {OutOfRangeError} from what it gives, where the convention refuses */
function byTemperature(definition: QuantityDefinition, formulae: Formulae, make: (key: string) => OfTemperature): OfTemperature {
  const named = variantOf(definition, formulae.variants[definition.key])
  const inside = make(named.key)
  const range = named.holds?.temperature
  if (!range || formulae.beyond === 'compute') return inside
  const made = new Map<string, OfTemperature>()
  return (temperature) => {
    if (temperature >= range[0] && temperature <= range[1]) return inside(temperature)
    const { key } = chooseVariant(definition, { temperature }, formulae).variant
    const known = made.get(key) ?? make(key)
    made.set(key, known)
    return known(temperature)
  }
}

function formOf<T extends { key: string }>(forms: readonly T[], key: string): T {
  const form = forms.find(one => one.key === key)
  if (!form) throw new Error(`no form ${key}`)
  return form
}

function pressureFunction(definition: QuantityDefinition, forms: readonly SaturationForm[], constants: Constants, formulae: Formulae): OfTemperature {
  const factor = enhancementOf(constants)
  return byTemperature(definition, formulae, (key) => {
    const { pressure } = formOf(forms, key)
    return factor === 1 ? pressure : temperature => factor * pressure(temperature)
  })
}

/** eₛ(T) over liquid water, Pa. */
export const saturationPressureFunction = (constants: Constants, formulae: Formulae): OfTemperature => pressureFunction(saturationVaporPressureDefinition, overWaterForms, constants, formulae)

/** eᵢ(T) over ice, Pa. */
export const iceSaturationPressureFunction = (constants: Constants, formulae: Formulae): OfTemperature => pressureFunction(saturationVaporPressureOverIceDefinition, overIceForms, constants, formulae)

/** L(T) of vaporization, J kg⁻¹. */
export const latentHeatFunction = (constants: Constants, formulae: Formulae): OfTemperature => byTemperature(latentHeatOfVaporizationDefinition, formulae, key => formOf(vaporizationForms, key).of(constants))

/** L(T) of sublimation, J kg⁻¹. */
export const sublimationHeatFunction = (constants: Constants, formulae: Formulae): OfTemperature => byTemperature(latentHeatOfSublimationDefinition, formulae, key => formOf(sublimationForms, key).of(constants))

/** What is to be said where temperatures lie beyond the stated range of the formula inside. @throws {OutOfRangeError} where the convention refuses */
function notesOf(definition: QuantityDefinition, temperatures: readonly number[], formulae: Formulae): readonly string[] {
  const notes = new Set<string>()
  for (const temperature of temperatures) {
    const { note } = chooseVariant(definition, { temperature }, formulae)
    if (note !== null) notes.add(`${definition.name[0]?.toUpperCase()}${definition.name.slice(1)}: ${note}`)
  }
  return [...notes]
}

export const saturationNotes = (temperatures: readonly number[], formulae: Formulae): readonly string[] => notesOf(saturationVaporPressureDefinition, temperatures, formulae)
export const iceSaturationNotes = (temperatures: readonly number[], formulae: Formulae): readonly string[] => notesOf(saturationVaporPressureOverIceDefinition, temperatures, formulae)
export const latentHeatNotes = (temperatures: readonly number[], formulae: Formulae): readonly string[] => notesOf(latentHeatOfVaporizationDefinition, temperatures, formulae)
