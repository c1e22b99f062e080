// npm run audit [-- --anchors FILE]: proves that marks shown are what the ledger adds up to.
// FILE holds one anchor a line, as receipts and mails carry them: CHAIN SEQ DIGEST
import { readFileSync } from 'node:fs'
import { auditLedger, type Anchor } from '../domain/ledger/auditLedger'
import { openForReading } from '../db/open'

const at = process.argv.indexOf('--anchors')
const file = at === -1 ? null : process.argv[at + 1]
if (at !== -1 && !file) fail('--anchors needs a file: one anchor a line, CHAIN SEQ DIGEST')

const anchors = file ? readAnchors(file) : []
const database = openForReading(process.env.DATA_DIR || './.data')
const report = await auditLedger(database.read, anchors)
await database.close()
for (const finding of report.findings) console.log(`${finding.where}: ${finding.what}`)
console.log(`chains=${report.chains} entries=${report.entries} marks=${report.marks} anchors=${report.anchors} findings=${report.findings.length}`)
process.exit(report.findings.length === 0 ? 0 : 1)

function readAnchors(path: string): Anchor[] {
  const lines = readFileSync(path, 'utf8').split('\n').map(line => line.trim()).filter(line => line !== '' && !line.startsWith('#'))
  return lines.map((line, no) => {
    const match = /^(\S+)\s+(\d+)\s+([0-9a-f]{64})$/i.exec(line)
    if (!match) return fail(`${path}, line ${no + 1}: not an anchor (CHAIN SEQ DIGEST)`)
    return { chain: match[1]!, seq: Number(match[2]), digest: match[3]!.toLowerCase() }
  })
}

function fail(line: string): never {
  console.error(line)
  process.exit(2)
}
