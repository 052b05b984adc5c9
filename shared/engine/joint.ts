import { judgeAll } from './assess'
import type { Bench } from './bench'
import { complete, type AssessedCandidate } from './candidates'
import { getRules } from './checks/index'
import { findCheapestCover } from './cover'
import { joinNames } from './counting'
import type { RawKnockOn } from './knock-ons'
import { mergePieces } from './merge-pieces'
import type { Candidate, KindRules } from './rule'
import type { Sweep } from './sweep'
import type { Answer, GearRef, Piece } from './types'
import { readSet } from './values'
import { decideVerdict } from './verdict'

/**
 * The fewest pieces of a kind that together do what is wanted, where none does alone, in the catalogue's order.
 * Undefined where one does, and where all together do not.
 */
function findJoint(
  { bench, verdicts, demands }: Sweep,
  pieces: readonly Piece[],
  joint: NonNullable<KindRules['joint']>,
): readonly Piece[] | undefined {
  const wanted = joint.findWanted(bench.scene)
  if (wanted.length < 2) return undefined
  const able = pieces
    .map((piece, index) => ({ piece, slug: piece.gear?.slug ?? '', demand: demands[index] ?? 0, index }))
    .filter(({ index }) => verdicts[index] === 'fits' || verdicts[index] === 'changes')
    .sort((a, b) => a.demand - b.demand || (a.slug < b.slug ? -1 : a.slug > b.slug ? 1 : a.index - b.index))
  const chosen = findCheapestCover(
    wanted,
    able.map(({ piece }) => readSet<string>(piece.specs, joint.key) ?? []),
  )
  if (!chosen || chosen.length < 2) return undefined
  return chosen
    .flatMap((place) => able[place] ?? [])
    .sort((a, b) => a.index - b.index)
    .map(({ piece }) => piece)
}

/** Several pieces judged as if they were one. */
function assessTogether(
  bench: Bench,
  pieces: readonly Piece[],
  key: string,
  findRest: (candidate: Candidate) => readonly RawKnockOn[],
): AssessedCandidate {
  const candidate = { piece: mergePieces(bench.kind, pieces, key), quantity: 1 }
  const judged = judgeAll(bench.scene, candidate)
  const own = decideVerdict(judged)
  return complete(bench, candidate, judged, own, own === 'no' ? [] : findRest(candidate))
}

export interface Joint {
  readonly assessed: AssessedCandidate
  readonly pieces: readonly Piece[]
}

/** The answer that several pieces of the kind give together, where none does alone. */
export function assessJoint(
  swept: Sweep,
  pieces: readonly Piece[],
  findRest: (candidate: Candidate) => readonly RawKnockOn[],
): Joint | undefined {
  const { joint } = getRules(swept.bench.kind)
  const found = joint && findJoint(swept, pieces, joint)
  return found && { assessed: assessTogether(swept.bench, found, joint.key, findRest), pieces: found }
}

const counted = ['', '', 'Two', 'Three', 'Four']

/** The answer with every piece named that it takes. */
export function nameTogether(answer: Answer, pieces: readonly Piece[]): Answer {
  const gears = pieces.flatMap(({ gear }): GearRef[] => (gear ? [gear] : []))
  const names = joinNames(gears.map(({ brand, model }) => `${brand} ${model}`))
  return {
    ...answer,
    pieces: pieces.map(({ gear }) => ({ gear: gear ?? null, quantity: 1 })),
    summary: `${counted[pieces.length] ?? pieces.length} together: ${names}. ${answer.summary}`,
  }
}
