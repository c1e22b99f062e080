import { describe, expect, it } from 'vitest'
import { draftOf, freeKey, problemAt } from '../../../../components/lab/labDraft'
import { readDraft, typedNumber } from '../../../../components/lab/readDraft'
import { readPost, type PostDraft } from '../../../../components/lab/postDraft'
import { labBody } from '../../../../shared/schemas/lab'

const body = labBody.parse({
  title: 'Rates', text: 'Text', supply: [{ versionId: 'v', leg: 'up', lowM: 0, highM: 120.5 }],
  steps: [
    { key: 'rate', kind: 'number', title: 'Rate', pointsMilli: 2500, quantity: 'lapse-rate-least-squares', unit: 'K/km', granted: { absolute: 0.2, relative: 0.015 }, slipMilli: 500, inputs: { height: { from: 'share', column: 'height', read: 'layer' }, temperature: { from: 'share', column: 'air-temperature', read: 'layer' } } },
    { key: 'class', kind: 'number', title: 'Class', pointsMilli: 1000, quantity: 'static-stability', unit: '1', inputs: { lapseRate: { from: 'step', key: 'rate' }, other: { from: 'text', value: -3, unit: 'K' }, third: { from: 'constant', name: 'g' } } },
  ],
})

describe('the editor’s fields', () => {
  it('give back the body that they were filled from', () => {
    expect(readDraft(draftOf(body)).body).toEqual(body)
  })
  it('keep what cannot be read, and name the field', () => {
    const draft = draftOf(body)
    draft.supply[0]!.highM = 'about 100'
    draft.steps[0]!.marks = '2,5'
    draft.steps[1]!.title = ' '
    const { body: read, problems } = readDraft(draft)
    expect(read).toBeNull()
    expect(problems.map(problem => problem.path)).toEqual(['supply.0.highM', 'steps.1.title'])
    expect(problemAt(problems, 'supply.0.highM')).toBe('A number, such as 100 or 0.5.')
    expect(draft.supply[0]!.highM).toBe('about 100')
  })
  it('refuse an input from a later step', () => {
    const draft = draftOf(body)
    draft.steps.reverse()
    expect(readDraft(draft).problems).toEqual([{ path: 'steps.0.inputs.lapseRate', message: 'An input can come from an earlier step only.' }])
  })
  it.each([['2,5', 2.5], ['−20', -20], ['.5', 0.5], ['', undefined], ['1e3', '1e3'], ['12 m', '12 m']])('read "%s" as %s', (typed, value) => {
    expect(typedNumber(typed)).toBe(value)
  })
  it('find a free key', () => {
    expect(freeKey('Lapse rate, 2', [])).toBe('lapse-rate-2')
    expect(freeKey('Lapse rate', ['lapse-rate', 'lapse-rate-2'])).toBe('lapse-rate-3')
    expect(freeKey('123', [])).toBe('step')
  })
})

describe('the fields of a posting', () => {
  const draft = (): PostDraft => ({
    sections: [{ sectionId: 'a', name: 'A', students: 3, isChosen: false, opensLocal: '', dueLocal: '' }, { sectionId: 'b', name: 'B', students: 4, isChosen: true, opensLocal: '2026-10-12T08:00', dueLocal: '2026-10-23T17:00' }],
    rule: 'of_earned', percent: '12,5', closesAfterDays: '7', attempts: '3', keep: 'best', feedback: 'after_release',
  })
  it('send the chosen sections only', () => {
    expect(readPost(draft()).body).toEqual({ sections: [{ sectionId: 'b', opensLocal: '2026-10-12T08:00', dueLocal: '2026-10-23T17:00' }], lateRule: { kind: 'of_earned', percent: 12.5, closesAfterDays: 7 }, attempts: 3, keep: 'best', feedback: 'after_release' })
  })
  it('send no numbers with the rule that has none', () => {
    expect(readPost({ ...draft(), rule: 'none', percent: '', closesAfterDays: '' }).body?.lateRule).toEqual({ kind: 'none' })
  })
  it('name what is missing', () => {
    expect(readPost({ ...draft(), closesAfterDays: '', attempts: 'two' }).problems.map(problem => problem.path)).toEqual(['lateRule.closesAfterDays', 'attempts'])
  })
})
