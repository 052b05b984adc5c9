import { data, redirect } from 'react-router-dom'
import { findContradictions } from '#shared/engine/setup/contradictions'
import { fillWorksheet } from '#shared/engine/worksheets/fill'
import type { Subject } from '#shared/engine/worksheets/fill-types'
import { findWorksheet } from '#shared/engine/worksheets/registry'
import type { Worksheet } from '#shared/engine/worksheets/types'
import type { Item, Piece, Specs } from '#shared/engine/types'
import { isKindKey } from '#shared/kinds/index'
import type { SetupParsed } from '#shared/schemas/setup'
import type { Gear } from '#shared/schemas/gear'
import { createPrinter } from '#shared/units/print'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { readSetupVisit } from '../../components/setup/read-setup-visit'
import { toEngineSetup } from '../../components/setup/to-engine-setup'
import { paths } from '../../config/paths'
import type { App } from '../../lib/app-context'
import { throwFailure } from '../../lib/loading'
import { isNotFound } from '../../lib/problem'
import { readSheet } from './link/read-sheet'
import { readVisit } from './link/read-visit'
import { spellBareNumbers, spellValues } from './link/spell-values'
import { solveSheet } from './model/solve-sheet'

type ItemRequest = SetupParsed['items'][number]

const asMeasured = (specs: Readonly<Record<string, unknown>>): Specs =>
  Object.fromEntries(Object.entries(specs).map(([key, value]) => [key, { value, source: 'measured' as const }]))

/** A piece of the catalogue; null where there is none by that name. */
async function fetchPiece({ api, queryClient }: App, slug: string): Promise<Gear | null> {
  try {
    return await queryClient.fetchQuery(gearEntryQuery(api, slug))
  } catch (error) {
    if (isNotFound(error)) return null
    return throwFailure(error)
  }
}

function toPiece({ kind, slug, brand, model, specs }: Gear): Piece | null {
  return isKindKey(kind) ? { kind, specs: asMeasured(specs), gear: { slug, brand, model } } : null
}

async function fetchItem(app: App, item: ItemRequest): Promise<Item | null> {
  const { id, gear, kind, specs, quantity = 1, state = 'have', place, mountHeightMm } = item
  const entry = gear === undefined ? null : await fetchPiece(app, gear)
  const piece = entry ? toPiece(entry) : kind === undefined ? null : { kind, specs: asMeasured(specs ?? {}) }
  return (
    piece && {
      id,
      piece,
      quantity,
      state,
      ...(place !== undefined && { place }),
      ...(mountHeightMm !== undefined && { mountHeightMm }),
    }
  )
}

/** The catalogue's piece that an address names; of an item of the setup the caller knows. */
async function findSubject(app: App, params: URLSearchParams): Promise<Subject | undefined> {
  const slug = params.get('piece')
  const entry = slug === null ? null : await fetchPiece(app, slug)
  const piece = entry && toPiece(entry)
  const quantity = Number(params.get('quantity') ?? 1)
  return piece ? { piece, quantity: Number.isInteger(quantity) && quantity > 0 ? quantity : 1 } : undefined
}

/** The query of the worksheet filled in from the setup and the piece that an address names. */
async function fillFromAddress(app: App, sheet: Worksheet, params: URLSearchParams): Promise<string> {
  const { system } = app.preferences.get()
  const printer = createPrinter(system)
  const { setup: request, raw } = readSetupVisit(params, system)
  const slug = raw['tank.gear']
  const [tank, ...found] = await Promise.all([
    slug === undefined ? null : fetchPiece(app, slug),
    ...((request.items ?? []) as ItemRequest[]).map((item) => fetchItem(app, item)),
  ])
  const items = found.filter((item) => item !== null)
  const item = items.find(({ id }) => id === params.get('item'))
  const setup = toEngineSetup(
    request,
    tank ?? undefined,
    items.filter((one) => one !== item),
  )
  const subject = item ? { ...item, isBeside: true as const } : await findSubject(app, params)
  // Without a tank that makes sense there is nothing to fill in; what was said of it is kept.
  const { 'tank.gear': _, ...said } = raw
  const texts =
    findContradictions(setup).length > 0 ? said : spellValues(sheet, fillWorksheet(sheet, setup, subject), printer)
  return readSheet(sheet, Object.entries(texts), system).query
}

export function loadWorksheet(app: App, url: URL, name: string): unknown {
  const sheet = findWorksheet(name)
  // A Response of the router's own kind: it keeps its status through server rendering.
  // eslint-disable-next-line @typescript-eslint/only-throw-error
  if (!sheet) throw data(null, { status: 404 })
  const { system } = app.preferences.get()
  const visit = readVisit(sheet, url.searchParams, system)
  const to = (query: string) => redirect(query === '' ? paths.worksheet(name) : `${paths.worksheet(name)}?${query}`)
  if (visit.isToFill) return fillFromAddress(app, sheet, url.searchParams).then(to)
  if (visit.redirect !== undefined) return to(visit.redirect)
  const printer = createPrinter(system)
  const solved = visit.isEmpty ? null : solveSheet(sheet, spellBareNumbers(sheet, visit.read.texts, printer), printer)
  return solved && solved.errors.size > 0 ? data(null, { status: 422 }) : null
}
