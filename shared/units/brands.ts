/**
 * Numbers that know their unit at compile time: a pascal passed where a kelvin is meant does not compile, and NaN is never minted.
 * A brand ends in JSON, SQL and forms: names carry the unit there.
 */
declare const unit: unique symbol
type Branded<U extends string> = number & { readonly [unit]: U }

export type Kelvin = Branded<'K'>
export type Pascal = Branded<'Pa'>
export type Meter = Branded<'m'>
export type KelvinPerMeter = Branded<'K/m'>
export type JoulePerKilogram = Branded<'J/kg'>
export type KilogramPerCubicMeter = Branded<'kg/m3'>

function mint<U extends string>(label: U): (value: number) => Branded<U> {
  const isFinite = (value: number): value is Branded<U> => Number.isFinite(value)
  return (value) => {
    if (!isFinite(value)) throw new RangeError(`${String(value)} ${label} is no value`)
    return value
  }
}

export const kelvin = mint('K')
export const pascal = mint('Pa')
export const meter = mint('m')
export const kelvinPerMeter = mint('K/m')
export const joulePerKilogram = mint('J/kg')
export const kilogramPerCubicMeter = mint('kg/m3')

const zeroCelsius = 273.15
export const kelvinFromCelsius = (temperatureC: number): Kelvin => kelvin(temperatureC + zeroCelsius)
export const celsiusFromKelvin = (temperature: Kelvin): number => temperature - zeroCelsius
export const pascalFromHectopascal = (pressureHpa: number): Pascal => pascal(pressureHpa * 100)
export const hectopascalFromPascal = (pressure: Pascal): number => pressure / 100
