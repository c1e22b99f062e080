import { expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { describeWithShared } from '../../../fixtures/sharedFolder'
import { computedFor, distanceOf, publishedRows } from '../../../fixtures/thermo/publishedRows'

describeWithShared('published values', () => {
  it('finds the rows of its quantities in the table', () => expect(publishedRows.length).toBeGreaterThanOrEqual(150))
  it.each(publishedRows.map(row => [row.id, row.quantity, row.expected, row.unit, row.tolerance, row.source, row.status, row] as const))(
    '%s %s: %s %s ± %s (%s; %s)', (_id, _quantity, _expected, _unit, _tolerance, _source, _status, row) => {
      const got = computedFor(row, defaultConvention.constants)
      const { by, allowed } = distanceOf(row, got)
      expect(by, `computed ${got}`).toBeLessThanOrEqual(allowed)
    }, 60_000)
})
