import { ascentSpeed, ascentSpeedLibrary } from './ascentSpeed'
import { growthWithLevels } from './growthWithLevels'
import { growthWithStudents } from './growthWithStudents'
import type { Ratio } from './ratio'
import { submissionCpu } from './submissionCpu'
import { syncsAt1 } from './syncsAt1'
import { syncsAt32 } from './syncsAt32'
import { thetaSpeed, thetaSpeedLibrary } from './thetaSpeed'

/** Every ratio that is measured: one file each, listed here. */
export const ratios: readonly Ratio[] = [syncsAt32, syncsAt1, submissionCpu, ascentSpeed, ascentSpeedLibrary, thetaSpeed, thetaSpeedLibrary, growthWithLevels, growthWithStudents]
