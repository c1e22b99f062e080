import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { closed1004 } from '#shared/thermo/conventions/closed1004'
import { askedSteps, isNumber } from '#shared/schemas/askedSteps'
import { labKinds } from '#shared/schemas/labParts'
import { readLabFile } from '../../../server/domain/labs/labFile/readLabFile'
import { writeLabFile } from '../../../server/domain/labs/labFile/writeLabFile'
import { faultsOf, fillSupply, layersThatMeet } from '../../../server/domain/labs/library/fillSupply'
import { readyLabs } from '../../../server/domain/labs/library/readyLabs'
import { practiceFlight } from '../../../server/domain/labs/practice/practiceFlight'
import { askedQuestion } from '../../../server/domain/shares/questionFor'
import { serveFlight, serveRows, type Flight } from '../../../server/domain/shares/servedData'
import { dayOfTerm, demoCalendar } from '../../../seeds/calendar'
import { layers, layersOf, libraryTexts, readyLab, type ReadyLab } from '../../../seeds/labs'
import { Observing } from '../../../seeds/observing'

/** Two mornings' flights of a term that runs on this day, as files give them. */
function flightsAround(now: number): Flight[][] {
  const { running } = demoCalendar(now)
  const days = [2, 8].map(week => dayOfTerm(running, week, 3))
  const observing = new Observing(running.name, dayOfTerm(running, 1, 1), dayOfTerm(running, 9, 1), days)
  return days.map((date, which) => observing.flights(date, 21 + 3 * which).map(file => flightOf(file.title, file.content)))
}

function flightOf(title: string, content: string): Flight {
  const rows = content.split('\n').filter(line => line !== '' && !line.startsWith('#')).slice(1).map(line => line.split(','))
  const column = (at: number, name: string, quantity: string, unit: string, decimals: number) => ({ name, quantity, unit, decimals, role: 'value' as const, values: rows.map(row => Number(row[at])) })
  return {
    versionId: title, versionNo: 1, title, rootSha256: '', heightDatum: 'ground', time: rows.map(row => Date.parse(row[0] ?? '')), rowCount: rows.length,
    columns: [column(2, 'Height', 'height', 'm', 1), column(3, 'Pressure', 'pressure', 'hPa', 1), column(4, 'Air temperature', 'air-temperature', 'Cel', 2), column(5, 'Relative humidity', 'relative-humidity', '%', 1),
      column(6, 'Wind speed', 'wind-speed', 'm/s', 1), column(7, 'Wind from', 'wind-direction', 'deg', 0)],
  }
}

const library = readyLabs(libraryTexts())
const demoLabs = ['morning-inversion', 'weighing-a-layer', 'heated-layer', 'lid-comes-off'] as const

const meant: Record<ReadyLab, { flights: readonly number[], bounds: keyof typeof layers }> = {
  'morning-inversion': { flights: [0], bounds: 'inversion' },
  'weighing-a-layer': { flights: [0, 1, 2], bounds: 'deep' },
  'heated-layer': { flights: [0], bounds: 'inversion' },
  'lid-comes-off': { flights: [1], bounds: 'floating' },
}

describe.each([['winter', Date.UTC(2027, 0, 20, 18)], ['spring', Date.UTC(2027, 3, 22, 18)], ['summer', Date.UTC(2027, 7, 5, 18)], ['autumn', Date.UTC(2026, 11, 1, 18)]] as const)('in %s', (_season, now) => {
  const mornings = flightsAround(now)
  it.each(demoLabs)('the lab %s can be asked of every layer that the demo’s courses gave it, and its ranges stay clear of slips', (key) => {
    const body = readyLab(key, layersOf('any', layers[meant[key].bounds]))
    let asked = 0
    for (const morning of mornings) {
      for (const no of meant[key].flights) {
        const served = serveFlight(morning[no]!, body)
        for (const item of body.supply) {
          const ground = { rows: serveRows(served, item), convention: closed1004, share: { item }, revision: { body } }
          for (const step of body.steps) {
            const question = askedQuestion(ground, step.key, {})
            expect(question, `${morning[no]!.title} ${item.lowM}–${item.highM} ${step.key}`).toHaveProperty('question')
            if ('question' in question) expect(checkBand(question.question).reasons, `${morning[no]!.title} ${item.lowM}–${item.highM} ${step.key}`).toEqual([])
            asked++
          }
        }
      }
    }
    expect(asked).toBe(mornings.length * meant[key].flights.length * body.supply.length * body.steps.length)
  })

  it.each(library)('$key finds shares in these mornings by its own conditions; a layer that it leaves out lies where a slip gives nearly the right value', async ({ body }) => {
    const flights = mornings.flat()
    const found = flights.flatMap(flight => layersThatMeet(body, flight))
    const faults = found.map(layer => faultsOf(body, closed1004, layer))
    for (const fault of faults.flat()) expect(fault).toMatch(/which is the slip/)
    const taken = await fillSupply(body, closed1004, flights)
    expect(taken).toEqual(found.filter((_, at) => faults[at]?.length === 0).map(layer => layer.item).slice(0, body.conditions?.atMost))
    expect(taken.length).toBeGreaterThanOrEqual(3)
    expect(faults.filter(each => each.length > 0).length / found.length).toBeLessThan(0.4)
  })

  it('the inversion is one: its layers warm with height on the early flight, and the deep ones cool by noon', () => {
    for (const [early, , late] of mornings) {
      const warms = (flight: Flight, low: number, high: number) => {
        const [height, , temperature] = flight.columns
        const at = (z: number) => Array.from(height!.values).findIndex(value => value >= z)
        return temperature!.values[at(high)]! - temperature!.values[at(low)]!
      }
      expect(warms(early!, 3, 100)).toBeGreaterThan(2)
      expect(warms(late!, 3, 80)).toBeLessThan(0)
    }
  })
})

describe('the ready labs', () => {
  it('are ten, of every kind that there is', () => {
    expect(library.map(lab => lab.key)).toHaveLength(10)
    expect(new Set(library.map(lab => lab.body.kind))).toEqual(new Set(labKinds))
  })

  it.each(library)('$key is written as the program writes a lab, so that taking it out and in changes nothing', ({ key, body }) => {
    expect(writeLabFile(body)).toBe(libraryTexts().get(key))
    expect(readLabFile(writeLabFile(body)).body).toEqual(body)
  })

  it.each(library)('$key says what it measures in its own words, long enough to work from, with aims, outcomes, a marking guide and marks', ({ body }) => {
    expect(body.text.split(/\s+/).length).toBeGreaterThan(250)
    for (const text of [body.text, body.guide, ...body.steps.map(step => step.text)]) expect((text.match(/\$/g) ?? []).length % 2).toBe(0)
    expect(body.aims.length).toBeGreaterThanOrEqual(2)
    expect(body.outcomes.length).toBeGreaterThanOrEqual(2)
    expect(body.guide.split(/\s+/).length).toBeGreaterThan(50)
    expect(body.minutes).toBeGreaterThanOrEqual(60)
    expect(askedSteps(body).reduce((sum, step) => sum + step.pointsMilli, 0)).toBeGreaterThanOrEqual(8000)
    expect(body.supply).toEqual([])
  })

  it.each(library)('$key comes with readings for the practice, on which every step can be asked', ({ body }) => {
    expect(body.practice).not.toBeNull()
    const served = serveFlight(practiceFlight(body.practice!), body)
    const item = { versionId: 'practice', leg: body.practice!.leg, lowM: body.practice!.lowM, highM: body.practice!.highM }
    expect(faultsOf(body, closed1004, { item, rows: serveRows(served, item) })).toEqual([])
  })

  it('every kind of step is in use', () => {
    expect(new Set(library.flatMap(lab => lab.body.steps.map(step => step.kind)))).toEqual(new Set(['number', 'fit', 'table', 'diagram', 'reading', 'choice']))
    expect(library.flatMap(lab => askedSteps(lab.body)).filter(isNumber).length).toBeGreaterThan(50)
  })

  it('where people go out there is a plan: hazards with usual cautions, limits that others set, and somebody in charge', () => {
    const plans = library.flatMap(({ body }) => body.fieldPlan ? [{ plan: body.fieldPlan, text: body.text }] : [])
    expect(plans.length).toBeGreaterThanOrEqual(4)
    for (const { plan } of plans) {
      expect(plan.checks.every(check => check.limit === '' && /law|authority|safety office|department|building|owner/.test(check.setBy))).toBe(true)
      expect(plan.inCharge).not.toBe('')
      expect(JSON.stringify(plan)).not.toMatch(/\d+ ?(m\/s|km|m|kt)\b/)
    }
    for (const { body } of library) expect(`${body.text} ${JSON.stringify(body.fieldPlan)}`).not.toMatch(/\b(is|are) (perfectly |quite )?(safe|permitted|allowed)\b(?! to\.)/)
  })

  it('where people may go out, the text defers to the authority, the safety office and whoever is in charge', () => {
    const { text } = readyLab('morning-inversion', [])
    for (const words of ['aviation authority', 'safety office', 'person in charge', 'No flight may be decided']) expect(text).toContain(words)
  })
})
