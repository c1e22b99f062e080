import { ascentSpeed } from './ascentSpeed'
import { growthWithLevels } from './growthWithLevels'
import { growthWithStudents } from './growthWithStudents'
import type { Ratio } from './ratio'
import { submissionCpu } from './submissionCpu'
import { syncsAt1 } from './syncsAt1'
import { syncsAt32 } from './syncsAt32'
import { thetaSpeed } from './thetaSpeed'

/** Every ratio that is measured: one file each, listed here. */
export const ratios: readonly Ratio[] = [syncsAt32, syncsAt1, submissionCpu, ascentSpeed, thetaSpeed, growthWithLevels, growthWithStudents]
