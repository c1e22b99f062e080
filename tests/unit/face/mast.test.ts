import { describe, expect, it } from 'vitest'
import { coursePlaces, countWord, departmentPlaces, isHere, outerPlaces } from '../../../components/mast/places'
import { ropeSummary } from '../../../components/sheet/ropeStages'
import { ageWords } from '../../../composables/ageWords'
import { readProblem } from '../../../composables/readProblem'
import { weekOf } from '../../../server/domain/people/describePlaces'

describe('the mast', () => {
  it('shows a student no place of the staff', () => {
    expect(coursePlaces('c', 'student').map(place => place.word)).toEqual(['Work', 'Marks', 'Disputes'])
    expect(coursePlaces('c', 'ta').map(place => place.word)).toEqual(['Labs', 'Disputes', 'Marks', 'Data', 'People'])
  })

  it('knows where one is, and is not fooled by a longer word', () => {
    const place = { key: 'labs', word: 'Labs', to: '/c/1/labs' } as const
    expect(isHere(place, '/c/1/labs/7')).toBe(true)
    expect(isHere(place, '/c/1/labs')).toBe(true)
    expect(isHere(place, '/c/1/labsx')).toBe(false)
  })

  it('says counts as words and nothing where there is nothing', () => {
    expect(countWord('work', { due: 2, open: 0, fresh: 0 })).toBe('2 due')
    expect(countWord('disputes', { due: 2, open: 0, fresh: 0 })).toBeNull()
    expect(countWord('work', null)).toBeNull()
  })

  it('gives each department place once to who holds two roles', () => {
    const words = departmentPlaces(['admin', 'technician']).map(place => place.word)
    expect(new Set(words).size).toBe(words.length)
  })
})

describe('the mast outside a course', () => {
  it('leads to the courses that run, and leaves the closed ones to the list', () => {
    const courses = [{ id: 'a', code: 'AS 240', role: 'ta', termState: 'running' }, { id: 'b', code: 'AS 101', role: 'student', termState: 'closed' }] as const
    expect(outerPlaces(courses).map(place => place.to)).toEqual(['/', '/c/a/labs'])
    expect(isHere(outerPlaces(courses)[0]!, '/account')).toBe(false)
  })
})

describe('words of the running head', () => {
  it.each([[20_000, 'under a minute'], [240_000, '4 min'], [7_199_000, '119 min'], [7_200_000, '2 h'], [200_000_000, '2 days']])('%d ms is %s', (age, words) => expect(ageWords(age)).toBe(words))

  it('counts teaching weeks by their Mondays and none in a break', () => {
    const calendar = JSON.stringify({ weeks: ['2026-09-28', '2026-10-05', '2026-10-19'], holidays: [] })
    expect(weekOf(calendar, '2026-09-28')).toBe(1)
    expect(weekOf(calendar, '2026-10-11')).toBe(2)
    expect(weekOf(calendar, '2026-10-12')).toBeNull()
    expect(weekOf(calendar, '2026-10-25')).toBe(3)
    expect(weekOf('{}', '2026-10-25')).toBeNull()
  })
})

describe('the rope', () => {
  it('says how many are saved and which are not', () => {
    const stages = Array.from({ length: 40 }, (_, at) => ({ no: at + 1, label: `step ${at + 1}`, isDone: ![4, 6].includes(at + 1) }))
    expect(ropeSummary(stages)).toBe('38 of 40 saved; not yet: 4, 6')
    expect(ropeSummary(stages.map(stage => ({ ...stage, isDone: false })))).toBe('0 of 40 saved; not yet: 1, 2, 3, 4, 5, 6, 7, 8 and 32 more')
  })
})

describe('a failed request', () => {
  it('keeps the words that the server gave', () => {
    const read = readProblem({ statusCode: 409, data: { type: 'about:blank', title: 'Taken', detail: 'Ada has it.', status: 409, code: 'taken_by_another', facts: { by: 'Ada' } } })
    expect(read).toMatchObject({ title: 'Taken', detail: 'Ada has it.', code: 'taken_by_another', facts: { by: 'Ada' }, fields: [] })
  })
  it('tells a lost connection from a failing server', () => {
    expect(readProblem(new TypeError('Failed to fetch')).code).toBe('no_connection')
    expect(readProblem({ statusCode: 500, data: {} }).detail).toContain('500')
    expect(readProblem({ statusCode: 404 }).code).toBe('not_found')
  })
})
