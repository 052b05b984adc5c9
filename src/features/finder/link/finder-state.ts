import type { Verdict } from '#shared/engine/types'
import { getAttribute, isKindKey, type KindKey } from '#shared/kinds/index'
import { writeSetupLink } from '#shared/schemas/setup-link'
import type { UnitSystem } from '#shared/units/systems'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { listWishEntries, readWishes, type Wishes } from './wishes'

/** Which answers beside those that fit are shown: a whole verdict, or those that one check, or one missing number, decides. */
export interface Opened {
  readonly verdict: 'no' | 'unknown'
  readonly check?: string
  readonly missing?: string
}

/** Where a list of answers goes on, for visitors without scripts. */
export interface From {
  readonly verdict: Verdict
  readonly cursor: string
}

/** All of the finder: what its address holds, and nothing else. */
export interface FinderState {
  readonly kind: KindKey
  /** The question that was last read, as typed; empty if none. */
  readonly asked: string
  readonly raw: RawSetup
  readonly wishes: Wishes
  readonly opened: Opened | null
  /** Slug of the piece that is drawn and lit. */
  readonly picked: string | null
  readonly from: From | null
}

const startingKind: KindKey = 'heater'
export const longestQuestion = 400
const longestCursor = 400

function readOpened(params: URLSearchParams, kind: KindKey): Opened | null {
  const verdict = params.get('show')
  if (verdict !== 'no' && verdict !== 'unknown') return null
  const check = params.get('check')
  if (check !== null && /^[a-z-]{1,40}\.[a-z-]{1,40}$/.test(check)) return { verdict, check }
  const missing = params.get('missing')
  return missing !== null && verdict === 'unknown' && getAttribute(kind, missing) ? { verdict, missing } : { verdict }
}

function readFrom(params: URLSearchParams): From | null {
  const verdict = params.get('more')
  const cursor = params.get('cursor')
  if (cursor === null || cursor === '' || cursor.length > longestCursor) return null
  return verdict === 'fits' || verdict === 'changes' || verdict === 'no' || verdict === 'unknown'
    ? { verdict, cursor }
    : null
}

export function readFinderState(params: URLSearchParams, raw: RawSetup): FinderState {
  const text = params.get('kind') ?? ''
  const kind = isKindKey(text) ? text : startingKind
  const picked = params.get('picked')
  return {
    kind,
    asked: (params.get('asked') ?? '').slice(0, longestQuestion),
    raw,
    wishes: readWishes(params, kind),
    opened: readOpened(params, kind),
    picked: picked !== null && /^[a-z0-9-]{1,120}$/.test(picked) ? picked : null,
    from: readFrom(params),
  }
}

/** The one address of a state, without its path: kind, question, wishes, setup, then what is opened. */
export function writeFinderState(state: FinderState, system: UnitSystem): string {
  const own = new URLSearchParams({ kind: state.kind })
  if (state.asked) own.set('asked', state.asked)
  for (const [key, wish] of listWishEntries(state.wishes)) own.set(key, wish)
  const view = new URLSearchParams()
  if (state.opened) view.set('show', state.opened.verdict)
  if (state.opened?.check) view.set('check', state.opened.check)
  if (state.opened?.missing) view.set('missing', state.opened.missing)
  if (state.picked) view.set('picked', state.picked)
  if (state.from) {
    view.set('more', state.from.verdict)
    view.set('cursor', state.from.cursor)
  }
  const setup = writeSetupLink(Object.entries(state.raw), system)
  return [own.toString(), setup, view.toString()].filter(Boolean).join('&')
}
