import { refuse } from '#shared/errors'
import { constantDefinitions } from '#shared/thermo/constants'
import { askedSteps, type AskedStep } from '#shared/schemas/askedSteps'
import type { Work } from '#shared/schemas/work'
import type { Read } from '../../db/writer'
import { tableRow } from '../labs/rowsOfLayer'
import { renderInline, renderLabText } from '../labs/renderLabText'
import type { LoadedShare } from '../shares/loadedShare'
import { shownColumns } from '../shares/servedData'
import { postedGround, readGround } from './ground'
import { listSubmissions } from './listSubmissions'
import { closingOf, personalDue } from './lateness'
import { readDrafts } from './readDrafts'
import { stoppedBy } from './stoppedBy'

/**
 * Everything on a student's work page: the lab's text, the asks, the share's rows, what is saved and what was handed in.
 * Nothing of it comes from the reference: no worked value, no band, no slip.
 */
export async function readWork(read: Read, loadShare: (shareId: string) => Promise<LoadedShare>, who: { membershipId: string, shareId: string }, now: number): Promise<Work> {
  const ground = postedGround(await readGround(read, who.shareId, who.membershipId), now)
  const loaded = await loadShare(who.shareId)
  const [drafts, made, dataSet] = await Promise.all([
    readDrafts(read, who.shareId),
    listSubmissions(read, who.shareId),
    read.selectFrom('data_set_version').innerJoin('data_set', 'data_set.id', 'data_set_version.data_set_id').select(['data_set.title', 'data_set_version.no']).where('data_set_version.id', '=', ground.dataSetVersionId).executeTakeFirst(),
  ])
  if (!dataSet) return refuse('not_found')
  const { body } = loaded.revision
  const closesAt = closingOf(ground)
  const steps = askedSteps(body)
  const numberOf = new Map(steps.map((step, at) => [step.key, at + 1]))
  return {
    share: { id: who.shareId, no: loaded.share.ordinal + 1, lowM: loaded.share.item.lowM, highM: loaded.share.item.highM, leg: loaded.share.item.leg, dataSet: `${dataSet.title}, version ${dataSet.no}` },
    lab: { id: ground.labId, title: ground.labTitle, revisionNo: loaded.revision.no, textHtml: renderLabText(body.text), maxMilli: steps.reduce((sum, step) => sum + step.pointsMilli, 0), aims: body.aims, fieldPlan: body.fieldPlan, hasPractice: body.practice !== null },
    convention: { title: loaded.convention.title, constants: constantDefinitions.flatMap(({ name, label, unit }) => loaded.convention.constants[name] === undefined ? [] : [{ name, label, unit, value: loaded.convention.constants[name] }]) },
    opensAt: new Date(ground.opensAt).toISOString(), dueAt: new Date(personalDue(ground)).toISOString(), isOwnDue: personalDue(ground) > ground.dueAt, closesAt: closesAt === null ? null : new Date(closesAt).toISOString(),
    zone: ground.zone, lateRule: ground.lateRule, attempts: ground.attempts, keep: ground.keep, feedback: ground.feedback, isReleased: ground.releasedAt !== null,
    steps: steps.map((step, at) => ({
      key: step.key, no: at + 1, title: step.title, ask: loaded.asks[step.key] ?? step.title, textHtml: step.text === '' ? '' : renderLabText(step.text), pointsMilli: step.pointsMilli, kind: step.kind, block: step.block && { ...step.block, dataRow: dataRowOf(step, loaded) }, readOff: readOffOf(step),
      ...(step.kind === 'choice' ? { unit: '1', digits: 1, options: step.options.map(({ key, text }) => ({ key, html: renderInline(text) })), isSeveral: step.isSeveral } : { unit: step.unit, digits: step.digits, options: [], isSeveral: false }),
      from: [...new Set(Object.values(step.kind === 'choice' ? {} : step.inputs).flatMap(source => source.from === 'step' ? numberOf.get(source.key) ?? [] : []))].sort((a, b) => a - b),
    })),
    rows: { times: [...loaded.rows.times], use: [...loaded.rows.use], columns: shownColumns(loaded.rows).map(column => ({ name: column.name, quantity: column.quantity, unit: column.unit, texts: [...column.texts] })) },
    drafts,
    made,
    stopped: stoppedBy(ground, now), now: new Date(now).toISOString(),
  }
}

/** Row number, as the file counts, of the data that a table's row is about. */
function dataRowOf(step: AskedStep, loaded: LoadedShare): number | null {
  const of = step.kind === 'table' ? Object.values(step.inputs).flatMap(source => source.from === 'share' && source.row ? [source.row] : [])[0] : undefined
  const row = of ? tableRow(loaded.rows, of.no, of.of) : null
  return row === null ? null : row + 1
}

/** The column from whose plot a step is read off, with the division of its axis. */
function readOffOf(step: AskedStep): { column: string, division: number, unit: string } | null {
  if (step.kind !== 'diagram') return null
  const columns = Object.values(step.inputs).flatMap(source => source.from === 'share' && source.column !== 'height' && source.read !== 'lowBound' && source.read !== 'highBound' ? [source.column] : [])
  const division = step.divisions.result ?? Object.values(step.divisions)[0]
  return division ? { column: columns[0] ?? 'air-temperature', ...division } : null
}
