/**
 * What people write for a unit → UCUM code. Symbols that differ by field are read as meteorology means them:
 * C is °C and not coulomb, kt a knot, mb a millibar, F °F, g a gram, h an hour, M a meter where nothing else fits.
 */
const written: Readonly<Record<string, string>> = {
  // temperature
  '°C': 'Cel', '°c': 'Cel', 'C': 'Cel', 'degC': 'Cel', 'deg_C': 'Cel', 'oC': 'Cel', 'celsius': 'Cel', 'Celsius': 'Cel', 'degree_Celsius': 'Cel', 'degrees_Celsius': 'Cel', 'degree_C': 'Cel', 'degrees_C': 'Cel', 'Cel': 'Cel', 'centigrade': 'Cel',
  '°F': '[degF]', '°f': '[degF]', 'F': '[degF]', 'degF': '[degF]', 'deg_F': '[degF]', 'Fahrenheit': '[degF]', 'fahrenheit': '[degF]', 'degree_Fahrenheit': '[degF]', 'degrees_Fahrenheit': '[degF]', 'degrees_F': '[degF]', '[degF]': '[degF]',
  '°K': 'K', 'degK': 'K', 'deg_K': 'K', 'kelvin': 'K', 'Kelvin': 'K', 'kelvins': 'K', 'Kelvins': 'K',
  // length
  'meter': 'm', 'meters': 'm', 'metre': 'm', 'metres': 'm', 'mtr': 'm', 'kilometer': 'km', 'kilometers': 'km', 'kilometre': 'km', 'kilometres': 'km', 'centimeter': 'cm', 'centimeters': 'cm', 'millimeter': 'mm', 'millimeters': 'mm',
  'gpm': 'm', 'gpkm': 'km', 'gpdam': 'dam', 'ft': '[ft_i]', 'feet': '[ft_i]', 'foot': '[ft_i]', 'kft': 'kft', 'in': '[in_i]', 'inch': '[in_i]', 'inches': '[in_i]', 'mi': '[mi_i]', 'mile': '[mi_i]', 'miles': '[mi_i]', 'nmi': '[nmi_i]', 'NM': '[nmi_i]',
  // pressure
  'mb': 'mbar', 'mbar': 'mbar', 'mbars': 'mbar', 'millibar': 'mbar', 'millibars': 'mbar', 'pascal': 'Pa', 'pascals': 'Pa', 'Pascal': 'Pa', 'hectopascal': 'hPa', 'hectopascals': 'hPa', 'kilopascal': 'kPa', 'kilopascals': 'kPa',
  'mmHg': 'mm[Hg]', 'Torr': 'mm[Hg]', 'torr': 'mm[Hg]', 'inHg': '[in_i\'Hg]', 'psi': '[psi]', 'atmosphere': 'atm', 'atmospheres': 'atm',
  // speed, time
  'kt': '[kn_i]', 'kts': '[kn_i]', 'kn': '[kn_i]', 'knot': '[kn_i]', 'knots': '[kn_i]', 'mph': 'mph', 'kph': 'kph', 'kmh': 'kph', 'sec': 's', 'secs': 's', 'second': 's', 'seconds': 's', 'mins': 'min', 'minute': 'min', 'minutes': 'min', 'hr': 'h', 'hrs': 'h', 'hour': 'h', 'hours': 'h', 'day': 'd', 'days': 'd',
  // mass, energy
  'kilogram': 'kg', 'kilograms': 'kg', 'gram': 'g', 'grams': 'g', 'lb': '[lb_av]', 'lbs': '[lb_av]', 'joule': 'J', 'joules': 'J', 'Joule': 'J', 'Joules': 'J', 'kilojoule': 'kJ', 'kilojoules': 'kJ', 'megajoule': 'MJ', 'megajoules': 'MJ', 'watt': 'W', 'watts': 'W', 'newton': 'N', 'newtons': 'N', 'l': 'L', 'liter': 'L', 'liters': 'L', 'litre': 'L', 'litres': 'L', 'mole': 'mol', 'moles': 'mol',
  // plain
  '%': '%', 'percent': '%', 'pct': '%', '‰': '[ppth]', 'permille': '[ppth]', 'ppm': '[ppm]', '°': 'deg', 'deg': 'deg', 'degree': 'deg', 'degrees': 'deg', 'radian': 'rad', 'radians': 'rad',
}

const shortCodes = ['m', 'km', 'hm', 'dam', 'dm', 'cm', 'mm', 'um', 'kg', 'g', 'mg', 'ug', 's', 'ms', 'min', 'h', 'd', 'K', 'mK', 'Pa', 'hPa', 'kPa', 'MPa', 'mPa', 'daPa', 'bar', 'mbar', 'atm', 'J', 'kJ', 'MJ', 'GJ', 'mJ', 'cal', 'kcal', 'W', 'kW', 'MW', 'mW', 'N', 'kN', 'Hz', 'L', 'mL', 'mol', 'kmol', 'rad', 'mm[Hg]', '[in_i\'Hg]', '[ft_i]', '[kn_i]', '[ppth]', '[psi]']

const exact = new Map<string, string>(shortCodes.map(code => [code, code]))
for (const [text, code] of Object.entries(written)) exact.set(text, code)

// "hpa", "Kg", "KM", "M": read where only one unit is spelled so when case is left aside
const folded = new Map<string, string | null>()
for (const [text, code] of exact) {
  const key = text.toLowerCase()
  const before = folded.get(key)
  if (before === undefined) folded.set(key, code)
  else if (before !== code) folded.set(key, null)
}

/** The UCUM code of a symbol as people write it; null where none or several fit. */
export function codeOfSymbol(symbol: string): string | null {
  return exact.get(symbol) ?? folded.get(symbol.toLowerCase()) ?? null
}

/** Units that are written as one symbol and are several in UCUM. */
export const composed: Readonly<Record<string, { code: string, factor: string }>> = {
  mph: { code: '[mi_i]/h', factor: '1' },
  kph: { code: 'km/h', factor: '1' },
  kft: { code: '[ft_i]', factor: '1000' },
}
