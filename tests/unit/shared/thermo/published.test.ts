import { expect, it } from 'vitest'
import { defaultConvention } from '#shared/thermo/conventions/index'
import type { Constants } from '#shared/thermo/definition'
import type { Asked, Given } from '../../../fixtures/thermo/askedRows'
import { dryAir } from '../../../fixtures/thermo/asked/dryAir'
import { hydrostatics } from '../../../fixtures/thermo/asked/hydrostatics'
import { instruments } from '../../../fixtures/thermo/asked/instruments'
import { moisture } from '../../../fixtures/thermo/asked/moisture'
import { moistProcesses } from '../../../fixtures/thermo/asked/moistProcesses'
import { parcels } from '../../../fixtures/thermo/asked/parcels'
import { profiles } from '../../../fixtures/thermo/asked/profiles'
import { uncertainty } from '../../../fixtures/thermo/asked/uncertainty'
import { describeWithShared, hasShared, sharedTable } from '../../../fixtures/sharedFolder'

type Row = Record<string, string>
const constants = defaultConvention.constants

/** One map a room; a row of a quantity that is not here yet has none. */
const asked: Asked = { ...dryAir, ...hydrostatics, ...instruments, ...moisture, ...moistProcesses, ...parcels, ...profiles, ...uncertainty }

const rows: Row[] = hasShared ? sharedTable('checks/values.csv').filter(row => row.quantity !== undefined && row.quantity in asked) : []

function off(row: Row, with_: Constants): { got: number, by: number, allowed: number } {
  const given: Given = JSON.parse(row.inputs_json ?? '{}')
  const got = asked[row.quantity ?? '']?.(given, with_, row.id ?? '', row.unit ?? '') ?? NaN
  return { got, by: Math.abs(got - Number(row.expected)), allowed: Number(row.tolerance) }
}

describeWithShared('published values', () => {
  it('finds the rows of the first quantities in the table', () => expect(rows.length).toBeGreaterThanOrEqual(30))
  it.each(rows.map(row => [row.id, row.quantity, row.expected, row.unit, row.tolerance, row.source, row.status, row] as const))(
    '%s %s: %s %s ± %s (%s; %s)', (_id, _quantity, _expected, _unit, _tolerance, _source, _status, row) => {
      const { got, by, allowed } = off(row, constants)
      expect(by, `computed ${got}`).toBeLessThanOrEqual(allowed)
    })
  it.each(['cp', 'cv', 'R', 'g', 'p0'])('a %s that is 2 %% off turns a published check red', (name) => {
    const corrupted = { ...constants, [name]: (constants[name] ?? 0) * 1.02 }
    expect(rows.filter((row) => {
      const { by, allowed } = off(row, corrupted)
      return !(by <= allowed)
    }).length).toBeGreaterThan(0)
  })
})
