import type { Compilable, CompiledQuery, InsertObject } from 'kysely'
import type { Database } from './schema/tables'
import type { Read, Trx } from './writer'

/** Stands for one value of a query while it is put together: where it comes out among the parameters, that value goes. */
class Slot {
  constructor(readonly name: string, readonly row: number) {}
}

/** Hands out a slot for whatever property is asked of it. */
const anySlot: object = new Proxy({}, { get: (_target, name) => new Slot(String(name), 0) })

/**
 * A query that is put together and compiled once, and from then on is its text and the values given: building one anew costs more than
 * running it, and a submission runs thirty. Only values may differ from call to call, never the query's shape.
 */
export function keptQuery<Given extends object, Row>(build: (db: Read, given: Given) => Compilable<Row>): (db: Read | Trx, given: Given) => Promise<Row[]> {
  let kept: CompiledQuery<Row> | undefined
  return async (db, given) => {
    // the slots pass for the values: Kysely takes any object as a value and hands it on as it is
    kept ??= build(db, anySlot as Given).compile()
    const values = new Map<string, unknown>(Object.entries(given))
    const { rows } = await db.executeQuery<Row>({ ...kept, parameters: kept.parameters.map(parameter => parameter instanceof Slot ? values.get(parameter.name) : parameter) })
    return rows
  }
}

const keptInserts = new Map<string, CompiledQuery>()
const mostKept = 200

/** Inserts rows that all have the same columns, by a statement that is compiled once for a table, its columns and a number of rows. */
export async function insertRows<Table extends keyof Database & string>(trx: Trx, table: Table, rows: readonly InsertObject<Database, Table>[]): Promise<void> {
  const [first] = rows
  if (!first) return
  const columns = Object.keys(first)
  const key = `${table} ${rows.length} ${columns.join()}`
  let kept = keptInserts.get(key)
  if (!kept) {
    // as above: slots in place of the values
    kept = trx.insertInto(table).values(rows.map((_, row) => slotsOf(columns, row) as InsertObject<Database, Table>)).compile()
    if (keptInserts.size >= mostKept) keptInserts.delete(keptInserts.keys().next().value ?? '')
    keptInserts.set(key, kept)
  }
  const values = rows.map(row => new Map<string, unknown>(Object.entries(row)))
  await trx.executeQuery({ ...kept, parameters: kept.parameters.map(parameter => parameter instanceof Slot ? values[parameter.row]?.get(parameter.name) : parameter) })
}

const slotsOf = (columns: readonly string[], row: number): object => Object.fromEntries(columns.map(column => [column, new Slot(column, row)]))
