import type { QuantityGroup } from '../definition'

export const moistProcesses: QuantityGroup = {
  key: 'moist-processes',
  title: 'Moist processes',
  quantities: [],
}
