import { describe, expect, it } from 'vitest'
import { checkBand } from '#shared/marking/proof'
import { closed1004 } from '#shared/thermo/conventions/closed1004'
import { askedQuestion } from '../../../server/domain/shares/questionFor'
import { serveFlight, serveRows, type Flight } from '../../../server/domain/shares/servedData'
import { dayOfTerm, demoCalendar } from '../../../seeds/calendar'
import { layers, layersOf, readyLab, readyLabs, type ReadyLab } from '../../../seeds/labs'
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
    columns: [column(2, 'Height', 'height', 'm', 1), column(3, 'Pressure', 'pressure', 'hPa', 1), column(4, 'Air temperature', 'air-temperature', 'Cel', 2)],
  }
}

const meant: Record<ReadyLab, { flights: readonly number[], bounds: keyof typeof layers }> = {
  'morning-inversion': { flights: [0], bounds: 'inversion' },
  'weighing-a-layer': { flights: [0, 1, 2], bounds: 'deep' },
  'heated-layer': { flights: [0], bounds: 'inversion' },
  'lid-comes-off': { flights: [1], bounds: 'floating' },
}

describe.each([['winter', Date.UTC(2027, 0, 20, 18)], ['spring', Date.UTC(2027, 3, 22, 18)], ['summer', Date.UTC(2027, 7, 5, 18)], ['autumn', Date.UTC(2026, 11, 1, 18)]] as const)('in %s', (_season, now) => {
  const mornings = flightsAround(now)
  it.each(readyLabs)('the lab %s can be asked of every layer that it is meant for, and its ranges stay clear of slips', (key) => {
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
  it.each(readyLabs)('%s says what it measures in its own words, long enough to work from', (key) => {
    const { text } = readyLab(key, [])
    expect(text.split(/\s+/).length).toBeGreaterThan(250)
    expect((text.match(/\$/g) ?? []).length % 2).toBe(0)
  })

  it('where people may go out, the text defers to the authority, the safety office and whoever is in charge', () => {
    const { text } = readyLab('morning-inversion', [])
    for (const words of ['aviation authority', 'safety office', 'person in charge', 'No flight may be decided']) expect(text).toContain(words)
  })
})
