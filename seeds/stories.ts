import type { Doing } from './students'

/** What the demo wants to happen to certain people; all others work as their habits have it. */
const slip = (key: string): Doing => ({ does: 'slip', slip: key })

export type StoriedLab = 'past-inversion' | 'past-weighing' | 'past-heat' | 'past-small' | 'inversion' | 'weighing' | 'heat' | 'lid' | 'small-weighing' | 'small-inversion'

/** Answers that a story needs, by lab, student and step. */
export const told: Partial<Record<StoriedLab, Readonly<Record<string, Readonly<Record<string, Doing>>>>>> = {
  'past-inversion': {
    'cyrus.bahrami': { 'rate-ends': slip('sign'), 'rate-fit': { does: 'right' } },
    'kirsi.lahdelma': { 'theta-top': slip('station-pressure') },
  },
  'past-heat': { 'liam.ockendon': { 'lifted-work': slip('sign') } },
  'inversion': {
    'farid.nazarov': { 'rate-ends': slip('sign'), 'rate-fit': { does: 'right' } },
    'ines.carvalhal': { 'rate-ends': slip('sign') },
    'bao.trinh': { 'rate-ends': slip('sign') },
    'elspeth.mcquarrie': { 'theta-top': slip('station-pressure') },
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
  'small-weighing': { 'linnea.castellan': { 'theta-top': slip('station-pressure') }, 'roya.farahani': { thickness: { does: 'miscalculated' } } },
}
