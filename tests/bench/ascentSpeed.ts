import { afternoon, Ascents, AscentsInC, assertSame, numbersOf, type FunctionsInC } from './ascents'
import type { Ratio } from './ratio'

const levels = 100

function ascentSpeedAgainst(functions: FunctionsInC, told: Pick<Ratio, 'part' | 'bar' | 'says' | 'command'>): Ratio {
  return {
    id: 'P11', ...told, isMoreBetter: true, plant: 'own',
    async measure({ isShort, isPlanted = false }) {
      const columns = afternoon(levels), here = new Ascents(columns, isPlanted), inC = new AscentsInC(columns, functions)
      try {
        assertSame(numbersOf(here.three(0)), inC.run(1).found, functions)
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
}

/** Surface, mixed-layer and most unstable ascent with CAPE and CIN, here and by the same algorithm in C, exp, log and pow included: the same bits first. */
export const ascentSpeed = ascentSpeedAgainst('same', { part: 'ascents', bar: 0.6, says: 'three ascents of 100 levels in a CPU second, here / the same algorithm in C by gcc -O2', command: 'npm run bench -- --only P11/ascents' })

/** The same against the quicker functions of the C library, whose last bits differ between libraries; the same results to nine digits first. */
export const ascentSpeedLibrary = ascentSpeedAgainst('library', { part: 'ascents-libm', bar: 0.55, says: 'three ascents of 100 levels in a CPU second, here / in C with its library’s exp, log and pow', command: 'npm run bench -- --only P11/ascents-libm' })
