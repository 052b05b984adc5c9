import type { Provenance } from '#shared/schemas/gear'

/** Where a value is from, as said behind it. */
export const sourceWords: Readonly<Record<Provenance['source'], string>> = {
  measured: 'measured',
  maker: 'its maker’s figure',
  estimate: 'an estimate',
}
