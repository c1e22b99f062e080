import { movedByDays } from '../terms/wallClock'

/** Days after release in which a student can object to a mark. */
export const objectionDays = 14

/** The end of the time for objections: the same wall time, so many local dates after release. */
export const objectUntil = (releasedAt: number, zone: string): number => movedByDays(releasedAt, objectionDays, zone)
