/**
 * Heating inferred from an observed change of temperature at one place and pressure.
 *
 *   ΔT/Δt = q̇/cp     q̇ in W kg⁻¹
 *
 * Source: AMS Glossary of Meteorology, "diabatic process"; the first law at constant pressure. It holds only where nothing else changes the
 * temperature there: no advection, no vertical motion. The asks say so; without that the step asks nothing that can be known.
 */
import type { InputDefinition, Inputs, Variant } from './definition'
import { temperatureInput, timeInput } from './inputKinds'
import { numberOf } from './inputs'

export const heatingInputs: readonly InputDefinition[] = [
  temperatureInput('temperatureStart', 'temperature at the start', 'T₁'),
  temperatureInput('temperatureEnd', 'temperature at the end', 'T₂'),
  timeInput('timeBetween', 'elapsed time, as between two instants in UTC', 'Δt', [1, 31_536_000]),
]

/** "No advection, no vertical motion": part of what is asked. */
export const heatingAssumption = 'assuming that neither advection nor vertical motion changes the temperature there, and that the pressure stays'

/**
 * ΔT/Δt, K s⁻¹.
 * @example temperatureTendency({ temperatureStart: 285.15, temperatureEnd: 288.15, timeBetween: 7200 }) // 0.00041667 K s⁻¹, 1.5 K h⁻¹
 */
export function temperatureTendency(inputs: Inputs): number {
  return (numberOf(inputs, 'temperatureEnd') - numberOf(inputs, 'temperatureStart')) / numberOf(inputs, 'timeBetween')
}

export const heatingFormula: Omit<Variant, 'evaluate' | 'label'> = {
  key: 'first-law', source: { text: 'AMS Glossary of Meteorology, "diabatic process"; first law at constant pressure', status: 'common practice' },
  validity: 'no advection, no vertical motion, constant pressure', knownError: 'what the assumption leaves out',
}
