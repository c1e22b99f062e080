/** What a psychrometer tells: vapor pressure and relative humidity, for a bulb that is ventilated, in a screen, or bears ice. */
import type { InputDefinition, QuantityDefinition, TraceStep } from './definition'
import { pressureInput, temperatureInput, wetBulbInput } from './moistInputs'
import { fineMoistSlip, moistQuantity, moistSlip, optionally, type Hand, type MoistSlip } from './moistQuantity'
import { fractionAsPercentSlip, kilopascalSlip, pascalSlip } from './moistSlips'
import { inCelsius, inHectopascal } from './moistTex'
import { OutOfRangeError } from './errors'
import { iceSaturationPressureFunction } from './saturationFunction'
import { texNumber, texQuantity } from './tex'
import { iceCoefficients, screenCoefficients, ventilatedCoefficients, type PsychrometerCoefficient } from './wetBulb'

export type Bulb = 'ventilated' | 'screen' | 'ice'

const coefficientsOf: Readonly<Record<Bulb, readonly PsychrometerCoefficient[]>> = { ventilated: ventilatedCoefficients, screen: screenCoefficients, ice: iceCoefficients }
const wordsOf: Readonly<Record<Bulb, string>> = {
  ventilated: 'a ventilated psychrometer (2.5 m/s and more) with a wet bulb',
  screen: 'a psychrometer in a screen with natural ventilation and a wet bulb',
  ice: 'a ventilated psychrometer whose bulb bears ice',
}
const coefficientInput: InputDefinition = { name: 'psychrometerCoefficient', label: 'psychrometer coefficient A, where it is given', symbol: 'A', unit: '1/K', shownUnit: '1/K', kind: 'ratio', shape: 'number', range: [0.0003, 0.0015], isOptional: true }

/**
 * Vapor pressure by the psychrometer equation.
 *
 *   e = e_w − A p (T − T_w)     e_w saturation at the bulb, over ice where it bears ice
 *
 * Source: WMO-No. 8, Annex 4.B; AMS Glossary of Meteorology, "psychrometric formula". A belongs to the ventilation.
 *
 * @example psychrometerVaporPressure(1704, 100000, 5, 6.62e-4) // 1373 Pa
 */
export const psychrometerVaporPressure = (atBulb: number, pressure: number, depression: number, coefficient: number): number => atBulb - coefficient * pressure * depression

const bulbPressure = (hand: Hand, bulb: Bulb): number => bulb === 'ice' ? iceSaturationPressureFunction(hand.constants, hand.formulae)(hand.given('wetBulb')) : hand.air.es(hand.given('wetBulb'))
const depressionOf = ({ given }: Hand): number => given('temperature') - given('wetBulb')
const coefficientOf = (hand: Hand, bulb: Bulb): number => optionally(hand, 'psychrometerCoefficient') ?? (coefficientsOf[bulb].find(one => one.key === hand.variant) ?? coefficientsOf[bulb][0])?.of(hand.given('wetBulb')) ?? NaN

/** @throws {OutOfRangeError} where the bulb is too cold for any vapor to be left */
function vaporOf(hand: Hand, bulb: Bulb, coefficient = coefficientOf(hand, bulb), atBulb = bulbPressure(hand, bulb)): number {
  const e = psychrometerVaporPressure(atBulb, hand.given('pressure'), depressionOf(hand), coefficient)
  if (!(e > 0)) throw new OutOfRangeError('wetBulb', hand.given('wetBulb'), 'wet-bulb temperatures that leave a vapor pressure above zero')
  return e
}

interface Psychrometer extends Pick<QuantityDefinition, 'key' | 'name' | 'example'> { bulb: Bulb, gives: 'vapor-pressure' | 'relative-humidity' }

export function psychrometerDefinition({ bulb, gives, ...named }: Psychrometer): QuantityDefinition {
  const isHumidity = gives === 'relative-humidity'
  const finish = (hand: Hand, e: number): number => isHumidity ? e / hand.air.es(hand.given('temperature')) : e
  const withCoefficient = (coefficient: number, hand: Hand, atBulb?: number) => finish(hand, psychrometerVaporPressure(atBulb ?? bulbPressure(hand, bulb), hand.given('pressure'), depressionOf(hand), coefficient))
  return moistQuantity({
    ...named,
    symbol: isHumidity ? 'RH' : 'e',
    unit: isHumidity ? '1' : 'Pa', shownUnit: isHumidity ? '%' : 'hPa', kind: isHumidity ? 'fraction' : 'ratio',
    inputs: [pressureInput, { ...temperatureInput, label: 'dry-bulb temperature', range: bulb === 'ice' ? [230, 280] : [230, 330] }, bulb === 'ice' ? { ...wetBulbInput, range: [220, 273.16] } : wetBulbInput, coefficientInput],
    variants: coefficientsOf[bulb].map(({ key, label, source }) => ({ key, label, source, validity: wordsOf[bulb], knownError: '0.1 hPa by the coefficients in use', value: hand => finish(hand, vaporOf(hand, bulb)) })),
    constants: isHumidity ? [] : ['enhancementFactor'],
    inside: bulb === 'ice' ? (isHumidity ? ['ei', 'es'] : ['ei']) : ['es'],
    notedAt: bulb === 'ice' ? { ei: given => [given('wetBulb')] } : { es: given => [given('wetBulb')] },
    remarks: ({ given }) => [given('wetBulb') > given('temperature') ? 'The wet bulb reads above the dry one: one of the two is wrong, or the air is supersaturated.' : null],
    ask: isHumidity ? `The relative humidity over liquid water, e/es, by the readings of ${wordsOf[bulb]}.` : `The vapor pressure e of the air by the readings of ${wordsOf[bulb]}.`,
    working: (hand, value) => {
      const atBulb = bulbPressure(hand, bulb), A = coefficientOf(hand, bulb), e = withCoefficientPlain(hand, A, atBulb)
      const symbol = bulb === 'ice' ? 'e_i' : 'e_s'
      const given = optionally(hand, 'psychrometerCoefficient') !== null
      const steps: TraceStep[] = [
        { text: bulb === 'ice' ? 'Saturation over ice at the bulb' : 'Saturation over water at the bulb', formula: `e_w = ${symbol}(T_w)`, filled: `e_w = ${symbol}(${inCelsius(hand.given('wetBulb'))}) = ${inHectopascal(atBulb)}`, value: atBulb, unit: 'Pa' },
        { text: given ? 'Coefficient, as given' : 'Coefficient of the ventilation', formula: `A${given ? '' : ` = ${(coefficientsOf[bulb].find(one => one.key === hand.variant) ?? coefficientsOf[bulb][0])?.tex ?? ''}`}`, filled: `A = ${texQuantity(A, '1/K')}`, value: A, unit: '1/K' },
        { text: 'Psychrometer equation', formula: 'e = e_w - A\\,p\\,(T - T_w)', filled: `e = ${texNumber(atBulb / 100)} - ${texNumber(A)} \\cdot ${texNumber(hand.given('pressure') / 100, 6)} \\cdot ${texNumber(depressionOf(hand))} = ${inHectopascal(e)}`, value: e, unit: 'Pa' },
      ]
      if (isHumidity) steps.push({ text: 'Over the saturation vapor pressure over liquid water at the dry bulb', formula: '\\mathit{RH} = \\frac{e}{e_s(T)}', filled: `\\mathit{RH} = \\frac{${texNumber(e / 100)}}{${texNumber(hand.air.es(hand.given('temperature')) / 100)}} = ${texQuantity(value * 100, '%')}` })
      return steps
    },
    slips: slipsOf(bulb, isHumidity, withCoefficient),
  })
}

const withCoefficientPlain = (hand: Hand, A: number, atBulb: number): number => psychrometerVaporPressure(atBulb, hand.given('pressure'), depressionOf(hand), A)

function slipsOf(bulb: Bulb, isHumidity: boolean, by: (coefficient: number, hand: Hand, atBulb?: number) => number): readonly MoistSlip[] {
  const isGiven = (hand: Hand) => optionally(hand, 'psychrometerCoefficient') !== null
  const other = (key: string, label: string, sentence: string, coefficient: number) => fineMoistSlip(key, label, sentence, hand => isGiven(hand) || depressionOf(hand) === 0 ? null : by(coefficient, hand))
  return [
    ...bulb === 'ventilated' ? [other('screen', 'coefficient of a screen', 'This comes from the coefficient of a screen with natural ventilation: this bulb is ventilated.', 7.99e-4)] : [],
    ...bulb === 'screen' ? [other('ventilated', 'coefficient of a ventilated bulb', 'This comes from the coefficient of a ventilated psychrometer: in a screen the bulb is ventilated less.', 6.62e-4)] : [],
    ...bulb === 'ice' ? [other('wet', 'coefficient of a wet bulb', 'This comes from the coefficient of a wet bulb: this one bears ice.', 6.62e-4)] : [],
    bulb === 'ice'
      ? fineMoistSlip('water-for-ice', 'over water for over ice', 'This takes the saturation vapor pressure over water at the bulb: it bears ice.', hand => by(coefficientOf(hand, bulb), hand, hand.air.es(hand.given('wetBulb'))))
      : fineMoistSlip('ice-for-water', 'over ice for over water', 'This takes the saturation vapor pressure over ice at the bulb: it is wet.', hand => hand.given('wetBulb') < 273.15 ? by(coefficientOf(hand, bulb), hand, iceSaturationPressureFunction(hand.constants, hand.formulae)(hand.given('wetBulb'))) : null),
    moistSlip('sign', 'added in place of taken away', 'The evaporation costs vapor: A p (T − Tw) is taken away.', hand => depressionOf(hand) === 0 ? null : by(-coefficientOf(hand, bulb), hand)),
    fineMoistSlip('no-depression', 'without the depression', 'This takes saturation at the wet bulb for the air’s vapor pressure: A p (T − Tw) is missing.', hand => depressionOf(hand) === 0 ? null : by(0, hand)),
    moistSlip('at-dry-bulb', 'saturation at the dry bulb', 'This takes the saturation vapor pressure at the dry bulb in the psychrometer equation: it is that at the wet bulb.', hand => depressionOf(hand) === 0 ? null : by(coefficientOf(hand, bulb), hand, hand.air.es(hand.given('temperature')))),
    ...isHumidity
      ? [fineMoistSlip('over-wet-bulb', 'over saturation at the wet bulb', 'This divides by the saturation vapor pressure at the wet bulb: it is that at the dry bulb.', ({ given, air, right }) => right * air.es(given('temperature')) / air.es(given('wetBulb'))), fractionAsPercentSlip]
      : [pascalSlip, kilopascalSlip],
  ]
}
