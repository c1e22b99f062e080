import { describe, expect, it } from 'vitest'
import { judgeStep } from '#shared/marking/judge'
import type { ReadAnswer, StepQuestion } from '#shared/marking/types'
import { defaultConvention } from '#shared/thermo/conventions/index'
import { carriedNoteOf } from '../../../../../server/domain/marking/carriedNoteOf'

const nothing: ReadAnswer = { typed: '', reading: 'empty', valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null, message: '' }
const thickness = (carried: StepQuestion['carried']) => {
  const question: StepQuestion = { quantity: 'hypsometric-thickness', inputs: { pressureBottom: 100_000, pressureTop: 90_000, meanVirtualTemperature: 280 }, convention: defaultConvention, granted: {}, digits: 3, unit: 'm', maxMilli: 1000, ...(carried ? { carried } : {}) }
  return carriedNoteOf(question, judgeStep(question, nothing))
}

describe('why an earlier value does not count in a later step', () => {
  it('is said where it was carried and led to nothing: a layer whose base lies above its top', () => {
    expect(thickness({ pressureBottom: { valueSi: 80_000, halfUnitSi: 50 } })).toMatch(/^Not carried: with your earlier value of the pressure.* there is no .*thickness.* to compare with/)
  })
  it('is said in the judge\'s words where it was not carried at all', () => {
    expect(thickness({ pressureBottom: { valueSi: -5, halfUnitSi: 0 } })).toContain('lies outside what is physical here')
  })
  it('is not said where it was carried, or where there is none', () => {
    expect(thickness({ pressureBottom: { valueSi: 95_000, halfUnitSi: 50 } })).toBeNull()
    expect(thickness(undefined)).toBeNull()
  })
})
