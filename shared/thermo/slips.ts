/** Slips that many quantities share, so that they are worded alike everywhere. */
import type { Constants, Formulae, Inputs, Slip } from './definition'

type Apply = (inputs: Inputs, constants: Constants, right: number, formulae: Formulae) => number | null

export const slip = (key: string, label: string, sentence: string, apply: Apply): Slip => ({ key, weight: 'gross', label, sentence, apply })
export const fineSlip = (key: string, label: string, sentence: string, apply: Apply): Slip => ({ key, weight: 'fine', label, sentence, apply })
export const constantSlip = (key: string, label: string, sentence: string, apply: Apply): Slip => ({ key, weight: 'constant', label, sentence, apply })

const times = (factor: number): Apply => (_inputs, _constants, right) => right * factor

export const signSlip = (sentence: string): Slip => slip('sign', 'sign turned round', sentence, times(-1))
export const perMeterSlip: Slip = slip('per-meter', 'K m⁻¹ given as K km⁻¹', 'Your value is the rate per meter: multiply it by 1000 for the rate per kilometer.', times(1 / 1000))
export const per100MetersSlip: Slip = slip('per-100-m', 'K per 100 m given as K km⁻¹', 'Your value is the rate per 100 m: multiply it by 10 for the rate per kilometer.', times(1 / 10))
export const joulesSlip: Slip = slip('joules-for-kilojoules', 'J given as kJ', 'Your number is in joules; the unit beside it says kilojoules.', times(1000))
export const kilojoulesSlip: Slip = slip('kilojoules-for-joules', 'kJ given as J', 'Your number is in kilojoules; the unit beside it says joules.', times(1 / 1000))

export const zeroCelsius = 273.15
/** Specific gas constant of water vapor, J kg⁻¹ K⁻¹ (common practice): enters here only as a slip. */
export const vaporGasConstant = 461.5
/** Universal gas constant, J mol⁻¹ K⁻¹ (CODATA 2018): enters here only as a slip. */
export const universalGasConstant = 8.314462618
