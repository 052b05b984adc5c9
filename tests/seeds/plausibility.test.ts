import { describe, expect, it } from 'vitest'
import { seedPieces } from '../../seeds/gear/index'
import { createSlug } from '../../server/modules/gear/slug'
import type { KindKey } from '../../shared/kinds/index'
import { readPiece } from './merge'

const pieces = seedPieces.map(readPiece)
const ofKind = (kind: KindKey) => pieces.filter(({ piece }) => piece.kind === kind)

/** Fails with the names of all pieces outside the range, not only the first. */
function expectWithin(rows: readonly { name: string; value: number }[], low: number, high: number, atLeast = 5) {
  expect(rows.length).toBeGreaterThanOrEqual(atLeast)
  const outside = rows.filter(({ value }) => !(value >= low && value <= high))
  expect(outside.map(({ name, value }) => `${name}: ${value.toFixed(3)}`)).toEqual([])
}

/** One figure per piece of a kind, from numbers that it has. */
function compute(kind: KindKey, keys: readonly string[], figure: (...numbers: number[]) => number) {
  return ofKind(kind).flatMap(({ name, numbers }) => {
    const found = numbers(...keys)
    return found ? [{ name, value: figure(...found) }] : []
  })
}

const boxes = new Set(
  ofKind('tank').flatMap(({ name, values }) => (/rectangle|cube/.test(String(values['shape'])) ? [name] : [])),
)

describe('demo tanks', () => {
  it('are sold by a volume within 15 % of their outside size', () => {
    const rows = compute(
      'tank',
      ['nominalVolumeL', 'outerLengthMm', 'outerWidthMm', 'outerHeightMm'],
      (nominal, length, width, height) => (nominal * 1e6) / (length * width * height),
    )
    expectWithin(
      rows.filter(({ name }) => boxes.has(name)),
      0.85,
      1.15,
      60,
    )
  })

  it('weigh what their panes weigh and a little more (EN 572-1 glass 2500 kg/m³, EN 12524 PMMA 1180 kg/m³)', () => {
    const rows = ofKind('tank').flatMap(({ name, values, numbers }) => {
      const found = numbers('dryMassKg', 'outerLengthMm', 'outerWidthMm', 'outerHeightMm', 'wallMm', 'bottomMm')
      if (!found) return []
      const [massKg = 0, l = 0, w = 0, h = 0, wall = 0, bottom = 0] = found
      const bottomM3 = l * w * bottom
      const sides = 2 * wall * (h - bottom) * (l + w - 2 * wall)
      const shellKg = ((bottomM3 + sides) / 1e9) * (values['material'] === 'acrylic' ? 1180 : 2500)
      return [{ name, value: massKg / shellKg }]
    })
    expectWithin(rows, 0.97, 1.15, 60)
  })

  it('turn their water over 3 to 16 times an hour with the pump that comes with them (common practice)', () => {
    const rows = ofKind('tank').flatMap(({ name, values, number }) => {
      const pump = values['includedPump'] as { flowLph: number } | undefined
      return pump ? [{ name, value: pump.flowLph / (number('nominalVolumeL') ?? 0) }] : []
    })
    expectWithin(rows, 3, 16, 30)
  })

  it('fill the back wall with their rear chambers', () => {
    const rows = ofKind('tank').flatMap(({ name, values, numbers }) => {
      const chambers = values['chambers'] as { lengthMm: number }[] | undefined
      const [length = 0, wall = 0] = numbers('outerLengthMm', 'wallMm') ?? []
      if (!chambers) return []
      return [{ name, value: chambers.reduce((sum, chamber) => sum + chamber.lengthMm, 0) / (length - 2 * wall) }]
    })
    expectWithin(rows, 0.9, 1, 30)
  })
})

describe('demo stands', () => {
  it('carry the tanks that they name', () => {
    const tanks = new Map(ofKind('tank').map((tank) => [createSlug(tank.piece.brand, tank.piece.model), tank]))
    const rows = ofKind('stand').flatMap(({ name, values, number }) =>
      ((values['madeForTanks'] ?? []) as string[]).map((slug) => {
        const tank = tanks.get(slug)
        const spareLength = (number('topLengthMm') ?? 0) - (tank?.number('outerLengthMm') ?? Infinity)
        const spareWidth = (number('topWidthMm') ?? 0) - (tank?.number('outerWidthMm') ?? Infinity)
        return { name: `${name} under ${slug}`, value: Math.min(spareLength, spareWidth) }
      }),
    )
    expectWithin(rows, -0.05, 60, 30)
  })
})

describe('demo heaters', () => {
  it('are rated at 0.6 to 3 W for each litre of their largest tank (common practice)', () => {
    expectWithin(
      compute('heater', ['powerW', 'ratedVolumeMaxL'], (powerW, litres) => powerW / litres),
      0.6,
      3,
      90,
    )
  })

  it('load each square centimetre of a rod with at most 4 W in water', () => {
    // Common practice for quartz and titanium sheathed elements in water; no standard sets it.
    const rows = compute('heater', ['powerW', 'lengthMm', 'diameterMm'], (powerW, lengthMm, diameterMm) => {
      return powerW / ((Math.PI * lengthMm * diameterMm) / 100)
    })
    expectWithin(rows, 0.1, 4, 90)
  })
})

describe('demo lights', () => {
  it('give 1.2 to 3.2 µmol for each joule', () => {
    // Between fluorescent tubes and the best diodes; 450 nm photons at full efficiency would be 3.76 (SI constants).
    expectWithin(
      compute('light', ['photonFluxUmolS', 'powerW'], (flux, powerW) => flux / powerW),
      1.2,
      3.2,
      60,
    )
  })

  it('read no more straight below than a point source of that flux and beam could', () => {
    // Generalised Lambertian source, Kahn & Barry 1997: E = (m + 1) Φ / (2π h²), m = −ln 2 / ln cos θ½.
    const rows = compute(
      'light',
      ['ppfdUmol', 'ppfdAtMm', 'photonFluxUmolS', 'beamAngleDeg'],
      (ppfd, atMm, flux, beamDeg) => {
        const m = -Math.LN2 / Math.log(Math.cos((beamDeg / 2) * (Math.PI / 180)))
        return ppfd / (((m + 1) * flux) / (2 * Math.PI * (atMm / 1000) ** 2))
      },
    )
    expectWithin(rows, 0.1, 1.03, 50)
  })
})

describe('demo pumps', () => {
  it('put less than half of their power into the water', () => {
    // Hydraulic power ρ g Q H; small centrifugal pumps reach a third of it at best.
    const rows = ofKind('return-pump').flatMap(({ name, values, number }) => {
      const curve = (values['flowCurve'] ?? []) as { headM: number; flowLph: number }[]
      const powerW = number('powerW')
      const hydraulicW = Math.max(0, ...curve.map(({ headM, flowLph }) => (1023 * 9.81 * headM * flowLph) / 3.6e6))
      return powerW && hydraulicW > 0 ? [{ name, value: hydraulicW / powerW }] : []
    })
    expectWithin(rows, 0.03, 0.5, 30)
  })
})

describe('demo rock, sand and salt', () => {
  it('leave 35 to 55 % of a dry bed of sand to the water', () => {
    // Porosity of poured carbonate and quartz sands, 0.40 to 0.50 in mineral handbooks (from memory).
    const dry = new Set(ofKind('sand').flatMap(({ name, values }) => (values['state'] === 'dry' ? [name] : [])))
    const rows = compute('sand', ['bulkDensityKgL', 'solidDensityKgL'], (bulk, solid) => 1 - bulk / solid)
    expectWithin(
      rows.filter(({ name }) => dry.has(name)),
      0.35,
      0.55,
      10,
    )
  })

  it('make seawater of 35 ppt from 35 to 42 g of mix for each litre', () => {
    // 35 g of salts in a kilogram of water is 35.8 g in a litre; mixes bring bound water besides (common practice).
    expectWithin(
      compute('salt-mix', ['packKg', 'makesL'], (packKg, makesL) => (packKg * 1000) / makesL),
      35,
      42,
      15,
    )
  })
})
