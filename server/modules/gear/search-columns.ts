import { isKindKey } from '#shared/kinds/index'
import { searchTextVersion, writeSearchText } from '#shared/search/piece-terms'
import type { StoredSpecs } from '../../db/schema/index'

interface Named {
  readonly kind: string
  readonly brand: string
  readonly model: string
  readonly specs: StoredSpecs
}

/** What a piece is found by, as it is stored beside it. */
export function toSearchColumns({ kind, brand, model, specs }: Named) {
  if (!isKindKey(kind)) return { searchVersion: searchTextVersion }
  const { name, code, fullCode, terms } = writeSearchText({ kind, brand, model, specs })
  return {
    searchName: name,
    searchCode: code,
    searchFullCode: fullCode,
    searchTerms: [...terms],
    searchVersion: searchTextVersion,
  }
}
