import type { Scene } from '../scene'
import { findBestDimming, shareAbove, summariseMap, shareInBand } from '../physics/light-coverage'
import { mapLight, type Lamp, type LightScene } from '../physics/light-map'
import { findHeightForSpillMm, shareSpilled } from '../physics/light-spill'
import { defaults } from '../setup/defaults'
import { thresholds } from '../thresholds'
import type { Coral, Piece, Specs } from '../types'
import { readFlag, readNumber, readSet, readText } from '../values'

/** What one count of a light at one height does to the target plane. */
export interface Plane {
  readonly heightMm: number
  readonly brightestUmol: number
  readonly lowestUmol: number
  readonly meanUmol: number
  /** Share of the plane above the band at full power. */
  readonly aboveShare: number
  /** Share in the band at full power, and at the dimming that serves best. */
  readonly fullShare: number
  readonly bestShare: number
  readonly bestPercent: number
}

/** PAR band of what is kept, µmol/(m² s); null for fish only. Common practice. */
export function chooseBand(coral: readonly Coral[]): readonly [number, number] | null {
  if (coral.length === 0) return null
  return coral.includes('sps')
    ? [thresholds.parSpsLow.value, thresholds.parSpsHigh.value]
    : [thresholds.parSoftLow.value, thresholds.parSoftHigh.value]
}

const listMissingOutput = (specs: Specs): readonly string[] => {
  if (readNumber(specs, 'photonFluxUmolS') !== undefined) return []
  return ['ppfdUmol', 'ppfdAtMm'].filter((key) => readNumber(specs, key) === undefined)
}

/** Attributes without which the light cannot be modelled; a point needs no size. */
export function listMissing({ specs }: Piece): readonly string[] {
  const layout = readText(specs, 'layout')
  const sizes = layout === 'point' ? ['lengthMm'] : ['lengthMm', 'widthMm']
  return [
    ...(layout === undefined ? ['layout'] : []),
    ...sizes.filter((key) => readNumber(specs, key) === undefined),
    ...listMissingOutput(specs),
  ]
}

function describeLamp(specs: Specs): Lamp {
  const reading = readNumber(specs, 'ppfdUmol')
  const readAtMm = readNumber(specs, 'ppfdAtMm')
  const beamAngleDeg = readNumber(specs, 'beamAngleDeg')
  return {
    layout: readText(specs, 'layout') as Lamp['layout'],
    lengthMm: readNumber(specs, 'lengthMm') ?? 0,
    widthMm: readNumber(specs, 'widthMm') ?? 0,
    ...(beamAngleDeg !== undefined && { beamAngleDeg }),
    output:
      reading !== undefined && readAtMm !== undefined
        ? { ppfdUmol: reading, ppfdAtMm: readAtMm }
        : { photonFluxUmolS: readNumber(specs, 'photonFluxUmolS') ?? 0 },
  }
}

/** Whether legs of its own hold the light, and nothing that comes with it could hold it higher. */
export function standsOnLegs(specs: Specs): boolean {
  const mounts = readSet<string>(specs, 'mountsIncluded') ?? []
  return mounts.includes('rim-legs') && !mounts.includes('arm') && !mounts.includes('hanging')
}

/** Lens to water where nobody said: by the mount that comes with the light. */
export const chooseHeightMm = (specs: Specs): number =>
  standsOnLegs(specs) ? defaults.legsHeightMm : defaults.mountHeightMm

/** So many of a light over the display, the plane half way down. The light must lack nothing of `listMissing`. */
export function describeLightScene({ plan }: Scene, specs: Specs, count: number, heightMm: number): LightScene {
  const { tank } = plan
  return {
    lamp: describeLamp(specs),
    count,
    displayLengthMm: tank.displayLengthMm,
    displayWidthMm: tank.displayWidthMm,
    heightMm,
    depthMm: tank.waterLineMm / 2,
  }
}

/** Planes and spills that were computed, per light: setups come back with the same tank over and over. */
const planes = new WeakMap<Specs, Map<string, Plane>>()
const spills = new WeakMap<Specs, Map<string, number>>()
const mostKept = 500

function remember<T>(kept: WeakMap<Specs, Map<string, T>>, specs: Specs, key: string, compute: () => T): T {
  let byKey = kept.get(specs)
  if (!byKey) kept.set(specs, (byKey = new Map<string, T>()))
  let known = byKey.get(key)
  if (known !== undefined) return known
  if (byKey.size >= mostKept) byKey.clear()
  byKey.set(key, (known = compute()))
  return known
}

const keyOf = ({ displayLengthMm, displayWidthMm, depthMm, heightMm, count }: LightScene): string =>
  [displayLengthMm, displayWidthMm, depthMm, heightMm, count].join(' ')

/** The target plane under so many of a light, half way down the water. The light must lack nothing of `listMissing`. */
export function lightPlane(
  scene: Scene,
  specs: Specs,
  count: number,
  heightMm: number,
  band: readonly [number, number],
): Plane {
  const lit = describeLightScene(scene, specs, count, heightMm)
  return remember(planes, specs, `${keyOf(lit)} ${band.join(' ')}`, () => {
    const map = mapLight(lit)
    const { brightestUmol, lowestUmol, meanUmol } = summariseMap(map)
    const best = findBestDimming(map, band)
    return {
      heightMm,
      brightestUmol,
      lowestUmol,
      meanUmol,
      aboveShare: shareAbove(map, band[1]),
      fullShare: shareInBand(map, band),
      bestShare: best.share,
      bestPercent: best.powerPercent,
    }
  })
}

/** Share of the photons that miss the water. */
export function findSpill(scene: Scene, specs: Specs, count: number, heightMm: number): number {
  const lit = describeLightScene(scene, specs, count, heightMm)
  return remember(spills, specs, keyOf(lit), () => shareSpilled(lit))
}

/** The height that brings the spill under the threshold, mm, or null. */
export const findLowerMm = (scene: Scene, specs: Specs, count: number, heightMm: number): number | null =>
  findHeightForSpillMm(
    describeLightScene(scene, specs, count, heightMm),
    thresholds.lightSpill.value,
    defaults.lowestLensMm,
  )

/** Whether the light can be dimmed; unknown where nobody recorded it. */
export const isDimmable = (specs: Specs): boolean | undefined => readFlag(specs, 'dimmable')

/** Share of the plane in the band as the light can be set. */
export const shareOf = (plane: Plane, dimmable: boolean): number => (dimmable ? plane.bestShare : plane.fullShare)
