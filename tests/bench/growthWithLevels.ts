import { log } from '#shared/numerics/elementary'
import { afternoon, Ascents } from './ascents'
import type { Ratio } from './ratio'

const few = 200, many = 3200

/** The exponent with which three ascents grow with the levels of their sounding: 1 is linear. */
export const growthWithLevels: Ratio = {
  id: 'P11', part: 'growth-with-levels', bar: 1.05, says: `log of CPU time / log of levels, from ${few} to ${many}`,
  command: 'npm run bench -- --only P11/growth-with-levels',
  plant: 'own',
  async measure({ isShort, isPlanted = false }) {
    const small = new Ascents(afternoon(few)), large = new Ascents(afternoon(many))
    small.time(2000)
    large.time(100)
    const repeats = isShort ? 40 : 150
    return Array.from({ length: isShort ? 5 : 11 }, () => {
      const times = small.time(repeats * many / few) / (repeats * many / few), longer = large.time(isPlanted ? repeats * 2 : repeats) / repeats
      return { numerator: log(longer / times), denominator: log(many / few) }
    })
  },
}
