/**
 * The reference on the command line: one JSON object a line in, one a line out, in order.
 *
 *   npm run --silent evaluate -- [--list] [--trace] [--judge]
 *
 * {"id","quantity","inputs":{name:{"value","unit"}},"convention"?,"variant"?,"unit"?} → {"id","value","unit"}; a bad line gives
 * {"id","error":{"code","detail","input"?}} and the next is read. With "u":{input:{"value","unit"}} (and "correlation":[[input,input,r]]) an answer
 * has "uncertainty" as well: its words are in `evaluate/uncertaintyOf.ts`. With --judge a question has "answer" (no grant, three digits), and the line
 * says {"id","accepted","band","unit","slip"}. Questions alone go to stdout; the closing counts go to stderr.
 */
import { createInterface } from 'node:readline'
import { answerLine, listQuantities } from './evaluate/answerLine'

const flags = process.argv.slice(2)
const known = ['--list', '--trace', '--judge', '--json']
const unknown = flags.find(flag => !known.includes(flag))

async function run(): Promise<number> {
  if (unknown !== undefined) {
    console.error(`evaluate: ${unknown} is not known here; there are ${known.join(', ')}`)
    return 2
  }
  if (flags.includes('--list')) {
    process.stdout.write(`${JSON.stringify(listQuantities(), null, 2)}\n`)
    return 0
  }
  let lines = 0, errors = 0
  for await (const line of createInterface({ input: process.stdin, crlfDelay: Infinity })) {
    if (line.trim() === '') continue
    lines++
    const answer = answerLine(line, { trace: flags.includes('--trace'), judge: flags.includes('--judge') })
    if ('error' in answer) errors++
    if (!process.stdout.write(`${JSON.stringify(answer)}\n`)) await new Promise(resolve => process.stdout.once('drain', resolve))
  }
  console.error(`lines=${lines} errors=${errors}`)
  return 0
}

// a reader that has enough closes its end: that is no failure of ours
process.stdout.on('error', (error: NodeJS.ErrnoException) => process.exit(error.code === 'EPIPE' ? 0 : 1))
process.exitCode = await run()
