import { afternoon, Ascents, AscentsInC, assertSame } from './ascents'
import type { Ratio } from './ratio'

/**
 * θe at a million points, here and in C. Its cost is four logarithms, and ours carry 66 bits so that a mark has the same bits everywhere:
 * they cannot be as quick as a library's. The bar keeps what has been reached.
 */
export const thetaSpeed: Ratio = {
  id: 'P11', part: 'theta-e', bar: 0.22, isMoreBetter: true, says: 'million θe in a CPU second, here / in C by gcc -O2',
  command: 'npm run bench -- --only P11/theta-e',
  plant: 'own',
  async measure({ isShort, isPlanted = false }) {
    const columns = afternoon(100), here = new Ascents(columns, isPlanted), inC = new AscentsInC(columns)
    try {
      assertSame([here.million().sum], [inC.run(1).thetaSum])
      return Array.from({ length: isShort ? 3 : 9 }, () => ({ numerator: 1 / here.million().seconds, denominator: 1 / inC.run(1).thetas }))
    }
    finally {
      inC.remove()
    }
  },
}
