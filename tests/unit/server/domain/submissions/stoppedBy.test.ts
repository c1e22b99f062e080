import { describe, expect, it } from 'vitest'
import type { PostedGround } from '../../../../../server/domain/submissions/ground'
import { stoppedBy } from '../../../../../server/domain/submissions/stoppedBy'

const dueAt = Date.parse('2026-10-16T22:00:00Z')
const hour = 3_600_000
const releasedAt = dueAt + 20 * hour

const ground = (given: Partial<PostedGround> = {}): PostedGround => ({
  shareId: 's', redraw: 0, newestRedraw: 0, dataSetVersionId: 'v', holderId: 'h', membershipId: 'm', membershipState: 'active', sectionId: 'a', courseId: 'c', courseCode: 'ATM 301', conventionRevisionId: 'r', termState: 'running',
  labId: 'l', labTitle: 'Lab', labState: 'posted', labRevisionId: 'lr', newestRevisionId: 'lr', postingId: 'p', postingState: 'posted', postingVersion: 1, opensAt: dueAt - 100 * hour, dueAt, zone: 'America/Chicago',
  lateRuleJson: '', lateRule: { kind: 'of_maximum', percent: 10, closesAfterDays: 7 }, attempts: 3, keep: 'best', feedback: 'after_release', releasedAt: null, allowedUntil: null, attemptsMade: 0, acceptedIds: [], ...given,
})

describe('what stops a submission', () => {
  it('is nothing while the lab takes work, late or not', () => {
    expect(stoppedBy(ground({ attemptsMade: 2 }), dueAt)).toBeNull()
    expect(stoppedBy(ground({ attemptsMade: 2 }), releasedAt)).toBeNull()
  })

  it('is the closing day, the last attempt, and a closed term without an allowance', () => {
    expect(stoppedBy(ground(), dueAt + 8 * 24 * hour)).toBe('lab_closed')
    expect(stoppedBy(ground({ attemptsMade: 3 }), dueAt)).toBe('attempts_used')
    expect(stoppedBy(ground({ termState: 'closed' }), dueAt)).toBe('term_closed')
    expect(stoppedBy(ground({ termState: 'closed', allowedUntil: dueAt + hour }), dueAt)).toBeNull()
  })

  it('is the release of marks for whoever has handed in and so sees the worked values, not for whoever has not, nor for what came before', () => {
    expect(stoppedBy(ground({ releasedAt, attemptsMade: 1 }), releasedAt)).toBe('marks_shown')
    expect(stoppedBy(ground({ releasedAt, attemptsMade: 1, allowedUntil: releasedAt + 48 * hour }), releasedAt + hour)).toBe('marks_shown')
    expect(stoppedBy(ground({ releasedAt, attemptsMade: 0 }), releasedAt + hour)).toBeNull()
    expect(stoppedBy(ground({ releasedAt, attemptsMade: 1 }), releasedAt - 1)).toBeNull()
  })
})
