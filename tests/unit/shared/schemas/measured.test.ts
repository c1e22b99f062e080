import { describe, expect, it } from 'vitest'
import { findMeasuredUnit, measuredQuantities } from '../../../../shared/schemas/measured'

// One of a unit in the canonical one, from outside. NIST Special Publication 811 (2008), Appendix B.8, unless said otherwise;
// the tolerance is half a unit of the last digit printed there. °F: t/°C = (t/°F − 32)/1.8.
const published = [
  ['pressure', '[in_i\'Hg]', 1, 33.86389, 5e-4, 'inch of mercury, conventional'],
  ['pressure', 'mm[Hg]', 1, 1.333224, 5e-6, 'millimeter of mercury, conventional'],
  ['pressure', 'kPa', 1, 10, 1e-12, 'prefixes'],
  ['wind-speed', '[kn_i]', 1, 0.5144444, 5e-8, 'knot'],
  ['wind-speed', '[mi_i]/h', 1, 0.44704, 1e-12, 'mile per hour, exact'],
  ['wind-speed', 'km/h', 1, 0.2777778, 5e-8, 'kilometer per hour'],
  ['height', '[ft_i]', 1, 0.3048, 1e-12, 'foot, exact'],
  ['precipitation', '[in_i]', 1, 25.4, 1e-12, 'inch, exact'],
  ['visibility', '[mi_i]', 1, 1609.344, 1e-9, 'mile, exact'],
  ['air-temperature', '[degF]', 212, 100, 1e-9, 'boiling water by the definition of the scale'],
  ['air-temperature', '[degF]', -40, -40, 1e-9, 'where both scales meet'],
  ['air-temperature', 'K', 0, -273.15, 1e-9, 'absolute zero'],
  ['radiant-exposure', 'kW.h/m2', 1, 3.6, 1e-12, 'kilowatt hour, exact'],
  ['relative-humidity', '1', 1, 100, 1e-12, 'percent'],
  ['wind-direction', '45.deg/2', 1, 22.5, 1e-12, 'sixteenths of a circle'],
  ['elapsed-time', 'h', 1, 3600, 1e-9, 'hour, exact'],
] as const

describe('the units that files use', () => {
  it.each(published)('%s: in %s, %d is %d ± %d (%s)', (quantity, ucum, value, expected, tolerance) => {
    const unit = findMeasuredUnit(quantity, ucum)!
    expect(Math.abs(value * unit.factor + unit.offset - expected)).toBeLessThanOrEqual(tolerance)
  })

  it('lead to the canonical one of each quantity, which leads to itself', () => {
    for (const { units, canonical } of measuredQuantities) expect(units.find(unit => unit.ucum === canonical)).toMatchObject({ factor: 1, offset: 0 })
  })
})
