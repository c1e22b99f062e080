import type { QuantityGroup } from '../definition'
import { hypsometricThicknessDefinition } from '../quantities/hypsometricThickness'

export const hydrostatics: QuantityGroup = {
  key: 'hydrostatics',
  title: 'Hydrostatics',
  quantities: [
    hypsometricThicknessDefinition,
  ],
}
