import { readQuestion } from '#shared/engine/ask/read-question'
import type { CatalogueName, Question } from '#shared/engine/ask/types'
import type { AskParsed } from '#shared/schemas/ask'
import { assembleSetup } from '#shared/schemas/assemble-setup'
import type { SetupRequest } from '#shared/schemas/setup'
import type { Snapshot } from '../catalogue/build-snapshot'
import type { Catalogue } from '../catalogue/catalogue.service'

export interface Asked extends Omit<Question, 'fields'> {
  readonly setup: SetupRequest
}

interface KnownNames {
  readonly version: number
  readonly names: readonly CatalogueName[]
}

function isSame(a: CatalogueName | undefined, b: CatalogueName): boolean {
  return a?.slug === b.slug && a.kind === b.kind && a.brand === b.brand && a.model === b.model
}

/**
 * The names of the snapshot. Reading a question looks them up in an index that is made once for each list, so the list
 * stays the same one until a name changes: a corrected number makes a new snapshot, but no new names.
 */
function createNameKeeper(): (snapshot: Snapshot) => readonly CatalogueName[] {
  let known: KnownNames = { version: -1, names: [] }
  return ({ version, entries }) => {
    if (version === known.version) return known.names
    const names = entries.map(({ kind, gear: { slug, brand, model } }) => ({ slug, kind, brand, model }))
    const isUnchanged =
      names.length === known.names.length && names.every((name, index) => isSame(known.names[index], name))
    known = { version, names: isUnchanged ? known.names : names }
    return known.names
  }
}

/** Reads questions against the names of the catalogue. */
export function createAsk(catalogue: Catalogue): (request: AskParsed) => Promise<Asked> {
  const keepNames = createNameKeeper()
  return async ({ text, units }) => {
    const { fields, ...question } = readQuestion(text, units, keepNames(await catalogue.snapshot()))
    return { ...question, setup: assembleSetup(fields, units) }
  }
}
