import { beforeAll, expect, it } from 'vitest'
import { describeTraced } from '../fixtures/describeTraced'
import { killRun, type KillRun } from './killRun'

// R1, short: a spread of points with each sync among them; `npm run faults` meets every one.
describeTraced('the server killed at the writes of a submission', () => {
  let run: KillRun
  beforeAll(async () => { run = await killRun({ submission: 4, mail: 1, control: 3 }) }, 480_000)

  it('loses nothing that was acknowledged and leaves nothing half there', () => {
    expect(run.submission.wrong).toEqual([])
    expect(run.mail.wrong).toEqual([])
    expect(run.submission.lost + run.mail.lost).toBe(0)
  })

  it('was ended before, at and after the commit', () => {
    expect(run.counted.submission.files).toContain('main.db-wal')
    expect(run.submission.points + run.mail.points).toBeGreaterThanOrEqual(run.asked - 2) // its writes differ by a few from one to the next
    expect(run.submission.points).toBeGreaterThan(run.submission.storedUnanswered)
    expect(run.submission.storedUnanswered).toBeGreaterThan(0)
    expect(run.mail.acknowledged).toBeGreaterThan(0)
  })

  it('sees a server that answers before its commit', () => {
    expect(run.control.lost).toBeGreaterThan(0)
  })
})
