import { findSetupField } from '../kinds/setup-fields'
import type { FieldAttribute } from '../kinds/types'
import { limits } from '../limits'
import { unitSystems, type UnitSystem } from '../units/systems'
import type { SetupRequest } from './setup'
import { findItemField, readItemPlace, toItemSpecs } from './setup-link-items'
import { isSetupKey, numberChambers, sortPaths } from './setup-link-keys'
import { readLinkValue, spellUnit } from './setup-link-values'

/** A text in a link that could not be read: where it stands, as it was typed, and why not. */
export interface LinkProblem {
  readonly path: string
  readonly text: string
  readonly detail: string
}

export interface SetupLink {
  /** What could be read, ready to be sent; `tank` is empty where nothing is said of it. */
  readonly setup: SetupRequest
  /** Every text as typed by its dotted path, chambers by their place; nothing typed is lost. */
  readonly raw: Readonly<Record<string, string>>
  readonly problems: readonly LinkProblem[]
}

/** A form that is sent without a script says by this key in which system its bare numbers are. */
const typedInKey = 'typed'

/** The decoded entries of a query, as URLSearchParams holds them. */
export type LinkQuery = Iterable<readonly [string, string]>

type Tree = { [key: string]: unknown }

function isSystem(text: string | undefined): text is UnitSystem {
  return unitSystems.some((system) => system === text)
}

function findText(query: LinkQuery, key: string): string | undefined {
  for (const [name, text] of query) if (name === key) return text
  return undefined
}

function place(tree: Tree, path: readonly string[], value: unknown): void {
  const [word = '', ...rest] = path
  if (rest.length === 0) {
    tree[word] = value
    return
  }
  const branch = Object.hasOwn(tree, word) ? tree[word] : undefined
  const next: Tree = typeof branch === 'object' && branch !== null ? (branch as Tree) : {}
  tree[word] = next
  place(next, rest, value)
}

/** Checkboxes of one set come as one key several times; so does a mistake, which keeps both texts. */
function joinRepeated(query: LinkQuery): [string, string][] {
  const texts = new Map<string, string>()
  for (const [key, text] of query) {
    if (!isSetupKey(key) || text.trim() === '') continue
    const earlier = texts.get(key)
    texts.set(key, earlier === undefined ? text.trim() : `${earlier},${text.trim()}`)
  }
  return [...texts]
}

/** The field that a path of a link names; the specs of a piece are those of its kind. */
export function findLinkField(path: string, raw: ReadonlyMap<string, string>): FieldAttribute | undefined {
  const [section, id, ...rest] = path.split('.')
  if (section !== 'items') return findSetupField(path)?.attribute
  if (id === undefined || !/^[A-Za-z0-9][\w-]*$/.test(id)) return undefined
  return findItemField(rest.join('.'), raw.get(`items.${id}.kind`))
}

/** Objects keyed by place become the lists that they stand for. */
function toSetup(tree: Tree, system: UnitSystem): SetupRequest {
  const { items = {}, tank = {}, goals, units = system, ...rest } = tree
  const { chambers, ...ownTank } = tank as Tree
  const { turnoverPerHour, ...ownGoals } = (goals ?? {}) as Tree
  const turnover = turnoverPerHour as { 0?: number; 1?: number } | undefined
  const [from = turnover?.[1], to = turnover?.[0]] = [turnover?.[0], turnover?.[1]]
  const itemList = Object.entries(items as Record<string, Tree>).map(([id, item]) => {
    const specs = toItemSpecs(item)
    return {
      id,
      ...item,
      ...(specs !== undefined && { specs }),
      ...(typeof item.place === 'string' && { place: readItemPlace(item.place) }),
    }
  })
  return {
    ...rest,
    units,
    tank: { ...ownTank, ...(chambers !== undefined && { chambers: Object.values(chambers as Tree) }) },
    ...(goals !== undefined && { goals: { ...ownGoals, ...(turnover && { turnoverPerHour: [from, to] }) } }),
    items: itemList,
  } as SetupRequest
}

/** Every text of the link in canonical order and spelling, with what it means. */
function readEntries(query: LinkQuery, system: UnitSystem) {
  const given = findText(query, typedInKey)
  const typedIn = isSystem(given) ? given : undefined
  const raw = new Map(numberChambers(joinRepeated(query)))
  const found: { readonly path: string; readonly value: unknown }[] = []
  const problems: LinkProblem[] = []
  const canonical: [string, string][] = []
  for (const path of sortPaths([...raw.keys()])) {
    const text = raw.get(path) ?? ''
    const field = findLinkField(path, raw)
    const read = field === undefined ? undefined : readLinkValue(text, field, system, typedIn)
    // What is out of the question keeps the unit it was meant in too.
    const meant = field?.type === 'measure' ? spellUnit(text, field, typedIn) : text
    if (!read?.ok) raw.set(path, meant)
    canonical.push([path, read?.ok ? read.text : meant])
    if (read?.ok) found.push({ path, value: read.value })
    else problems.push({ path, text: meant, detail: read?.detail ?? 'is not a known field' })
  }
  return { raw, read: found, problems, canonical }
}

/**
 * The setup that a link holds: dotted keys, values as typed, a bare number canonical (`tank.outerLengthMm=24in`,
 * `tank.chambers.rear.lengthMm=101.6`, `items.heater.gear=some-slug`). Keys of other parts of the page are passed over.
 * `system` is the visitor's, for the words of problems and where the link names none. Never throws.
 */
export function readSetupLink(query: LinkQuery, system: UnitSystem): SetupLink {
  const entries = [...query]
  const own = findText(entries, 'units')
  const used = isSystem(own) ? own : system
  if (writeQuery(joinRepeated(entries)).length > limits.linkBytes) {
    const detail = `The link is longer than ${limits.linkBytes / 1024} kB, so it was not read.`
    return {
      setup: toSetup({}, used),
      raw: Object.fromEntries(joinRepeated(entries)),
      problems: [{ path: '', text: '', detail }],
    }
  }
  const { raw, read, problems } = readEntries(entries, used)
  const tree: Tree = {}
  for (const { path, value } of read) place(tree, path.split('.'), value)
  return { setup: toSetup(tree, used), raw: Object.fromEntries(raw), problems }
}

/** As in URLs, and with the apostrophe that some browsers encode by themselves, so that no address is ever rewritten twice. */
function encode(text: string): string {
  return encodeURIComponent(text).replace(/'/g, '%27')
}

function writeQuery(entries: Iterable<readonly [string, string]>): string {
  return Array.from(entries, ([path, text]) => `${encode(path)}=${encode(text)}`).join('&')
}

/**
 * The one canonical spelling of a link's setup: keys in the form's order, chambers by place, bare numbers of a form
 * with their unit. What could not be read stays as it was typed. Writing twice changes nothing.
 */
export function writeSetupLink(query: LinkQuery, system: UnitSystem): string {
  const { canonical } = readEntries([...query], system)
  return writeQuery(canonical)
}
