import { afternoon, Ascents, AscentsInC, assertSame, type FunctionsInC } from './ascents'
import type { Ratio } from './ratio'

function thetaSpeedAgainst(functions: FunctionsInC, told: Pick<Ratio, 'part' | 'bar' | 'says' | 'command'>): Ratio {
  return {
    id: 'P11', ...told, isMoreBetter: true, plant: 'own',
    async measure({ isShort, isPlanted = false }) {
      const columns = afternoon(100), here = new Ascents(columns, isPlanted), inC = new AscentsInC(columns, functions)
      try {
        assertSame([here.million().sum], [inC.run(1).thetaSum], functions)
        return Array.from({ length: isShort ? 3 : 9 }, () => ({ numerator: 1 / here.million().seconds, denominator: 1 / inC.run(1).thetas }))
      }
      finally {
        inC.remove()
      }
    },
  }
}

/** θe at a million points, here and by the same algorithm in C, exp, log and pow included: the sums agree to the last bit. */
export const thetaSpeed = thetaSpeedAgainst('same', { part: 'theta-e', bar: 0.6, says: 'million θe in a CPU second, here / the same algorithm in C by gcc -O2', command: 'npm run bench -- --only P11/theta-e' })

/**
 * The same against the functions of the C library. The cost of θe is four logarithms, and ours carry 66 bits so that a mark has the same bits
 * everywhere: they cannot be as quick as a library's. The bar keeps what has been reached.
 */
export const thetaSpeedLibrary = thetaSpeedAgainst('library', { part: 'theta-e-libm', bar: 0.25, says: 'million θe in a CPU second, here / in C with its library’s exp, log and pow', command: 'npm run bench -- --only P11/theta-e-libm' })
