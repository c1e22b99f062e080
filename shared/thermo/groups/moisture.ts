import type { QuantityGroup } from '../definition'

export const moisture: QuantityGroup = {
  key: 'moisture',
  title: 'Moisture',
  quantities: [],
}
