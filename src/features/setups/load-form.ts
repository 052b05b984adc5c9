import { data, redirect } from 'react-router-dom'
import type { GearItem } from '#shared/schemas/gear'
import type { KindKey } from '#shared/kinds/index'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { namedPiecesQuery } from '../../components/suggest/suggest-queries'
import type { App } from '../../lib/app-context'
import { requireData } from '../../lib/loading'
import { listSlugs } from './hooks/use-named-items'
import { readFormVisit, writeFormHref, type FormVisit } from './link/read-form-visit'

const simplify = (text: string): string =>
  text
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()

/** The one piece that is called just so: there is nothing to choose. */
const findExact = (found: readonly GearItem[], text: string): GearItem | undefined =>
  found.find(({ brand, model }) => simplify(`${brand} ${model}`) === simplify(text))

const look = (app: App, text: string, kind: KindKey | null) =>
  text === '' ? Promise.resolve([]) : requireData(app, namedPiecesQuery(app.api, text, kind))

/** Fetches what the pieces are called; without it they still have the name of their kind. */
export function startNames({ api, queryClient }: App, { visit }: Pick<FormVisit, 'visit'>): Promise<unknown> {
  return Promise.all(listSlugs(visit.raw).map((slug) => queryClient.prefetchQuery(gearEntryQuery(api, slug))))
}

/** Does what a button of the form asked for, looks up what is searched, and fetches names. */
export async function loadForm(app: App, url: URL): Promise<unknown> {
  const { system } = app.preferences.get()
  const form = readFormVisit(url.searchParams, system)
  if (form.redirect !== undefined) return redirect(form.redirect)
  const { find, findTank, visit, chambers } = form
  const [tanks, pieces] = await Promise.all([look(app, findTank, 'tank'), look(app, find, null), startNames(app, form)])
  const exact = findExact(tanks, findTank) ?? findExact(pieces, find)
  if (exact) {
    const add = new URLSearchParams(writeFormHref(visit.raw, system, { chambers }).split('?')[1])
    add.set('add', `${exact.kind}.${exact.slug}`)
    return redirect(`${url.pathname}?${add.toString()}`)
  }
  return visit.problems.length > 0 ? data(null, { status: 422 }) : null
}
