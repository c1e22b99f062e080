import { afternoon, Ascents, AscentsInC, assertSame, numbersOf } from './ascents'
import type { Ratio } from './ratio'

const levels = 100

/** Surface, mixed-layer and most unstable ascent with CAPE and CIN, here and in C with its library's functions; the same results to nine digits first. */
export const ascentSpeed: Ratio = {
  id: 'P11', part: 'ascents', bar: 0.6, isMoreBetter: true, says: 'three ascents of 100 levels in a CPU second, here / in C by gcc -O2',
  command: 'npm run bench -- --only P11/ascents',
  plant: 'own',
  async measure({ isShort, isPlanted = false }) {
    const columns = afternoon(levels), here = new Ascents(columns, isPlanted), inC = new AscentsInC(columns)
    try {
      assertSame(numbersOf(here.three(0)), inC.run(1).found)
      const repeats = isShort ? 4000 : 8000
      here.time(4000)
      return Array.from({ length: isShort ? 5 : 11 }, () => {
        const { ascents } = inC.run(repeats)
        // starting a program leaves this one's memory cold: that is no part of an ascent
        here.time(500)
        return { numerator: repeats / here.time(repeats), denominator: repeats / ascents }
      })
    }
    finally {
      inC.remove()
    }
  },
}
