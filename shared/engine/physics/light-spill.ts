import { findLast } from './bisect'
import { requireFinite } from './finite'
import { layOutLights } from './light-layout'
import { readLamp, type LightScene } from './light-map'

const directions = 180

/**
 * Share of the photons that leave the lights and miss the water's surface, 0–1. For a source at height h over a plane, the
 * photons between two distances R₁ and R₂ in one direction are cosᵐ⁺¹θ₁ − cosᵐ⁺¹θ₂ of all that go that way, so one sum over
 * directions is enough. RangeError for NaN.
 */
export function shareSpilled(scene: Omit<LightScene, 'depthMm'>): number {
  const { displayLengthMm, displayWidthMm, heightMm, lamp, count } = scene
  requireFinite({ displayLengthMm, displayWidthMm, heightMm })
  const { order, sources } = readLamp(lamp)
  const lights = layOutLights(count, lamp.lengthMm, { lengthMm: displayLengthMm, widthMm: displayWidthMm })
  let caught = 0
  for (const light of lights) {
    for (const source of sources) {
      caught += shareCaught(light.xMm + source.xMm, light.yMm + source.yMm, scene, order)
    }
  }
  return Math.min(1, Math.max(0, 1 - caught / (lights.length * sources.length)))
}

type Surface = Pick<LightScene, 'displayLengthMm' | 'displayWidthMm' | 'heightMm'>

function shareCaught(xMm: number, yMm: number, surface: Surface, order: number): number {
  const { displayLengthMm, displayWidthMm, heightMm } = surface
  const beyond = (distance: number) => (heightMm / Math.hypot(heightMm, distance)) ** (order + 1)
  let sum = 0
  for (let step = 0; step < directions; step += 1) {
    const direction = (2 * Math.PI * (step + 0.5)) / directions
    const [x0, x1] = crossings(xMm, Math.cos(direction), displayLengthMm / 2)
    const [y0, y1] = crossings(yMm, Math.sin(direction), displayWidthMm / 2)
    const enters = Math.max(0, x0, y0)
    const leaves = Math.min(x1, y1)
    if (leaves > enters) sum += beyond(enters) - beyond(leaves)
  }
  return sum / directions
}

/** Where a ray along one axis is between −half and +half. */
function crossings(start: number, speed: number, half: number): [number, number] {
  if (Math.abs(speed) < 1e-12) return Math.abs(start) < half ? [-Infinity, Infinity] : [Infinity, -Infinity]
  const one = (-half - start) / speed
  const other = (half - start) / speed
  return one < other ? [one, other] : [other, one]
}

/**
 * The greatest height up to that of the scene, to 1 mm, at which the spill is within `limitShare`; null if it is too much
 * even at `lowestMm`. RangeError for NaN.
 */
export function findHeightForSpillMm(
  scene: Omit<LightScene, 'depthMm'>,
  limitShare: number,
  lowestMm: number,
): number | null {
  requireFinite({ limitShare, lowestMm })
  const holds = (heightMm: number) => shareSpilled({ ...scene, heightMm }) <= limitShare
  return findLast(holds, lowestMm, Math.max(lowestMm, scene.heightMm), 1)
}
