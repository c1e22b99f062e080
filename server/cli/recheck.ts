import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { openForReading } from '../db/open'
import { isSound, recheckMarks } from '../domain/marking/recheckMarks'
import { bundleReference } from './bundleReference'

/**
 * npm run recheck: judges every stored mark again, with its own build bit for bit and with this installation's.
 * Last line: evaluations=… builds=… same=… by_hand=… newest_differs=… findings=…; exit code 0 only when all came out the same.
 */
const root = join(dirname(fileURLToPath(import.meta.url)), '../..')
const database = openForReading(process.env.DATA_DIR || join(root, '.data'))
try {
  const { bundle } = await bundleReference(root)
  const report = await recheckMarks(database.read, bundle, (finding) => {
    console.log(`${finding.kind}${finding.submissionId ? ` submission ${finding.submissionId}, step ${finding.stepKey}` : ''}: ${finding.detail}`)
  })
  console.log(`evaluations=${report.evaluations} builds=${report.builds} same=${report.same} by_hand=${report.byHand} newest_differs=${report.newestDiffers} findings=${report.findings.length - report.newestDiffers}`)
  process.exitCode = isSound(report) ? 0 : 1
}
finally {
  await database.close()
}
