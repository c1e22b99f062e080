import type { QuantityGroup } from '../definition'

export const instruments: QuantityGroup = {
  key: 'instruments',
  title: 'Instruments and the surface layer',
  quantities: [],
}
