import { readQuestion } from '#shared/engine/ask/read-question'
import { readSetupLink, writeSetupLink, type LinkProblem } from '#shared/schemas/setup-link'
import type { Filters } from '#shared/schemas/filters'
import type { SetupRequest } from '#shared/schemas/setup'
import type { UnitSystem } from '#shared/units/systems'
import { listSetupEntries, type RawSetup } from '../../../components/setup/edit-raw'
import { resolveWishes, toWishes } from './wishes'
import { longestQuestion, readFinderState, writeFinderState, type FinderState } from './finder-state'

export interface Visit {
  readonly state: FinderState
  /** What could be read of the setup. */
  readonly setup: SetupRequest
  /** What the piece itself should be. */
  readonly filters: Filters
  /** What could not, with the text kept. */
  readonly problems: readonly LinkProblem[]
  /** Set where the address should be another one: a question to be read, or fields spelt otherwise. */
  readonly redirect?: string
}

/** What a question tells of the setup goes before what was there; its chambers take the place of all earlier ones. */
function answerQuestion(text: string, state: FinderState, system: UnitSystem): FinderState {
  const question = readQuestion(text, system)
  const fields = Object.entries(question.fields).map(([path, field]): [string, string] => [path, field.text])
  const isOfChamber = ([path]: readonly [string, string]) => path.startsWith('tank.chambers.')
  const kept = Object.entries(state.raw).filter((entry) => !isOfChamber(entry) || !fields.some(isOfChamber))
  const raw: RawSetup = Object.fromEntries([...kept, ...fields])
  const kind = question.kind ?? state.kind
  const wishes = toWishes(question.filters)
  return { kind, asked: text, raw, wishes, opened: null, picked: null, from: null }
}

const spell = (query: string): string => new URLSearchParams(query).toString()

/** A question that was typed and is yet to be read; empty if none. */
export const readTypedQuestion = (params: URLSearchParams): string =>
  (params.get('q') ?? '').trim().slice(0, longestQuestion)

/** Reads an address of the finder. Never throws: whatever it holds, there is something to show. */
export function readVisit(params: URLSearchParams, system: UnitSystem): Visit {
  const typed = listSetupEntries(params)
  const canonical = new URLSearchParams(writeSetupLink(typed, system))
  const { setup, raw, problems } = readSetupLink(canonical, system)
  const read = readFinderState(params, raw)
  const question = readTypedQuestion(params)
  const state = question === '' ? read : answerQuestion(question, read, system)
  const address = writeFinderState(state, system)
  const isBare = [...params.keys()].length === 0
  const wished = resolveWishes(state.kind, state.wishes)
  const isCanonical = isBare || spell(params.toString()) === spell(address)
  return {
    state,
    setup,
    filters: wished.filters,
    problems: [...problems, ...wished.problems],
    ...(!isCanonical && { redirect: address }),
  }
}
