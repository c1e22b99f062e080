import { createHash } from 'node:crypto'
import { proveStep, type ProvedStep } from '#shared/marking/proofOfStep'
import { askedSteps, isNumber } from '#shared/schemas/askedSteps'
import type { SupplyItem } from '#shared/schemas/lab'
import type { Read } from '../../../db/writer'
import type { Observations } from '../../../observations/chunks'
import { askedQuestion } from '../../shares/questionFor'
import { bindingProblems } from '../bindingProblems'
import { checkShare, type CheckedShare } from '../checkShare'
import { prepareLab, type PreparedLab } from '../prepareLab'
import { readOwned, type Owned } from './ownRed'
import { players, playShare, type PlayedShare, type PlayerKey } from './playedStudents'

/** Something that an author must settle or own by name before the lab is posted: a correct method that loses, a slip that wins, a lucky guess, a share unlike the others. */
export interface Red {
  /** Of what it is about and of how the lab stands: a change of the lab makes it a new one. */
  key: string
  kind: 'method_loses' | 'slip_wins' | 'guesser_wins' | 'unequal'
  shareNo: number
  stepKey: string
  text: string
  owned: Owned | null
}

export interface ProvedShare extends CheckedShare { proofs: Record<string, ProvedStep>, played: PlayedShare[] }
export interface ProofRun {
  version: number
  problems: { path: string, message: string }[]
  shares: ProvedShare[]
  reds: Red[]
  maxMilli: number
  players: { key: PlayerKey, name: string, says: string, isRight: boolean }[]
  /** Whether it can be posted: everything computes, no band is too wide, and each red is owned. */
  isReady: boolean
}

/** Works a lab as it stands in every way that is known, on every share. Nothing is written. */
export async function proofRun(read: Read, observations: Observations, labId: string): Promise<ProofRun> {
  const lab = await prepareLab(read, observations, labId)
  return proveLab(read, lab)
}

export async function proveLab(read: Read, lab: PreparedLab): Promise<ProofRun> {
  const problems = bindingProblems(lab)
  const shares: ProvedShare[] = []
  if (problems.length === 0) {
    for (const item of lab.items) {
      shares.push(proveShare(lab, item))
      await new Promise(setImmediate) // other requests get their turn
    }
  }
  const reds = redsOf(lab, shares)
  const owned = await readOwned(read, lab.lab.id)
  const withOwners = reds.map(red => ({ ...red, owned: owned.get(red.key) ?? null }))
  return {
    version: lab.lab.version, problems, shares, reds: withOwners, players: players.map(player => ({ ...player })), maxMilli: askedSteps(lab.revision.body).reduce((sum, step) => sum + step.pointsMilli, 0),
    isReady: problems.length === 0 && shares.every(share => share.steps.every(step => step.ok)) && withOwners.every(red => red.owned !== null),
  }
}

function proveShare(lab: PreparedLab, item: SupplyItem): ProvedShare {
  const { rows } = lab.serve(item)
  const ground = { rows, convention: lab.convention, share: { item }, revision: { body: lab.revision.body } }
  const proofs = Object.fromEntries(askedSteps(lab.revision.body).filter(isNumber).flatMap((step) => {
    const asked = askedQuestion(ground, step.key, {})
    return 'question' in asked ? [[step.key, proveStep(asked.question)]] : []
  }))
  return { ...checkShare(lab, item), proofs, played: playShare(ground) }
}

/** Of the shares of a lab, how many a guess may hit by luck before it is named. */
const mostLucky = 0.2

/** How much wider than the middle one's a share's range may be for its value; below a twentieth of the value it is rounding alone and says nothing. */
const mostUnequal = 4
const leastWide = 0.05

function redsOf(lab: PreparedLab, shares: readonly ProvedShare[]): Red[] {
  const steps = askedSteps(lab.revision.body)
  const state = createHash('sha256').update(JSON.stringify([lab.revision.body, lab.conventionRevisionId])).digest('hex').slice(0, 16)
  const titleOf = (key: string) => `step ${steps.findIndex(step => step.key === key) + 1}, “${steps.find(step => step.key === key)?.title ?? key}”`
  const red = (kind: Red['kind'], share: ProvedShare, stepKey: string, what: string, text: string): Red => ({ key: `${state}.${kind}.${share.no}.${stepKey}.${what}`, kind, shareNo: share.no, stepKey, text, owned: null })
  const guessed = steps.flatMap((step) => {
    const lucky = shares.flatMap(share => share.played.flatMap(played => played.player === 'guesser' ? played.steps : []).flatMap(played => played.key === step.key && played.isAccepted && outcomeOf(share, step.key) === 'value' /* a class and a choice can be guessed: one in so many */ ? [{ share, typed: played.typed }] : []))
    const [first] = lucky
    if (!first || lucky.length <= mostLucky * shares.length) return []
    return [red('guesser_wins', first.share, step.key, 'guesser', `${titleOf(step.key)[0]?.toUpperCase()}${titleOf(step.key).slice(1)}: ${first.typed} from a book would earn the marks on ${lucky.length} of ${shares.length} ${shares.length === 1 ? 'share' : 'shares'}.`)]
  })
  return [...guessed, ...shares.flatMap(share => [
    ...Object.entries(share.proofs).flatMap(([key, proof]) => [
      ...proof.ways.filter(way => !way.isInside).map(way => red('method_loses', share, key, way.label, `Share ${share.no}, ${titleOf(key)}: ${way.typed} by “${way.label}” is an accepted way and would lose.`)),
      ...proof.slips.filter(slip => !slip.isOutside && !slip.isQuiet).map(slip => red('slip_wins', share, key, slip.key, `Share ${share.no}, ${titleOf(key)}: ${slip.typed} comes from the slip “${slip.label}” and would earn the marks.`)),
      ...unequal(shares, share, key).map(text => red('unequal', share, key, 'width', `Share ${share.no}, ${titleOf(key)}: ${text}`)),
    ]),
    ...share.played.flatMap(({ player, steps: played }) => {
      const who = players.find(each => each.key === player)
      return played.flatMap((step) => {
        const max = steps.find(each => each.key === step.key)?.pointsMilli ?? 0
        if (who?.isRight && step.pointsMilli < max) return [red('method_loses', share, step.key, player, `Share ${share.no}, ${titleOf(step.key)}: the ${who.name} types ${step.typed || 'nothing'} and gets ${step.pointsMilli / 1000} of ${max / 1000}.`)]
        return []
      })
    }),
  ])]
}

const outcomeOf = (share: ProvedShare, key: string) => share.steps.find(step => step.key === key)?.outcome

/** A share whose accepted range is, for its value, much wider than that of the middle one: easier than the others. */
function unequal(shares: readonly ProvedShare[], share: ProvedShare, key: string): string[] {
  const own = share.proofs[key]?.relativeWidth
  const all = shares.flatMap(each => each.proofs[key]?.relativeWidth ?? []).toSorted((a, b) => a - b)
  const middle = all[Math.floor(all.length / 2)]
  if (own === null || own === undefined || middle === undefined || middle === 0 || all.length < 3) return []
  const times = own / middle
  return own > leastWide && times > mostUnequal ? [`its accepted range is, for its value, ${times.toPrecision(2)} times as wide as that of the middle share.`] : []
}
