import type { Gear } from '#shared/schemas/gear'

const maker = { source: 'maker', date: '2025-03-04', author: 'Invented Importer', revision: 1 } as const

const create = (kind: string, slug: string, model: string, specs: Record<string, unknown>): Gear => ({
  slug,
  kind,
  brand: 'Invented',
  model,
  gtin: null,
  status: 'current',
  revision: 3,
  updatedAt: '2025-03-04T00:00:00.000Z',
  createdAt: '2025-03-04T00:00:00.000Z',
  notes: null,
  specs,
  provenance: Object.fromEntries(Object.keys(specs).map((key) => [key, maker])),
  confirmations: {},
  sources: {},
  disputed: [],
})

/** A made-up heater as the API answers it. */
export const inventedHeater = create('heater', 'invented-ember-100', 'Ember 100', {
  form: 'glass-rod',
  lengthMm: 269,
  diameterMm: 24,
  powerW: 100,
  volts: [120],
})

export const inventedTank = create('tank', 'invented-pane-60', 'Pane 60', {
  outerLengthMm: 600,
  outerWidthMm: 400,
  outerHeightMm: 400,
  wallMm: 6,
  chambers: [{ id: 'rear-1', widthMm: 100 }],
})
