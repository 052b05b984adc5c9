import Fuse from 'fuse.js'
import { kindKeys, kinds, type KindKey } from '#shared/kinds/index'
import type { GearItem } from '#shared/schemas/gear'
import { paths } from '../../config/paths'

export interface SuggestScope {
  /** `question`: a kind is asked about, keeping the setup; `gear`: its list is opened; `piece`: one is named, to be sent. */
  readonly page: 'question' | 'gear' | 'piece'
  readonly kind: KindKey | null
}

interface SuggestionBase {
  readonly id: string
  readonly label: string
  /** What choosing it leads to. */
  readonly detail: string
}

/** Leads somewhere, or is what to ask for instead of what was typed. */
export type Suggestion = SuggestionBase & ({ readonly href: string } | { readonly text: string })

export interface Brand {
  readonly name: string
  readonly count: number
}

const most = 3
/** A longer text is a sentence, and no name begins like it. */
const longestName = 40

const options = { ignoreLocation: true, ignoreDiacritics: true, threshold: 0.3 } as const

const fuseOfKinds = new Fuse(
  kindKeys.map((key) => kinds[key]),
  { ...options, keys: ['label', 'plural'] },
)

function suggestKinds(text: string, { page }: SuggestScope): Suggestion[] {
  return fuseOfKinds.search(text, { limit: most }).map(({ item: { key, label, plural } }) => ({
    id: `kind-${key}`,
    label: plural,
    ...(page === 'question'
      ? { detail: 'which fit', text: label }
      : { detail: 'all of them', href: `${paths.gearList}?kind=${key}` }),
  }))
}

function suggestBrands(text: string, brands: readonly Brand[]): Suggestion[] {
  const fuse = new Fuse(brands, { ...options, keys: ['name'] })
  return fuse.search(text, { limit: most }).map(({ item: { name, count } }) => ({
    id: `brand-${name}`,
    label: name,
    detail: count === 1 ? '1 piece' : `${count} pieces`,
    href: `${paths.gearList}?${new URLSearchParams({ brand: name }).toString()}`,
  }))
}

const labelKind = (kind: string): string => (kind in kinds ? kinds[kind as KindKey].label : kind)

const toNamed = ({ slug, brand, model, kind }: GearItem): Suggestion => ({
  id: `piece-${slug}`,
  label: `${brand} ${model}`,
  detail: labelKind(kind),
  text: `${brand} ${model}`,
})

/** Kinds and brands that are called like the text, then pieces that a search found. */
export function findSuggestions(
  typed: string,
  scope: SuggestScope,
  brands: readonly Brand[],
  pieces: readonly GearItem[],
): readonly Suggestion[] {
  const text = typed.trim()
  if (text.length < 2 || text.length > longestName) return []
  if (scope.page === 'piece') return pieces.map(toNamed)
  return [
    ...suggestKinds(text, scope),
    ...suggestBrands(text, brands),
    ...pieces.map(({ slug, brand, model, kind }) => ({
      id: `piece-${slug}`,
      label: `${brand} ${model}`,
      detail: labelKind(kind),
      href: paths.gear(slug),
    })),
  ]
}
