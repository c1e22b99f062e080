import type { QuantityGroup } from '../definition'

export const parcels: QuantityGroup = {
  key: 'parcels',
  title: 'Parcels in a sounding',
  quantities: [],
}
