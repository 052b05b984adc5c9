import { findLast } from './bisect'
import { requireFinite } from './finite'

/** Of sea water for visible light, rounded: Quan & Fry 1995 gives 1.337–1.345 from 650 to 450 nm. */
export const waterIndex = 1.34

/** What passes a flat surface: Fresnel at normal incidence, 1 − ((n − 1)/(n + 1))². */
export const surfaceTransmission = 0.979

/** Per metre of depth: pure water over 400–700 nm and the first 0.6 m (Pope & Fry 1997). Clear tanks: 0.1–0.3, in practice. */
export const attenuationPerM = 0.14

/** A source above flat water and a plane below it. */
export interface Depths {
  /** Lens to water. */
  readonly heightMm: number
  /** Water to plane. */
  readonly depthMm: number
}

// Grazing rays carry next to nothing and land far outside any tank.
const steepestRad = (89.9 * Math.PI) / 180

/** Angle to the vertical under water, radians, of a ray that arrives at `angleRad`: Snell, sin θt = sin θ / n. */
export function refractRad(angleRad: number, index = waterIndex): number {
  requireFinite({ angleRad, index })
  return Math.asin(Math.sin(angleRad) / index)
}

function landingMm(angle: number, { heightMm, depthMm }: Depths): number {
  return heightMm * Math.tan(angle) + depthMm * Math.tan(refractRad(angle))
}

/** Share of photons that get through the surface and down to a depth (by depth, not by path). RangeError for NaN. */
export function transmissionTo(depthMm: number): number {
  requireFinite({ depthMm })
  return surfaceTransmission * Math.exp((-attenuationPerM * depthMm) / 1000)
}

/**
 * Geometric dilution of a beam of order m at a plane under water, 1/m² per unit of axial intensity:
 * cosᵐθ sin θ dθ / (r dr), with r(θ) = h tan θ + z tan θt. All photons sent into a ring of directions land in a ring of the
 * plane, so their number is kept. On the axis 1/(h + z/n)².
 */
function dilution(angle: number, order: number, depths: Depths): number {
  const { heightMm, depthMm } = depths
  const below = refractRad(angle)
  const spread = heightMm / Math.cos(angle) ** 2 + (depthMm * Math.cos(angle)) / (waterIndex * Math.cos(below) ** 3)
  const sinOverLanding =
    angle < 1e-6 ? 1 / (heightMm + depthMm / waterIndex) : Math.sin(angle) / landingMm(angle, depths)
  return (Math.cos(angle) ** order * sinOverLanding * 1e6) / spread
}

/**
 * PPFD on a level plane under flat water, µmol/(m² s) per µmol/(s sr) of axial intensity, `offsetMm` to the side of a point
 * source: the dilution times `transmissionTo`. Reflections are left out. Height and depth together must be above 0.
 * RangeError for NaN.
 */
export function ppfdUnderWaterPerIntensity(order: number, depths: Depths, offsetMm: number): number {
  requireFinite({ order, heightMm: depths.heightMm, depthMm: depths.depthMm, offsetMm })
  if (depths.heightMm + depths.depthMm <= 0) throw new RangeError('height and depth must together be above 0')
  const angle = findLast((tried) => landingMm(tried, depths) <= Math.abs(offsetMm), 0, steepestRad) ?? 0
  if (angle >= steepestRad) return 0
  return dilution(angle, order, depths) * transmissionTo(depths.depthMm)
}

/**
 * The same as a table over the offset in mm, for the many cells of a map: linear between points spaced evenly up to
 * `reachMm`, 0 beyond, within 1e-4 of the axial value. RangeError for NaN.
 */
export function tabulateUnderWater(order: number, depths: Depths, reachMm: number): (offsetMm: number) => number {
  requireFinite({ order, heightMm: depths.heightMm, depthMm: depths.depthMm, reachMm })
  const steps = 1024
  const table = new Float64Array(steps + 2)
  const perMm = steps / reachMm
  const through = transmissionTo(depths.depthMm)
  const last = findLast((tried) => landingMm(tried, depths) <= reachMm, 0, steepestRad) ?? 0
  const rays = 2 * steps
  let point = 0
  let before = { at: 0, value: dilution(0, order, depths) * through }
  for (let ray = 1; ray <= rays; ray += 1) {
    const angle = (last * ray) / rays
    const after = { at: landingMm(angle, depths) * perMm, value: dilution(angle, order, depths) * through }
    for (; point <= Math.min(steps, after.at); point += 1) {
      const share = (point - before.at) / (after.at - before.at)
      table[point] = before.value + share * (after.value - before.value)
    }
    before = after
  }
  return (offsetMm) => {
    const at = offsetMm * perMm
    if (at > steps) return 0
    const cell = Math.floor(at)
    const left = table[cell] ?? 0
    return left + (at - cell) * ((table[cell + 1] ?? 0) - left)
  }
}
