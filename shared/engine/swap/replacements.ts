import { createPrinter, type Printer } from '../../units/print'
import { canSeat, findRestChanges, setSwapBench, type Bench, type GonePiece } from '../bench'
import { assessCandidate, isFrame, type AssessedCandidate, type CandidateOptions } from '../candidates'
import { nameTogether } from '../joint'
import { listAnswers } from '../list-answers'
import { presentAnswer } from '../present-answer'
import type { Candidate } from '../rule'
import { sweep, type SweepOptions } from '../sweep'
import type { JudgeAnew } from '../turns/find-turn'
import type { FitOptions, Item, Piece, Setup } from '../types'
import { findOptions, groupNeeds, type Catalogue } from './add-ons'
import { findDifferences } from './differences'
import { findFreed, listNeeded } from './freed'
import { assessBefore, assessOutfit, createOutfit, findNew, type Outfit, type State } from './outfit'
import { findPackCount } from './quantity'
import type { AddOn, GearCount, Gone, Replacement, ReplacementsResult } from './types'

const describeSeat = ({ item: { place, mountHeightMm } }: GonePiece): CandidateOptions => ({
  ...(place && { place }),
  ...(mountHeightMm !== undefined && { mountHeightMm }),
})

/** In the place of what is gone, so many of it as there were; the gone piece itself is no replacement. */
function describeSweep(gone: GonePiece): SweepOptions {
  const { piece, quantity } = gone.item
  const countOf = findPackCount(gone.item)
  const slug = piece.gear?.slug
  return {
    ...describeSeat(gone),
    there: quantity,
    ...(countOf && { countOf }),
    ...(slug !== undefined && { isLeftOut: ({ gear }: Piece) => gear?.slug === slug }),
  }
}

const toGearCounts = (extras: readonly { piece: Piece; quantity: number }[]): readonly GearCount[] =>
  extras.flatMap(({ piece: { gear }, quantity }) => (gear ? [{ gear, quantity }] : []))

/** What every answer on a page is told against. */
interface Told {
  readonly setup: Setup
  readonly bench: Bench
  readonly gone: GonePiece
  readonly before: State
  /** What served something before; asked of the replacement only whether it still does. */
  readonly needed: readonly Item[]
  readonly catalogue: Catalogue
  readonly words: Printer
}

/** What is newly asked for with the replacement in the setup, and what meets it. */
function findAddOns(outfit: Outfit, after: State, { before, catalogue, words }: Told): readonly AddOn[] {
  return [...groupNeeds(findNew(after.unmet, before.unmet))].map(([need, asked]) => ({
    need,
    message: asked[0]?.say(words) ?? '',
    options: findOptions(outfit, after, asked, catalogue).map(toGearCounts),
  }))
}

/** The piece judged in the same place of the setup with one of its numbers changed. */
function judgeInChanged({ setup, gone }: Told, { piece, quantity }: Candidate): JudgeAnew {
  const options = { ...describeSeat(gone), quantity }
  return (change) => {
    const bench = setSwapBench(change(setup), gone.item.id)
    return bench ? assessCandidate(bench, piece, options).verdict : 'unknown'
  }
}

function presentReplacement(assessed: AssessedCandidate, told: Told, isJoint: boolean): Replacement {
  const { bench, gone, needed, words } = told
  const { scene, kind } = bench
  const { candidate, knockOns, verdict } = assessed
  const judgeAnew = isJoint ? undefined : judgeInChanged(told, candidate)
  const differences = findDifferences(kind, gone.item.piece.specs, candidate.piece.specs, words)
  if ((verdict === 'no' && !isFrame(bench)) || !canSeat(bench, candidate))
    return { ...presentAnswer(scene, assessed, words, judgeAnew), addOns: [], differences }
  const outfit = createOutfit(bench, candidate)
  const after = assessOutfit(outfit)
  const all = [...knockOns, ...findFreed(outfit, needed, after)]
  return {
    ...presentAnswer(scene, { ...assessed, knockOns: all }, words, judgeAnew),
    addOns: findAddOns(outfit, after, told),
    differences,
  }
}

function describeGone({ item: { id, piece, quantity } }: GonePiece): Gone {
  return { id, kind: piece.kind, gear: piece.gear ?? null, specs: piece.specs, quantity }
}

/**
 * What can take the place of an item (or of the tank, by the id `tank`), in the order of answers: each with what else
 * changes, as the difference between the report with what is gone still there and the one with the replacement, with the
 * pieces that meet what is newly needed, and with the differences from what is gone. `catalogue` must hold the same
 * arrays from call to call where speed matters. Undefined where nothing has that id; RangeError where the tank has
 * neither an outside size nor a volume.
 */
export function replacements(
  setup: Setup,
  itemId: string,
  catalogue: Catalogue,
  options: FitOptions,
): ReplacementsResult | undefined {
  const bench = setSwapBench(setup, itemId)
  if (!bench?.gone) return undefined
  const { gone, kind } = bench
  const words = createPrinter(setup.units)
  const pieces = catalogue[kind]
  const swept = sweep(bench, pieces, describeSweep(gone))
  const findRest = (candidate: Candidate) => findRestChanges(bench, candidate)
  const { found, ...listed } = listAnswers(swept, pieces, options, findRest, words)
  const before = assessBefore(bench)
  const told: Told = { setup, bench, gone, before, needed: listNeeded(bench, before), catalogue, words }
  const answers = found.map(({ assessed, pieces: joined }) => {
    const answer = presentReplacement(assessed, told, joined !== undefined)
    return joined ? { ...answer, ...nameTogether(answer, joined) } : answer
  })
  return { gone: describeGone(gone), ...listed, answers }
}
