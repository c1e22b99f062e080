/**
 * Plausible values and steps of readings at a station, in the quantity's canonical unit. They mark a value, they never remove one.
 *
 * Range: I. Zahumensky, Guidelines on Quality Control Procedures for Data from Automatic Weather Stations, WMO CBS/OPAG-IOS
 * ET AWS-3/Doc. 4(1), 2004, plausible value check; as transcribed. Relative humidity reaches 104 % because instruments do
 * (ZAMG practice, H. Gmoser, ET AWS-1/Doc. 9(2), 2002); a gust reaches 150 m/s (from memory: WMO-No. 488).
 * Night radiation of some −W/m² is the instrument's thermal offset and stays unmarked down to −10 W/m² (our parameter).
 */
export const plausibleRange: Readonly<Record<string, readonly [number, number]>> = {
  'air-temperature': [-80, 60],
  'dewpoint': [-80, 35],
  'wet-bulb-temperature': [-80, 60],
  'surface-temperature': [-80, 80],
  'soil-temperature': [-50, 50],
  'relative-humidity': [0, 104],
  'pressure': [500, 1100],
  'wind-direction': [0, 360],
  'wind-speed': [0, 75],
  'wind-gust': [0, 150],
  'global-radiation': [-10, 1600],
}

/**
 * Greatest change between neighboring rows, by how far they lie apart. One minute: Zahumensky (2004), suspect limit for 1-minute values.
 * One hour: WMO-No. 305 (1993), chapter 6, tolerance for 1 h; as transcribed. Other intervals have no published limit and are not judged.
 */
export const greatestStep: Readonly<Record<string, readonly { fromS: number, toS: number, limit: number }[]>> = {
  'air-temperature': [{ fromS: 30, toS: 90, limit: 3 }, { fromS: 2700, toS: 4500, limit: 4 }],
  'dewpoint': [{ fromS: 30, toS: 90, limit: 3 }, { fromS: 2700, toS: 4500, limit: 4 }],
  'relative-humidity': [{ fromS: 30, toS: 90, limit: 10 }],
  'pressure': [{ fromS: 30, toS: 90, limit: 0.5 }, { fromS: 2700, toS: 4500, limit: 3 }],
  'wind-speed': [{ fromS: 30, toS: 90, limit: 10 }],
  'global-radiation': [{ fromS: 30, toS: 90, limit: 800 }],
}
