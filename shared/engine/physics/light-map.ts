import { axialIntensityUmolSSr, lambertianOrder } from './beam'
import { requireFinite } from './finite'
import { defaultBeamAngleDeg, layOutLights, listSources, scaleToReading, type Face, type Point } from './light-layout'
import { tabulateUnderWater } from './refraction'

/** How strong a light is: one reading in air straight below its middle, or all the photons that leave it. */
export type LightOutput =
  { readonly ppfdUmol: number; readonly ppfdAtMm: number } | { readonly photonFluxUmolS: number }

export interface Lamp extends Face {
  /** Not given: the estimate by layout. */
  readonly beamAngleDeg?: number
  readonly output: LightOutput
}

export interface LightScene {
  readonly lamp: Lamp
  readonly count: number
  readonly displayLengthMm: number
  readonly displayWidthMm: number
  /** Lens to water. */
  readonly heightMm: number
  /** Water to the plane of the map. */
  readonly depthMm: number
}

/** PPFD at full power in µmol/(m² s), row by row from the back left; cell middles over the display less its margin. */
export interface LightMap {
  readonly columns: number
  readonly rows: number
  readonly cells: Float64Array
  readonly marginMm: number
}

const columns = 60
const rows = 40

/** Next to a wall nothing grows and the model knows least: 50 mm are left out (common practice), of small tanks a quarter. */
function findMarginMm(lengthMm: number, widthMm: number): number {
  return Math.min(50, lengthMm / 4, widthMm / 4)
}

/** Order of a lamp's beam and the axial intensity of each of its sources, µmol/(s sr). RangeError for NaN. */
export function readLamp(lamp: Lamp): { order: number; intensity: number; sources: Point[] } {
  const order = lambertianOrder(lamp.beamAngleDeg ?? defaultBeamAngleDeg[lamp.layout])
  const sources = listSources(lamp)
  const { output } = lamp
  const intensity =
    'ppfdUmol' in output
      ? scaleToReading(sources, order, output.ppfdUmol, output.ppfdAtMm)
      : axialIntensityUmolSSr(output.photonFluxUmolS, order) / sources.length
  return { order, intensity, sources }
}

/**
 * Light from equal lamps on a level plane under flat water, at full power. Every source is a generalised Lambertian,
 * refracted at the surface; reflections from walls and surface are left out. RangeError for NaN.
 */
export function mapLight(scene: LightScene): LightMap {
  const { displayLengthMm, displayWidthMm, heightMm, depthMm } = scene
  requireFinite({ displayLengthMm, displayWidthMm, heightMm, depthMm })
  const { order, intensity, sources } = readLamp(scene.lamp)
  const display = { lengthMm: displayLengthMm, widthMm: displayWidthMm }
  const lights = layOutLights(scene.count, scene.lamp.lengthMm, display)
  const all = lights.flatMap((light) => sources.map(({ xMm, yMm }) => ({ xMm: xMm + light.xMm, yMm: yMm + light.yMm })))
  const reachMm = Math.hypot(
    displayLengthMm / 2 + Math.max(...all.map(({ xMm }) => Math.abs(xMm))),
    displayWidthMm / 2 + Math.max(...all.map(({ yMm }) => Math.abs(yMm))),
  )
  const profile = tabulateUnderWater(order, { heightMm, depthMm }, reachMm)
  const marginMm = findMarginMm(displayLengthMm, displayWidthMm)
  const cells = new Float64Array(columns * rows)
  // Lights and sources lie alike on both sides of the middle, so a quarter of the plane tells the rest.
  for (let row = 0; row < rows / 2; row += 1) {
    for (let column = 0; column < columns / 2; column += 1) {
      const x = ((column + 0.5) / columns - 0.5) * (displayLengthMm - 2 * marginMm)
      const y = ((row + 0.5) / rows - 0.5) * (displayWidthMm - 2 * marginMm)
      let sum = 0
      for (const { xMm, yMm } of all) sum += profile(Math.sqrt((x - xMm) ** 2 + (y - yMm) ** 2))
      for (const mirroredRow of [row, rows - 1 - row]) {
        cells[mirroredRow * columns + column] = intensity * sum
        cells[mirroredRow * columns + columns - 1 - column] = intensity * sum
      }
    }
  }
  return { columns, rows, cells, marginMm }
}
