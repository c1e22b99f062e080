import { staff, type SeedPerson } from './people'
import type { Doing } from './students'

/** What the demo wants to happen to certain people; all others work as their habits have it. */
const slip = (key: string): Doing => ({ does: 'slip', slip: key })

export type StoriedLab = 'past-inversion' | 'past-weighing' | 'past-heat' | 'past-small' | 'inversion' | 'weighing' | 'heat' | 'lid' | 'small-weighing' | 'small-inversion'

/** Answers that a story needs, by lab, student and step. */
export const told: Partial<Record<StoriedLab, Readonly<Record<string, Readonly<Record<string, Doing>>>>>> = {
  'past-inversion': {
    'cyrus.bahrami': { 'rate-ends': slip('sign'), 'rate-fit': { does: 'right' } },
    'kirsi.lahdelma': { 'theta-base': slip('station-pressure'), 'theta-top': slip('station-pressure') },
  },
  'past-heat': { 'liam.ockendon': { 'lifted-work': slip('sign') } },
  'inversion': {
    'farid.nazarov': { 'rate-ends': slip('sign'), 'rate-fit': { does: 'right' } },
    'ines.carvalhal': { 'rate-ends': slip('sign') },
    'bao.trinh': { 'rate-ends': slip('sign') },
    'elspeth.mcquarrie': { 'theta-base': slip('station-pressure'), 'theta-top': slip('station-pressure') },
    'mateo.quispe': { parcel: slip('standard-atmosphere') },
    'amara.oyelaran': Object.fromEntries(['rate-ends', 'rate-fit', 'fit-error', 'stability', 'theta-base', 'theta-top', 'dry-rate', 'parcel'].map(step => [step, { does: 'right' } as const])),
  },
  'weighing': {
    'amara.oyelaran': { 'thickness': slip('base-10'), 'density-base': { does: 'right' }, 'theta-top': { does: 'right' } },
    'greta.osterlund': { 'density-top': { does: 'coarse' } },
    'tariq.al-mansouri': { 'theta-base': slip('station-pressure'), 'theta-top': slip('station-pressure') },
    'yildiz.karaca': { thickness: slip('celsius-for-kelvin') },
    'oskar.wikander': { 'theta-top': { does: 'miscalculated' } },
    'june.halvarson': { 'theta-base': slip('standard-pressure') },
  },
  'heat': {
    'amara.oyelaran': { heat: { does: 'right' }, work: slip('cp-for-r') },
    'ravi.sundaresan': { 'heat': slip('cv-for-cp'), 'internal': slip('cp-for-cv'), 'lifted-work': slip('sign') },
  },
  'small-weighing': { 'linnea.castellan': { 'theta-base': { does: 'right' }, 'theta-top': slip('station-pressure') }, 'roya.farahani': { thickness: { does: 'miscalculated' } } },
}

export interface Objection {
  lab: StoriedLab
  student: string
  step: string
  /** Hours after the release. */
  after: number
  words: string
  /** Somebody has it in hand at this moment. */
  taken?: SeedPerson
  ruled?: { after: number, by: SeedPerson, role: 'ta' | 'instructor' | 'lead', reason: string } & ({ kind: 'uphold' } | { kind: 'change', part: number } | { kind: 'accept', slip: string })
}

export const objections: readonly Objection[] = [
  {
    lab: 'past-inversion', student: 'cyrus.bahrami', step: 'rate-ends', after: 26,
    words: 'The temperature goes up with height in my layer, and that is what my positive number says. My fitted rate in the next step has the other sign and got full marks, so I clearly know which way it goes.',
    ruled: { after: 50, by: staff.formerTa, role: 'ta', kind: 'uphold', reason: 'The line above the field says that the rate is positive where it gets colder with height. Your layer gets warmer, so the rate is negative. The step after this one shows that you know it; the mark for this one still goes by what was asked.' },
  },
  {
    lab: 'past-inversion', student: 'kirsi.lahdelma', step: 'theta-top', after: 40,
    words: 'I referred the potential temperature to the pressure at our station because the lab notes say "bring both to the same pressure". It does not say that this has to be 1000 hPa until the formula.',
    ruled: { after: 95, by: staff.taAndStudent, role: 'ta', kind: 'change', part: 0.5, reason: 'The formula in the text and the line above the field both name 1000 hPa, so it is not the value asked. The reading of the sentence before it is a fair one, and the same pressure was used for both rows. Half the marks; the sentence is changed for next term.' },
  },
  {
    lab: 'past-heat', student: 'liam.ockendon', step: 'lifted-work', after: 20,
    words: 'In our chemistry course work is counted positive when it is done on the gas. That is what I did here.',
    ruled: { after: 46, by: staff.formerTa, role: 'ta', kind: 'uphold', reason: 'Both signs are in use, which is why the text and the line above the field say which one is meant: positive when the air does the work.' },
  },
  {
    lab: 'inversion', student: 'farid.nazarov', step: 'rate-ends', after: 22,
    words: 'On the slide of the second week the rate of an inversion is written as "+4 K per 100 m". I followed the slide. With the slide’s sign my value is exactly the worked one.',
    ruled: { after: 70, by: staff.instructor, role: 'instructor', kind: 'accept', slip: 'sign', reason: 'The slide is ours and it does say so. For this step of this lab both signs count, for everybody who followed it. The slide is corrected; from the next lab on the line above the field decides.' },
  },
  {
    lab: 'inversion', student: 'elspeth.mcquarrie', step: 'theta-top', after: 30,
    words: 'My value is only a few kelvins away from the worked one, and the difference between base and top is right to the digit. I think it deserves the marks.',
    ruled: { after: 51, by: staff.otherTa, role: 'ta', kind: 'uphold', reason: 'Your value refers to the pressure of the station. The difference survives that, the value does not: it was asked at 1000 hPa, and no rounding or choice of constants comes near the difference.' },
  },
  {
    lab: 'inversion', student: 'mateo.quispe', step: 'parcel', after: 47,
    words: 'The air in a standard atmosphere cools by 6.5 K/km. I do not see why a parcel in it should cool by anything else.',
    ruled: { after: 76, by: staff.taAndStudent, role: 'ta', kind: 'uphold', reason: '6.5 K/km is how the surroundings change on the average. A parcel that exchanges no heat cools at g/cp whatever is around it; the comparison between the two is the point of the step. Come to office hours if you like to go through it.' },
  },
  {
    lab: 'weighing', student: 'greta.osterlund', step: 'density-top', after: 5,
    words: 'I gave three digits where four were asked. The three that I gave are right. Could I at least have part of the marks?',
  },
  {
    lab: 'weighing', student: 'yildiz.karaca', step: 'thickness', after: 20,
    words: 'I put in the mean temperature exactly as the table prints it. Nowhere in the table does it say kelvins.',
    taken: staff.otherTa,
  },
  {
    lab: 'weighing', student: 'oskar.wikander', step: 'theta-top', after: 28,
    words: 'I have gone through this three times now and always get the same. Could somebody look at my working? I can bring the notebook.',
  },
  {
    lab: 'weighing', student: 'june.halvarson', step: 'theta-base', after: 9,
    words: 'My physics book refers everything to 1013.25 hPa. That is also a pressure that everybody agrees on.',
    ruled: { after: 33, by: staff.ta, role: 'ta', kind: 'uphold', reason: '1013.25 hPa is the standard pressure at sea level. Potential temperature is defined at 1000 hPa, and the line above the field says so. It is worth knowing for the next lab, where the same slip would cost the same.' },
  },
  {
    lab: 'small-weighing', student: 'linnea.castellan', step: 'theta-top', after: 14,
    words: 'I took the field’s own pressure for the reference by habit, from the tower data. I would like to know whether the difference at least can count.',
    ruled: { after: 41, by: staff.secondLead, role: 'lead', kind: 'uphold', reason: 'You have explained it yourself: it is the reference that was asked about. The base is right, so the difference does not come out either.' },
  },
]
