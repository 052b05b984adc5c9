import type { Database } from '../../server/db/database'
import { importPieces } from '../../server/modules/gear/gear-writes.service'
import type { PieceInput, RevisionInput } from '../../server/modules/gear/gear.types'

/** Invented, and of no brand of the demo data, so that a test sees its own records alone. */
export const testBrand = 'Quillmoor Testworks'

type Values = Readonly<Record<string, unknown>>

export function describeRevision(values: Values, more: Partial<RevisionInput> = {}): RevisionInput {
  const sourced = Object.entries(values).map(([key, value]) => [key, { value, source: 'measured' as const }] as const)
  return { date: '2025-03-31', author: 'tester', values: Object.fromEntries(sourced), ...more }
}

export function describePiece(model: string, values: Values, more: Partial<PieceInput> = {}): PieceInput {
  return { kind: 'heater', brand: testBrand, model, status: 'current', revisions: [describeRevision(values)], ...more }
}

/** A rod that has everything a heater check reads. */
export const wholeHeater: Values = {
  form: 'titanium-rod',
  powerW: 150,
  lengthMm: 220,
  diameterMm: 25,
  thermostat: 'built-in',
  orientation: 'any',
  volts: [120],
  plugs: 1,
  plugType: 'A/B',
}

/** Three heaters, called A, B and C. */
export async function addHeaters(db: Database): Promise<void> {
  const { powerW: _, ...powerless } = wholeHeater
  await importPieces(db, [
    describePiece('Rod A', wholeHeater),
    describePiece('Rod B', { ...wholeHeater, lengthMm: 600 }),
    describePiece('Rod C', powerless),
  ])
}

/** About 75 L, with one rear chamber of 4 × 5 × 12 in. */
export const rearChamberSetup = {
  units: 'us',
  country: 'US',
  tank: {
    outerLengthMm: 609.6,
    outerWidthMm: 406.4,
    outerHeightMm: 355.6,
    chambers: [{ id: 'rear', lengthMm: 101.6, widthMm: 127, waterDepthMm: 304.8 }],
  },
}
