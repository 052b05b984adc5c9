import { describe, expect, it } from 'vitest'
import { lambertianOrder } from '#shared/engine/physics/beam'
import { findBestDimming, shareAbove, shareInBand, summariseMap } from '#shared/engine/physics/light-coverage'
import { layOutLights, listSources } from '#shared/engine/physics/light-layout'
import { mapLight, readLamp, type LightScene } from '#shared/engine/physics/light-map'
import { findHeightForSpillMm, shareSpilled } from '#shared/engine/physics/light-spill'
import { ppfdUnderWaterPerIntensity } from '#shared/engine/physics/refraction'
import { expectWithin, expectWithinShare } from './within'

const panel: LightScene = {
  lamp: { layout: 'panel', lengthMm: 400, widthMm: 200, beamAngleDeg: 90, output: { photonFluxUmolS: 100 } },
  count: 1,
  displayLengthMm: 800,
  displayWidthMm: 500,
  heightMm: 180,
  depthMm: 250,
}
const point: LightScene = {
  ...panel,
  lamp: { layout: 'point', lengthMm: 80, widthMm: 80, beamAngleDeg: 90, output: { ppfdUmol: 300, ppfdAtMm: 300 } },
}

describe('the sources of a light', () => {
  it('are 12 in a strip along its longer side and 12 × 4 in a panel, all round its middle', () => {
    const strip = listSources({ layout: 'strip', lengthMm: 40, widthMm: 600 })
    expect(strip).toHaveLength(12)
    expect(strip.every(({ xMm }) => xMm === 0)).toBe(true)
    expect(strip[0]?.yMm).toBeCloseTo(-275, 9)
    const sources = listSources({ layout: 'panel', lengthMm: 400, widthMm: 200 })
    expect(sources).toHaveLength(48)
    expectWithin(
      sources.reduce((sum, { xMm, yMm }) => sum + xMm + yMm, 0),
      0,
      1e-9,
    )
  })

  it('read in air what the light is said to read', () => {
    // The sum over sources of I₀ cosᵐ⁺¹θ/d², written out here once more.
    const lamp = { ...panel.lamp, output: { ppfdUmol: 400, ppfdAtMm: 300 } }
    const { intensity, order, sources } = readLamp(lamp)
    const reading = sources.reduce((sum, { xMm, yMm }) => {
      const d = Math.hypot(0.3, xMm / 1000, yMm / 1000)
      return sum + (intensity * (0.3 / d) ** (order + 1)) / d ** 2
    }, 0)
    expectWithinShare(reading, 400, 1e-12)
  })

  it('share the photons that the light is said to send out', () => {
    // ∫ I₀ cosᵐθ over a hemisphere = 2π I₀/(m + 1).
    const { intensity, order, sources } = readLamp(panel.lamp)
    expectWithinShare((sources.length * 2 * Math.PI * intensity) / (order + 1), 100, 1e-12)
  })
})

describe('several lights', () => {
  it('hang in a row while they are no longer than the display and 100 mm, else side by side', () => {
    expect(layOutLights(2, 450, { lengthMm: 800, widthMm: 500 }).map(({ xMm }) => xMm)).toEqual([-200, 200])
    expect(layOutLights(2, 451, { lengthMm: 800, widthMm: 500 }).map(({ yMm }) => yMm)).toEqual([-125, 125])
    expect(layOutLights(1, 2000, { lengthMm: 800, widthMm: 500 })).toEqual([{ xMm: 0, yMm: 0 }])
  })
})

describe('a light map', () => {
  it('agrees with photons traced one by one', () => {
    // Independent of the map: directions evenly over a cosᵐ beam (Hammersley points), Snell at the surface, counted in blocks
    // of ten by ten cells, thousands to each.
    const map = mapLight(panel)
    const { order, sources } = readLamp(panel.lamp)
    const cellMm = { x: (800 - 100) / map.columns, y: (500 - 100) / map.rows }
    const perSource = 8192
    const counts = new Map<string, number>()
    for (const source of sources) {
      for (let photon = 0; photon < perSource; photon += 1) {
        const u = (photon + 0.5) / perSource
        let v = 0
        for (let bits = photon, weight = 0.5; bits > 0; bits = bits >> 1, weight /= 2) v += (bits & 1) * weight
        const cos = (1 - u) ** (1 / (order + 1))
        const sin = Math.sqrt(1 - cos * cos)
        const below = sin / 1.34
        const radius = (180 * sin) / cos + (250 * below) / Math.sqrt(1 - below * below)
        const x = source.xMm + radius * Math.cos(2 * Math.PI * v)
        const y = source.yMm + radius * Math.sin(2 * Math.PI * v)
        const key = `${Math.floor((x + 350) / (10 * cellMm.x))} ${Math.floor((y + 200) / (10 * cellMm.y))}`
        counts.set(key, (counts.get(key) ?? 0) + 1)
      }
    }
    const photons = perSource * sources.length
    const areaM2 = (100 * cellMm.x * cellMm.y) / 1e6
    for (let blockX = 0; blockX < 6; blockX += 1) {
      for (let blockY = 0; blockY < 4; blockY += 1) {
        let sum = 0
        for (let cell = 0; cell < 100; cell += 1) {
          const column = blockX * 10 + (cell % 10)
          sum += map.cells[(blockY * 10 + Math.floor(cell / 10)) * map.columns + column] ?? 0
        }
        const traced = (((counts.get(`${blockX} ${blockY}`) ?? 0) / photons) * 100) / areaM2
        const through = 0.979 * Math.exp(-0.14 * 0.25)
        expectWithinShare(sum / 100, traced * through, 0.01)
      }
    }
  })

  it('puts a point light where its formula puts it, cell by cell', () => {
    const map = mapLight(point)
    const intensity = 300 * 0.3 ** 2
    for (const [column, row] of [
      [0, 0],
      [29, 19],
      [59, 39],
      [45, 7],
    ] as const) {
      const x = ((column + 0.5) / 60 - 0.5) * 700
      const y = ((row + 0.5) / 40 - 0.5) * 400
      const order = lambertianOrder(90)
      const direct = ppfdUnderWaterPerIntensity(order, { heightMm: 180, depthMm: 250 }, Math.hypot(x, y))
      expectWithinShare(map.cells[row * 60 + column], intensity * direct, 1e-3)
    }
  })

  it('has its brightest point in the middle, and doubles with the output', () => {
    const map = mapLight(point)
    const { brightestUmol, lowestUmol, meanUmol } = summariseMap(map)
    expect(map.cells[19 * 60 + 29]).toBeCloseTo(brightestUmol, 9)
    expect(lowestUmol).toBeLessThan(meanUmol)
    const twice = mapLight({ ...point, lamp: { ...point.lamp, output: { ppfdUmol: 600, ppfdAtMm: 300 } } })
    expectWithinShare(summariseMap(twice).meanUmol, 2 * meanUmol, 1e-12)
  })
})

describe('coverage', () => {
  const map = mapLight({ ...panel, lamp: { ...panel.lamp, output: { ppfdUmol: 900, ppfdAtMm: 300 } } })

  it('counts the cells inside the band and above a limit', () => {
    const inside = map.cells.filter((cell) => cell * 0.37 >= 50 && cell * 0.37 <= 150).length / 2400
    expect(shareInBand(map, [50, 150], 37)).toBe(inside)
    expect(shareAbove(map, 150, 37)).toBe(map.cells.filter((cell) => cell * 0.37 > 150).length / 2400)
  })

  it('counts a value on the edge of the band as inside, and of equal dimmings takes the lowest', () => {
    const even = { ...map, cells: new Float64Array([100, 100, 100, 100]) }
    expect(shareInBand(even, [50, 100])).toBe(1)
    expect(shareInBand(even, [100, 150])).toBe(1)
    expect(shareInBand(even, [101, 150])).toBe(0)
    expect(findBestDimming(even, [50, 150])).toEqual({ powerPercent: 50, share: 1 })
  })

  it('is at its best at the dimming that trying every percent finds, the lowest of equals', () => {
    const shares = Array.from({ length: 100 }, (_, index) => shareInBand(map, [50, 150], index + 1))
    const best = Math.max(...shares)
    expect(best).toBeGreaterThan(shareInBand(map, [50, 150], 100))
    expect(findBestDimming(map, [50, 150])).toEqual({ powerPercent: shares.indexOf(best) + 1, share: best })
  })
})

describe('spill', () => {
  it('of a Lambertian point is one less the configuration factor of a rectangle', () => {
    // Element to parallel rectangle over its corner, four times for the middle: the catalogues of configuration factors
    // (formula from memory). A cosine beam from above the middle of 800 × 500 mm at 300 mm.
    const [a, b] = [400 / 300, 250 / 300]
    const [sa, sb] = [Math.hypot(1, a), Math.hypot(1, b)]
    const factor = (4 / (2 * Math.PI)) * ((a / sa) * Math.atan(b / sa) + (b / sb) * Math.atan(a / sb))
    const lambertian = { ...point, heightMm: 300, lamp: { ...point.lamp, beamAngleDeg: 120 } }
    expectWithin(shareSpilled(lambertian), 1 - factor, 5e-4)
  })

  it('agrees with adding up the light over the surface, also for a light that sticks out', () => {
    const long = { ...panel, lamp: { ...panel.lamp, lengthMm: 1000 } }
    const { intensity, order, sources } = readLamp(long.lamp)
    let caught = 0
    for (let x = -399; x < 400; x += 2) {
      for (let y = -249; y < 250; y += 2) {
        for (const source of sources) {
          const d2 = 180 ** 2 + (x - source.xMm) ** 2 + (y - source.yMm) ** 2
          caught += (intensity * (180 / Math.sqrt(d2)) ** (order + 1) * 4) / d2
        }
      }
    }
    expectWithin(shareSpilled(long), 1 - caught / 100, 2e-3)
  })

  it('grows with height, and the height that keeps a limit keeps it', () => {
    expect(shareSpilled({ ...panel, heightMm: 300 })).toBeGreaterThan(shareSpilled(panel))
    const height = findHeightForSpillMm({ ...panel, heightMm: 600 }, 0.2, 20)
    expect(height).not.toBeNull()
    expect(shareSpilled({ ...panel, heightMm: height ?? 0 })).toBeLessThanOrEqual(0.2)
    expect(shareSpilled({ ...panel, heightMm: (height ?? 0) + 2 })).toBeGreaterThan(0.2)
    expect(findHeightForSpillMm({ ...panel, heightMm: 600 }, 0.0001, 200)).toBeNull()
  })
})
