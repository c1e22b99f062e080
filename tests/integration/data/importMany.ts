import { importFile } from '../../../server/importing/importFile'
import { openObservationsWriter } from '../../../server/observations/chunks'
import type { ColumnRecipe, Recipe } from '../../../shared/schemas/data'

/** Imports generated rows, made as they are read, and prints its own peak of memory. `keep` holds on to every row: the planted fault. */
const [rows = '0', folder = '', keep] = process.argv.slice(2)
const kept: string[] = []
const names = ['temp', 'rh', 'press', 'wspd', 'wdir', 'ghi', 'rain', 'volt']
const columns = names.map((name, n): ColumnRecipe => ({ name, at: n + 1, role: 'value', title: name, quantity: 'other', unit: '1', decimals: null, missingCodes: ['NA'], heightM: null }))
const recipe: Recipe = {
  title: 'many', kind: 'station', encoding: 'utf-8', delimiter: ',', decimal: '.', comment: null, skipLines: 0, headerRows: 1, columns, time: { form: 'stamp', column: { name: 'time', at: 0 }, dateOrder: 'ymd' },
  zone: 'UTC', ignoresCellZone: false, stampMeans: 'end', intervalS: 60, stationColumn: null, heightDatum: 'unknown',
}

async function* source(): AsyncGenerator<Buffer> {
  yield Buffer.from(`time,${names.join(',')}\n`)
  for (let from = 0; from < Number(rows); from += 500) {
    let text = ''
    for (let n = from; n < Math.min(Number(rows), from + 500); n += 1) {
      const row = `${new Date(Date.UTC(2020, 0, 1) + n * 60_000).toISOString().slice(0, 19)},${(n % 400) / 10},${n % 100},${1000 - (n % 50) / 10},${(n % 90) / 10},${n % 360},${n % 900},0.0,12.${n % 10}\n`
      if (keep) kept.push(`${row}.`.slice(0, -1))
      text += row
    }
    yield Buffer.from(text)
  }
}

const observations = openObservationsWriter(folder)
const { rowsRead } = await importFile({ source: source(), recipe, mostBytes: 1e10, observations })
observations.close()
if (rowsRead !== Number(rows)) throw new Error(`${rowsRead} rows read of ${rows}`)
console.log(`peak=${process.resourceUsage().maxRSS} kept=${kept.length}`)
