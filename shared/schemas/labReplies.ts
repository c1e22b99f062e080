import { z } from 'zod'
import { labBody, lateRule } from './lab'
import { leg } from './labParts'
import { inputSource } from './steps'
import { heightBar } from './marks'

/** Answers of the lab routes. Rows count epoch milliseconds; JSON says ISO 8601 with Z: the one converter of these routes is here. */
const instant = z.number().transform(at => new Date(at).toISOString()).pipe(z.string())
const maybeInstant = z.number().nullable().transform(at => at === null ? null : new Date(at).toISOString()).pipe(z.string().nullable())

export const labState = z.enum(['draft', 'posted', 'withdrawn', 'archived'])
const postingState = z.enum(['planned', 'posted', 'withdrawn'])
export const fieldProblem = z.object({ path: z.string(), message: z.string() })

export const labListReply = z.object({
  labs: z.array(z.object({
    id: z.string(), title: z.string(), state: labState, pointsMilli: z.number(), steps: z.number(),
    sections: z.array(z.object({ postingId: z.string(), sectionId: z.string(), section: z.string(), state: postingState, opensAt: instant, dueAt: instant, releasedAt: maybeInstant, students: z.number(), submitted: z.number() })),
    own: z.object({ dueAt: instant, shareId: z.string().nullable(), submissions: z.number(), lastReceivedAt: maybeInstant, isReleased: z.boolean() }).nullable(),
  })),
})

export const labMadeReply = z.object({ id: z.string(), revisionId: z.string(), version: z.number() })
export const labSavedReply = z.object({ version: z.number() })

export const labEditReply = z.object({
  id: z.string(), courseId: z.string(), title: z.string(), state: labState, version: z.number(), zone: z.string(),
  revision: z.object({ id: z.string(), no: z.number(), isFrozen: z.boolean(), body: labBody }),
  convention: z.object({ title: z.string(), source: z.string(), constants: z.record(z.string(), z.number()) }),
  html: z.string(), stepHtml: z.record(z.string(), z.string()), asks: z.record(z.string(), z.string()),
  problems: z.array(fieldProblem),
  courseLateRule: lateRule,
  sections: z.array(z.object({ id: z.string(), name: z.string(), students: z.number() })),
  postings: z.array(z.object({
    id: z.string(), sectionId: z.string(), state: postingState, opensLocal: z.string(), dueLocal: z.string(), opensAt: instant, dueAt: instant,
    lateRule, attempts: z.number(), keep: z.enum(['last', 'best']), feedback: z.enum(['at_once', 'after_release']), releasedAt: maybeInstant,
  })),
})

export const checkedStepReply = z.object({
  key: z.string(), title: z.string(), ok: z.boolean(), code: z.string().nullable(), reason: z.string().nullable(), ask: z.string(),
  outcome: z.string(), words: z.string(), unit: z.string(), band: heightBar.nullable(),
  trace: z.array(z.object({ text: z.string(), formulaHtml: z.string(), filledHtml: z.string() })),
})
export const checkedShareReply = z.object({
  no: z.number(), title: z.string(), versionId: z.string(), leg, lowM: z.number(), highM: z.number(), used: z.number(), rows: z.number(), steps: z.array(checkedStepReply),
})
const provedStepReply = z.object({
  ways: z.array(z.object({ label: z.string(), typed: z.string(), isInside: z.boolean() })),
  slips: z.array(z.object({ key: z.string(), label: z.string(), typed: z.string(), pointsMilli: z.number(), isOutside: z.boolean(), isQuiet: z.boolean() })),
  relativeWidth: z.number().nullable(), toClassLimit: z.number().nullable(), triesToFind: z.number().nullable(),
})
const playerKey = z.enum(['spreadsheet', 'notebook', 'early', 'swapped', 'plot', 'guesser'])
export const provedShareReply = checkedShareReply.extend({
  proofs: z.record(z.string(), provedStepReply),
  played: z.array(z.object({ player: playerKey, earnedMilli: z.number(), steps: z.array(z.object({ key: z.string(), typed: z.string(), pointsMilli: z.number(), isAccepted: z.boolean() })) })),
})
/** What the proof run found on a lab as it stands. */
export const proofReply = z.object({
  version: z.number(), isReady: z.boolean(), maxMilli: z.number(), problems: z.array(fieldProblem), shares: z.array(provedShareReply),
  reds: z.array(z.object({
    key: z.string(), kind: z.enum(['method_loses', 'slip_wins', 'guesser_wins', 'unequal']), shareNo: z.number(), stepKey: z.string(), text: z.string(),
    owned: z.object({ by: z.string(), at: instant, reason: z.string() }).nullable(),
  })),
  players: z.array(z.object({ key: playerKey, name: z.string(), says: z.string(), isRight: z.boolean() })),
})
export const ownedBody = z.object({ keys: z.array(z.string().min(1).max(200)).min(1).max(2000), reason: z.string().trim().min(3, 'Say why, in a few words.').max(1000) })
export const ownedReply = z.object({ owned: z.number() })

export const servedReply = z.object({
  columns: z.array(z.object({ name: z.string(), quantity: z.string(), unit: z.string(), unitLabel: z.string(), texts: z.array(z.string()) })),
  times: z.array(z.string()), use: z.array(z.boolean()), count: z.number(), heightDatum: z.string(), lowM: z.number(), highM: z.number(), leg,
})

export const labPreviewReply = z.object({
  html: z.string(), asks: z.record(z.string(), z.string()), stepHtml: z.record(z.string(), z.string()), problems: z.array(fieldProblem),
  share: z.object({ no: z.number(), of: z.number(), title: z.string(), served: servedReply, asks: z.record(z.string(), z.string()), answers: z.array(checkedStepReply) }).nullable(),
})
export const labPreviewBody = z.object({
  /** The text alone, rendered even while a step is unfinished. */
  text: z.string().max(40_000),
  /** The whole body where it can be read; null while a field is wrong. */
  body: labBody.nullable(),
  /** Which share of the supply to show as a student sees it; none where it is left out. */
  shareNo: z.number().int().min(0).optional(),
})

export const labPostedReply = z.object({
  version: z.number(), shares: z.number(),
  postings: z.array(z.object({ id: z.string(), sectionId: z.string(), opensLocal: z.string(), dueLocal: z.string(), opensAt: instant, dueAt: instant, notes: z.array(z.string()) })),
})

export const quantityListReply = z.object({
  quantities: z.array(z.object({
    group: z.string(), key: z.string(), name: z.string(), symbol: z.string(), unit: z.string(), shownUnit: z.string(), shownUnitLabel: z.string(), units: z.array(z.object({ ucum: z.string(), label: z.string() })), kind: z.string(), ask: z.string(), constants: z.array(z.string()),
    inputs: z.array(z.object({ name: z.string(), label: z.string(), symbol: z.string(), unit: z.string(), shownUnit: z.string(), shape: z.enum(['number', 'series']), isOptional: z.boolean(), usual: inputSource.nullable() })),
    variants: z.array(z.object({ key: z.string(), label: z.string(), source: z.string(), status: z.string(), validity: z.string() })),
    classes: z.array(z.object({ key: z.string(), label: z.string() })),
  })),
})

export const flightListReply = z.object({
  flights: z.array(z.object({
    versionId: z.string(), versionNo: z.number(), isNewest: z.boolean(), title: z.string(), heightDatum: z.string(), rows: z.number(), turnRow: z.number(), topM: z.number().nullable(),
    columns: z.array(z.object({ name: z.string(), quantity: z.string(), unit: z.string(), unitLabel: z.string() })),
    /** Height and air temperature, thinned for the plot; null where a value is missing. */
    profile: z.array(z.object({ heightM: z.number(), temperatureC: z.number(), leg: z.enum(['up', 'down']) })),
  })),
})
