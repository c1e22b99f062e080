import { findMeasuredQuantity } from '#shared/schemas/data'

/** What the words of a column's head suggest. Only a suggestion: a person confirms every column. */
export interface HeadReading {
  quantity: string | null
  /** UCUM code; null where the head says none. */
  unit: string | null
  heightM: number | null
  isQuality: boolean
}

/** A head in words: `Global PSP (Accumulated) [kWhr/m^2]` → `global psp accumulated`, `windDir` → `wind dir`. */
export function headWords(name: string): string {
  return name.replace(/\[[^\]]*\]/g, ' ').replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase().replace(/[^a-z0-9.]+/g, ' ').trim()
}

/** First match wins: what is more particular stands first. */
const quantities: readonly (readonly [RegExp, string])[] = [
  [/\b(volt|voltage|batt|battery|v batt)\b/, 'voltage'],
  [/\b(lat|latitude|gpslat)\b/, 'latitude'],
  [/\b(lon|long|longitude|gpslon)\b/, 'longitude'],
  [/\belapsed\b/, 'elapsed-time'],
  [/\b(dew ?point|dewp|dew|dpt|td|dewpt)\b/, 'dewpoint'],
  [/\b(wet ?bulb|tw)\b/, 'wet-bulb-temperature'],
  [/\bsoil\b/, 'soil-temperature'],
  [/\b(skin|surface temp|surface temperature)\b/, 'surface-temperature'],
  [/\b(rel(ative)? ?hum(idity)?|rh\d?|humid|humidity)\b/, 'relative-humidity'],
  [/\b(mixing ratio|mixr)\b/, 'mixing-ratio'],
  [/\b(gust|gusts)\b/, 'wind-gust'],
  [/\b(wind ?dir(ection)?|wdir|wd|wind ?d|winddirection|wind from)\b/, 'wind-direction'],
  [/\b(wind ?sp(ee)?d|wspd|ws|wind ?s|windspeed|wind speed)\b/, 'wind-speed'],
  [/\b(precip|precipitation|rain|rainfall|tbrg|precip amt)\b/, 'precipitation'],
  [/\baccumulated\b.*|\b(kwh|insolation)\b/, 'radiant-exposure'],
  [/\b(ghi|psp|global rad(iation)?|solar rad(iation)?|shortwave|sw ?in|swdn|dw solar|srad|global)\b/, 'global-radiation'],
  [/\b(longwave|lw ?in|lwdn)\b/, 'longwave-radiation'],
  [/\b(netrad|net rad(iation)?|rnet)\b/, 'net-radiation'],
  [/\b(visib|visibility|vis)\b/, 'visibility'],
  [/\b(press|pressure|baro|barometer|mslp|pres|p|slp)\b/, 'pressure'],
  [/\b(alt|altitude|height|z|hgt|gpsalt|hght)\b/, 'height'],
  [/\b(air ?temp(erature)?|temp|temperature|tair|t|ta|t\d?m?|tmpf|tmpc|atmp)\b/, 'air-temperature'],
]

const units: readonly (readonly [RegExp, string])[] = [
  [/^(°|º|\*|deg\.? ?|degrees? ?)?c(elsius)?$|^degc$/, 'Cel'],
  [/^(°|º|\*|deg\.? ?|degrees? ?)?f(ahrenheit)?$|^degf$/, '[degF]'],
  [/^(deg ?)?k(elvin)?$/, 'K'],
  [/^hpa$/, 'hPa'], [/^mbar$|^mb$/, 'mbar'], [/^kpa$/, 'kPa'], [/^pa$/, 'Pa'], [/^in ?hg$/, '[in_i\'Hg]'], [/^mm ?hg$/, 'mm[Hg]'],
  [/^%$|^pct$|^percent$/, '%'],
  [/^m\/s(ec)?$|^ms$|^m s-1$|^m s\^-1$|^ms-1$|^mps$/, 'm/s'], [/^km\/h(r)?$|^kmh$|^kph$/, 'km/h'], [/^kn$|^kt$|^kts$|^knots?$/, '[kn_i]'], [/^mph$/, '[mi_i]/h'],
  [/^mm$/, 'mm'], [/^cm$/, 'cm'], [/^in(ch(es)?)?$/, '[in_i]'],
  [/^(°|deg(rees)?( true)?)$|^degt$/, 'deg'],
  [/^w\/m\^?2$|^w m-2$|^w\/m²$|^wm-2$/, 'W/m2'], [/^kw\/m\^?2$/, 'kW/m2'],
  [/^kwhr?\/m\^?2$/, 'kW.h/m2'], [/^mj\/m\^?2$/, 'MJ/m2'], [/^whr?\/m\^?2$/, 'W.h/m2'],
  [/^m(et(er|re)s?)?( (msl|agl|asl))?$/, 'm'], [/^km$/, 'km'], [/^f(ee)?t$/, '[ft_i]'],
  [/^s(ec(onds?)?)?$/, 's'], [/^min(utes?)?$/, 'min'], [/^h(ours?|r)?$/, 'h'],
  [/^g\/kg$|^g kg-1$/, 'g/kg'], [/^v(olts?)?$/, 'V'], [/^mv$/, 'mV'],
]

export function unitFromText(text: string): string | null {
  const plain = text.trim().toLowerCase()
  return units.find(([pattern]) => pattern.test(plain))?.[1] ?? null
}

/** Reads a column's name and, where the file has one, its cell in the row of units. */
export function readHead(name: string, unitCell: string): HeadReading {
  const words = headWords(name)
  const isQuality = /^(qc|flag|quality|qual)\b|\b(flag|qc|qual|quality)$/.test(words)
  const quantity = quantities.find(([pattern]) => pattern.test(words))?.[1] ?? null
  const bracket = /[([]([^)\]]*)[)\]]\s*$/.exec(name)?.[1] ?? ''
  const suffix = /_([A-Za-z%]+?)(?:_(?:msl|agl|asl))?$/.exec(name)?.[1] ?? ''
  const found = [unitCell, bracket, suffix].map(unitFromText).find(entry => entry !== null) ?? null
  const fits = quantity !== null && found !== null && findMeasuredQuantity(quantity)?.units.some(entry => entry.ucum === found)
  const height = /(?:@|\bat|_|\b)\s*(\d{1,3}(?:\.\d+)?)\s*m\b/i.exec(name.replace(/[([][^)\]]*[)\]]\s*$/, ''))
  return {
    quantity: isQuality ? 'other' : quantity,
    unit: fits ? found : null,
    heightM: height && quantity !== 'height' ? Number(height[1]) : null,
    isQuality,
  }
}
