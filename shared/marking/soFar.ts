export interface StandingLab { standing: 'open' | 'submitted' | 'late_open' | 'missing' | 'excused' | 'not_counted' | 'released' | 'withdrawn', totalMilli: number | null, maxMilli: number }

/**
 * What counts of a student's labs so far, in thousandths. Released marks count; missing is zero of its maximum; excused, not counted, withdrawn and what is not
 * released leave sum and denominator both.
 * @example soFarOf([{ standing: 'released', totalMilli: 80_000, maxMilli: 100_000 }, { standing: 'excused', totalMilli: null, maxMilli: 100_000 }, { standing: 'released', totalMilli: 60_000, maxMilli: 100_000 }]) // 140 of 200: 70 %
 */
export function soFarOf(labs: readonly StandingLab[]): { labs: number, earnedMilli: number, maxMilli: number } {
  const counting = labs.filter(lab => lab.standing === 'missing' || (lab.standing === 'released' && lab.totalMilli !== null))
  return {
    labs: counting.length,
    earnedMilli: counting.reduce((sum, lab) => sum + (lab.standing === 'missing' ? 0 : lab.totalMilli ?? 0), 0),
    maxMilli: counting.reduce((sum, lab) => sum + lab.maxMilli, 0),
  }
}
