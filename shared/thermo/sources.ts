/** Sources that several quantities of moist air name. */
import type { Source } from './definition'

export const glossary = (entry: string, status: Source['status'] = 'verified'): Source => ({ text: `AMS Glossary of Meteorology, "${entry}"`, status })
export const wmoGuide: Source = { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B', status: 'from memory' }
export const wmoHumidity: Source = { text: 'WMO-No. 8, Guide to Instruments and Methods of Observation, chapter 4 and Annex 4.A', status: 'common practice' }
