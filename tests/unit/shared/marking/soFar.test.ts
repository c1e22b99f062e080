import { expect, it } from 'vitest'
import { soFarOf } from '#shared/marking/soFar'

const lab = (standing: Parameters<typeof soFarOf>[0][number]['standing'], total: number | null = null) => ({ standing, totalMilli: total, maxMilli: 100_000 })

it('K11: 80, excused, 60 is 70 %: excused leaves the denominator', () => {
  const { earnedMilli, maxMilli, labs } = soFarOf([lab('released', 80_000), lab('excused'), lab('released', 60_000)])
  expect([labs, earnedMilli / maxMilli]).toEqual([2, 0.7])
})

it('K11: missing is zero; not counted, unreleased, open and withdrawn are left out', () => {
  expect(soFarOf([lab('released', 80_000), lab('missing')])).toEqual({ labs: 2, earnedMilli: 80_000, maxMilli: 200_000 })
  expect(soFarOf([lab('not_counted', 10_000), lab('submitted', 10_000), lab('open'), lab('late_open'), lab('withdrawn', 10_000)])).toEqual({ labs: 0, earnedMilli: 0, maxMilli: 0 })
})
