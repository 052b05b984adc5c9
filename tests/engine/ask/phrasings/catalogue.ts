import type { CatalogueName } from '#shared/engine/ask/types'

/** Invented pieces of invented brands. */
export const catalogue: readonly CatalogueName[] = [
  { slug: 'tidewright-ember-t-90', kind: 'heater', brand: 'Tidewright', model: 'Ember T-90' },
  { slug: 'tidewright-ember-t-150', kind: 'heater', brand: 'Tidewright', model: 'Ember T-150' },
  { slug: 'palelight-lumen-24', kind: 'light', brand: 'Palelight', model: 'Lumen 24' },
  { slug: 'kelpway-drift', kind: 'wavemaker', brand: 'Kelpway', model: 'Drift' },
]
