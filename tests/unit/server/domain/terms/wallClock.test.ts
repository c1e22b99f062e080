import { describe, expect, it } from 'vitest'
import { movedByDays, resolveWallTime, tellShift, wallTimeAt } from '../../../../../server/domain/terms/wallClock'

const iso = (at: number) => new Date(at).toISOString()

describe('wall times', () => {
  // K7: instants worked out by hand from the offsets of the zone (CST −6, CDT −5)
  it.each([
    ['K7 a skipped time falls after the gap', '2026-03-08T02:30', 'America/Chicago', '2026-03-08T08:30:00.000Z', 'skipped', '2026-03-08T03:30'],
    ['K7 a doubled time is the later one', '2026-11-01T01:30', 'America/Chicago', '2026-11-01T07:30:00.000Z', 'doubled', '2026-11-01T01:30'],
    ['an ordinary time is itself', '2026-10-23T17:00', 'America/Chicago', '2026-10-23T22:00:00.000Z', null, '2026-10-23T17:00'],
    ['the minute after the gap is not shifted', '2026-03-08T03:00', 'America/Chicago', '2026-03-08T08:00:00.000Z', null, '2026-03-08T03:00'],
    ['a gap of half an hour (Lord Howe)', '2026-10-04T02:15', 'Australia/Lord_Howe', '2026-10-03T15:45:00.000Z', 'skipped', '2026-10-04T02:45'],
  ])('%s', (_title, local, zone, at, shift, shown) => {
    const resolved = resolveWallTime(local, zone)
    expect(iso(resolved.at)).toBe(at)
    expect(resolved.shift).toBe(shift)
    expect(resolved.local).toBe(shown)
  })

  it('tells what a clock change made of the time', () => {
    expect(tellShift(resolveWallTime('2026-03-08T02:30', 'America/Chicago'), '2026-03-08T02:30')).toBe('The clocks skip 02:30 on 2026-03-08: 03:30 is taken.')
    expect(tellShift(resolveWallTime('2026-11-01T01:30', 'America/Chicago'), '2026-11-01T01:30')).toContain('the later one')
    expect(tellShift(resolveWallTime('2026-10-23T17:00', 'America/Chicago'), '2026-10-23T17:00')).toBeNull()
  })

  it('moves by local dates over a day of 25 hours (K8)', () => {
    const due = resolveWallTime('2026-10-24T23:59', 'Europe/Berlin').at
    expect(movedByDays(due, 1, 'Europe/Berlin') - due).toBe(25 * 3_600_000)
  })

  it('reads back what it resolved', () => {
    expect(wallTimeAt(resolveWallTime('2026-07-01T08:05', 'Asia/Kathmandu').at, 'Asia/Kathmandu')).toBe('2026-07-01T08:05')
  })

  it.each([['2026-02-30T10:00', 'UTC', 'dates_invalid'], ['2026-02-20 10:00', 'UTC', 'dates_invalid'], ['2026-02-20T10:00', 'Atlantis/Port', 'zone_unknown']])('refuses %s in %s as %s', (local, zone, code) => {
    expect(() => resolveWallTime(local, zone)).toThrow(expect.objectContaining({ code }))
  })
})
