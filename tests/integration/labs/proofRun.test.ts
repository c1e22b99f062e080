import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { labBody, type LabBody } from '../../../shared/schemas/lab'
import { defaultConvention } from '../../../shared/thermo/conventions'
import { ensureConvention } from '../../../server/domain/labs/conventions'
import { createLab } from '../../../server/domain/labs/createLab'
import { postLab } from '../../../server/domain/labs/postLab'
import { ownReds } from '../../../server/domain/labs/proof/ownRed'
import { players } from '../../../server/domain/labs/proof/playedStudents'
import { proofRun } from '../../../server/domain/labs/proof/proofRun'
import { saveRevision } from '../../../server/domain/labs/saveRevision'
import { openObservations, type Observations } from '../../../server/observations/chunks'
import { climb, smallFlight } from '../../fixtures/smallFlight'
import { inTerm as now, smallDepartment } from '../../fixtures/smallDepartment'
import { temporaryStores, type TemporaryStores } from '../../fixtures/temporaryStores'

let stores: TemporaryStores
let observations: Observations
let department: Awaited<ReturnType<typeof smallDepartment>>
let bookish: string, usual: string

const layer = (column: string) => ({ from: 'share', column, read: 'layer' })
const rate = { key: 'rate', kind: 'number', title: 'Lapse rate', pointsMilli: 3000, quantity: 'lapse-rate-least-squares', unit: 'K/km', inputs: { height: layer('height'), temperature: layer('air-temperature') } }
const lifted = { key: 'lifted', kind: 'number', title: 'Lifted by 1500 m', pointsMilli: 2000, quantity: 'parcel-temperature-by-height', unit: 'Cel', inputs: { temperature: { from: 'share', column: 'air-temperature', read: 'lowest' }, heightDifference: { from: 'text', value: 1500, unit: 'm' }, lapseRate: { from: 'step', key: 'rate' } } }
const body = (versionId: string, steps: unknown[], layers = [[0, 300]]): LabBody => labBody.parse({ title: 'Proved', supply: layers.map(([lowM, highM]) => ({ versionId, leg: 'up', lowM, highM })), steps })
const make = async (of: LabBody) => (await createLab(stores, { ...department.asked, courseId: department.courseId, body: of }, now)).id
const prove = async (labId: string) => proofRun(stores.read, observations, labId)
const post = (labId: string, seenVersion = 1) => postLab(stores, observations, { ...department.asked, labId, seenVersion, seed: Buffer.alloc(16, 1), posting: { sections: [{ sectionId: department.sectionA, opensLocal: '2026-10-12T08:00', dueLocal: '2026-10-23T17:00' }], attempts: 1, keep: 'last', feedback: 'after_release' } }, now)

beforeAll(async () => {
  stores = await temporaryStores()
  department = await smallDepartment(stores)
  const { id } = await stores.write(trx => ensureConvention(trx, defaultConvention, now))
  await stores.write(trx => trx.updateTable('course').set({ convention_revision_id: id }).where('id', '=', department.courseId).execute())
  const flight = (title: string, slope: number, start = 12.3) => smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title, rows: climb(400, 10, slope, start), actorId: department.asked.actorId }, now)
  bookish = await flight('Morning', 8.1, 15)
  usual = await flight('Noon', 8.1)
  observations = openObservations(stores.dataDir)
})
afterAll(async () => {
  observations.close()
  await stores.remove()
})

describe('the proof run', () => {
  it('types every accepted way and every slip as a student would, and finds the ways inside and the slips outside', async () => {
    const told = await prove(await make(body(usual, [rate, lifted])))
    expect(told.reds).toEqual([])
    expect(told.isReady).toBe(true)
    const proof = told.shares[0]!.proofs.lifted!
    expect(proof.ways.length).toBeGreaterThan(0)
    expect(proof.ways.every(way => way.isInside && /^-?\d+\.\d °C$/.test(way.typed))).toBe(true)
    expect(told.shares[0]!.proofs.rate!.slips.find(slip => slip.key === 'sign')).toMatchObject({ isOutside: true, pointsMilli: 0 })
    expect(told.shares[0]!.proofs.rate!.triesToFind).toBeGreaterThan(100)
    expect(told.shares[0]!.proofs.rate!.toClassLimit).toBeGreaterThan(1)
  })

  it('plays six students: two that work rightly have all marks, the early rounder and the swapped axes show what they lose', async () => {
    const told = await prove(await make(body(usual, [rate, lifted])))
    const earned = Object.fromEntries(told.shares[0]!.played.map(played => [played.player, played.earnedMilli]))
    expect(Object.keys(earned)).toEqual(players.map(player => player.key))
    expect(earned.spreadsheet).toBe(5000)
    expect(earned.notebook).toBe(5000)
    expect(earned.swapped).toBeLessThan(5000)
    expect(earned.guesser).toBe(0)
    // a carried value: who lost the rate by exchanged axes is right on what follows from it, so one slip costs once
    expect(told.shares[0]!.played.find(played => played.player === 'swapped')!.steps.map(step => step.isAccepted)).toEqual([false, true])
  })

  it('is red where a correct way loses: the early digits of a lab that asks for more than its rows decide are told by a player', async () => {
    const told = await prove(await make(body(usual, [{ ...rate, slipMilli: 0, digits: 3, digitsMilli: 0, granted: {} }, { ...rate, key: 'wide', granted: { absolute: 0.3 } }])))
    // a band of ± 0.3 K/km reaches the fit turned round, which is a slip: it would win
    expect(told.reds.map(red => red.kind)).toContain('slip_wins')
    expect(told.isReady).toBe(false)
  })

  it('stops a posting until each finding is settled or owned by name, and a change of the lab makes it a new finding', async () => {
    const own = { key: 'own', kind: 'reading', title: 'Your thermometer', pointsMilli: 1000, quantity: 'observed-air-temperature', unit: 'Cel', inputs: { station: { from: 'share', column: 'air-temperature', read: 'lowest' } }, accuracy: { station: 0.2, own: 0.3 } }
    const labId = await make(body(bookish, [own]))
    const [red] = (await prove(labId)).reds
    expect(red).toMatchObject({ kind: 'guesser_wins', owned: null })
    await expect(post(labId)).rejects.toMatchObject({ code: 'proof_open', facts: { count: 1 } })
    await ownReds(stores, { ...department.asked, labId, keys: [red!.key], reason: 'The value of the day is what it is.' }, now)
    expect((await prove(labId)).reds[0]!.owned).toMatchObject({ reason: 'The value of the day is what it is.' })
    await saveRevision(stores, { labId, actorId: department.asked.actorId, seenVersion: 1, body: body(bookish, [{ ...own, title: 'Another title' }]) }, now)
    await expect(post(labId, 2)).rejects.toMatchObject({ code: 'proof_open' })
    const [again] = (await prove(labId)).reds
    await ownReds(stores, { ...department.asked, labId, keys: [again!.key], reason: 'As before.' }, now)
    await expect(post(labId, 2)).resolves.toMatchObject({ shares: 1 })
    await expect(ownReds(stores, { ...department.asked, labId, keys: ['x'], reason: 'too late' }, now)).rejects.toMatchObject({ code: 'lab_not_draft' })
  })

  it('names a share unlike the others', async () => {
    const { heights, temperatures } = climb(400, 10, 8.1, 12.3)
    const nearly = await smallFlight(stores, stores.dataDir, { ownerCourseId: department.courseId, title: 'Flat', rows: { heights, temperatures: heights.map((height, row) => height > 200 ? Number((temperatures[20]! - 0.0006 * (height - 200)).toFixed(2)) : temperatures[row]!) }, actorId: department.asked.actorId }, now)
    const told = await prove(await make({ ...body(usual, [{ ...rate, granted: { absolute: 0.1 } }], [[0, 300], [50, 300], [100, 300]]), supply: [...body(usual, [], [[0, 300], [50, 300], [100, 300]]).supply, ...body(nearly, [], [[210, 400]]).supply] }))
    expect(told.reds.filter(red => red.kind === 'unequal').map(red => red.text).join()).toContain('times as wide')
  })
})
