import { nestInputs } from '#shared/engine/worksheets/nest'
import type { Worksheet, WorksheetField } from '#shared/engine/worksheets/types'
import { readSetupLink, writeSetupLink, type LinkProblem } from '#shared/schemas/setup-link'
import type { SetupRequest } from '#shared/schemas/setup'
import { readLinkValue, spellUnit } from '#shared/schemas/setup-link-values'
import type { UnitSystem } from '#shared/units/systems'
import { numberEntries } from './number-entries'

/** Texts as typed, by dotted path; entries of lists by their place. */
export type SheetTexts = Readonly<Record<string, string>>

export interface ReadSheet {
  readonly texts: SheetTexts
  /** Inputs beside those of the setup, as far as they could be read. */
  readonly values: Readonly<Record<string, unknown>>
  readonly setup: SetupRequest
  /** Texts that could not be read, each with why. */
  readonly problems: readonly LinkProblem[]
  /** Required fields that are still empty. */
  readonly needed: readonly WorksheetField[]
  /** The one address of these inputs, without its path. */
  readonly query: string
}

const toTemplate = (path: string): string => path.replace(/\.\d{1,3}\./, '.*.')

export const findField = ({ fields }: Worksheet, path: string): WorksheetField | undefined => {
  const template = toTemplate(path)
  return fields.find((field) => field.path === template)
}

export const isOfSetup = ({ setup }: Worksheet, key: string): boolean =>
  setup?.sections.some((section) => key.startsWith(`${section}.`)) ?? false

/** Fields of one name, such as checkboxes, are one text. */
function joinTexts(entries: Iterable<readonly [string, string]>): [string, string][] {
  const texts = new Map<string, string>()
  for (const [key, text] of entries) {
    const typed = text.trim()
    if (typed === '') continue
    const earlier = texts.get(key)
    texts.set(key, earlier === undefined ? typed : `${earlier},${typed}`)
  }
  return [...texts]
}

/** The places of a list, at least as many as it needs. */
function listPlaces(path: string, { lists = [] }: Worksheet, texts: SheetTexts): readonly number[] {
  const least = lists.find((list) => list.path === path)?.least ?? 0
  const used = Object.keys(texts).flatMap((key) => {
    const place = key.startsWith(`${path}.`) ? Number(key.slice(path.length + 1).split('.')[0]) : Number.NaN
    return Number.isInteger(place) ? [place + 1] : []
  })
  return Array.from({ length: Math.max(least, ...used) }, (_, place) => place)
}

/** Every field with its path written out, lists first: their fields once for each place. */
export function listFields(sheet: Worksheet, texts: SheetTexts): readonly WorksheetField[] {
  const inLists = (sheet.lists ?? []).flatMap(({ path }) => {
    const fields = sheet.fields.filter((field) => field.path.startsWith(`${path}.*.`))
    return listPlaces(path, sheet, texts).flatMap((place) =>
      fields.map((field) => ({ ...field, path: field.path.replace('.*.', `.${place}.`) })),
    )
  })
  return [...inLists, ...sheet.fields.filter(({ path }) => !path.includes('.*.'))]
}

const encode = (text: string) => encodeURIComponent(text).replace(/'/g, '%27')

/**
 * What an address or a form holds for a worksheet. `typedIn` is the system of a form: there a bare number is in the
 * person's own unit, in a link it is canonical. Never throws.
 */
export function readSheet(
  sheet: Worksheet,
  entries: Iterable<readonly [string, string]>,
  system: UnitSystem,
  typedIn?: UnitSystem,
): ReadSheet {
  const joined = joinTexts(entries)
  const own = numberEntries(joined.filter(([key]) => findField(sheet, key) !== undefined))
  const ofSetup = joined.filter(([key]) => isOfSetup(sheet, key))
  const typed: [string, string][] = typedIn === undefined ? [] : [['typed', typedIn]]
  const setupQuery = writeSetupLink([...ofSetup, ...typed], system)
  const { setup, raw, problems } = readSetupLink(new URLSearchParams(setupQuery), system)
  const texts: Record<string, string> = Object.fromEntries(own)
  const read: Record<string, unknown> = {}
  const wrong: LinkProblem[] = []
  const fields = listFields(sheet, texts)
  for (const { path, attribute } of fields) {
    const text = texts[path]
    if (text === undefined) continue
    const value = readLinkValue(text, attribute, system, typedIn)
    if (value.ok) {
      texts[path] = value.text
      read[path] = value.value
    } else {
      // What is out of the question keeps the unit it was meant in too.
      const meant = attribute.type === 'measure' ? spellUnit(text, attribute, typedIn) : text
      texts[path] = meant
      wrong.push({ path, text: meant, detail: value.detail })
    }
  }
  const ownQuery = fields.flatMap(({ path }) => (texts[path] === undefined ? [] : `${path}=${encode(texts[path])}`))
  return {
    texts: { ...texts, ...raw },
    values: nestInputs(read),
    setup,
    problems: [...wrong, ...problems],
    needed: fields.filter(({ path, isRequired }) => isRequired && texts[path] === undefined),
    query: [...ownQuery, ...(setupQuery === '' ? [] : [setupQuery])].join('&'),
  }
}
