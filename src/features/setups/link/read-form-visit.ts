import { isKindKey } from '#shared/kinds/index'
import { limits } from '#shared/limits'
import type { UnitSystem } from '#shared/units/systems'
import { countChambers, removeChamber, type RawSetup } from '../../../components/setup/edit-raw'
import { addItem, dropItem } from '../../../components/setup/items-raw'
import { readSetupVisit, type SetupVisit } from '../../../components/setup/read-setup-visit'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { paths } from '../../../config/paths'

/** The address of the form: the setup so far, and what is being looked for to be added. */
export interface FormVisit {
  readonly visit: SetupVisit
  readonly findTank: string
  readonly find: string
  /** How many chambers are asked about. */
  readonly chambers: number
  /** Set where the address should be another one: something was added or taken out, or is spelt otherwise. */
  readonly redirect?: string
}

const mostChambers = 12
const pieceName = /^([a-z-]{1,40})\.([a-z0-9-]{1,120})$/

interface Done {
  readonly raw: RawSetup
  /** Id of what to go on from. */
  readonly at: string
  readonly chambers?: number
}

function act(raw: RawSetup, params: URLSearchParams, asked: number): Done | null {
  const add = params.get('add') ?? ''
  const [, kind = add === 'own' ? (params.get('kind') ?? '') : '', slug = null] = pieceName.exec(add) ?? []
  if (isKindKey(kind)) {
    const added = addItem(raw, kind, slug)
    return { raw: added.raw, at: added.id === 'tank' ? 'tank' : `item-${added.id}` }
  }
  const drop = params.get('drop')
  if (drop === 'tank') return { raw: dropPath(raw, 'tank.gear'), at: 'tank' }
  if (drop !== null) return { raw: dropItem(raw, drop), at: 'gear' }
  const chamber = params.get('dropChamber')
  if (chamber !== null && /^\d{1,2}$/.test(chamber))
    return { raw: removeChamber(raw, Number(chamber)), at: 'chambers', chambers: asked - 1 }
  if (params.has('more')) return { raw, at: `chamber-${asked}`, chambers: asked + 1 }
  return null
}

const dropPath = (raw: RawSetup, path: string): RawSetup =>
  Object.fromEntries(Object.entries(raw).filter(([key]) => key !== path))

function readCount(text: string | null, raw: RawSetup): number {
  const asked = /^\d{1,2}$/.test(text ?? '') ? Number(text) : 0
  return Math.min(mostChambers, Math.max(1, asked, countChambers(raw)))
}

/** What is typed to look for, short enough to be looked for. */
const readText = (params: URLSearchParams, key: string): string =>
  (params.get(key) ?? '').trim().slice(0, limits.searchText)

/** Where the form goes on; `at` is the part of it to go to. */
export function writeFormHref(
  raw: RawSetup,
  system: UnitSystem,
  { at, chambers = 1, ...own }: { at?: string; chambers?: number; find?: string; findTank?: string } = {},
): string {
  const asked = chambers > Math.max(1, countChambers(raw)) ? String(chambers) : undefined
  const href = writeSetupHref(paths.setupNew, raw, system, { ...own, chambers: asked })
  return at === undefined ? href : `${href}#${at}`
}

/** Reads an address of the form, and what one of its buttons asks for. Never throws. */
export function readFormVisit(params: URLSearchParams, system: UnitSystem): FormVisit {
  const visit = readSetupVisit(params, system)
  const [find, findTank] = [readText(params, 'find'), readText(params, 'findTank')]
  const chambers = readCount(params.get('chambers'), visit.raw)
  const done = act(visit.raw, params, chambers)
  const state = { visit, find, findTank, chambers }
  if (done) {
    const { raw, at } = done
    return { ...state, redirect: writeFormHref(raw, system, { at, chambers: done.chambers ?? chambers }) }
  }
  const isTidy = visit.isCanonical && ['find', 'findTank', 'kind'].every((key) => params.get(key) !== '')
  const looked = { ...(find && { find }), ...(findTank && { findTank }), chambers }
  return isTidy && !params.has('kind') ? state : { ...state, redirect: writeFormHref(visit.raw, system, looked) }
}
