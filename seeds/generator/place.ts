/** Where the invented department stands: a town on a ridge above a river. No such town, hall or field exists. */
export interface Place {
  station: string
  field: string
  zone: string
  latitude: number
  longitude: number
  /** Of the field from which the tethersonde flies, meters above sea level. */
  fieldElevationM: number
  /** Of the barometer on the roof. */
  barometerElevationM: number
}

export const place: Place = {
  station: 'Hedlund Hall roof',
  field: 'Cutbank meadow',
  zone: 'America/Chicago',
  latitude: 43.86,
  longitude: -91.42,
  fieldElevationM: 392,
  barometerElevationM: 414,
}
