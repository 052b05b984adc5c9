import {
  chooseBand,
  chooseHeightMm,
  describeLightScene,
  findSpill,
  isDimmable,
  listMissing,
} from '../checks/light-plane'
import { hasAreas } from '../checks/shape'
import { findBestDimming, shareAbove, shareInBand, summariseMap } from '../physics/light-coverage'
import { layOutLights, type Point } from '../physics/light-layout'
import { mapLight, type LightMap } from '../physics/light-map'
import type { Piece, Setup } from '../types'
import { sceneFor } from './scene'

export interface LightOptions {
  /** How many of the light; by default one. */
  readonly quantity?: number
  /** Lens to water; by default the usual height of its mount. */
  readonly heightMm?: number
  /** Water above the plane; by default half of it all. */
  readonly depthMm?: number
}

/** A light's outline over the tank. `xMm` and `yMm` are its middle, from the middle of the display, y towards the front. */
export interface Fixture extends Point {
  readonly lengthMm: number
  readonly widthMm: number
}

/** The light on the plane half way down the water, or at the depth asked for, as it is best set. Shares are 0 to 1. */
export interface LightDrawing {
  /** At full power. */
  readonly map: LightMap
  /** What the corals are kept under, µmol/(m² s). */
  readonly band: readonly [number, number]
  /** Of full power: the dimming that serves best, 100 where the light is not known to dim. */
  readonly percent: number
  /** Of the plane in the band, above and below it, at `percent`. */
  readonly share: number
  readonly aboveShare: number
  readonly belowShare: number
  /** Brightest point of the plane at `percent`, µmol/(m² s). */
  readonly brightestUmol: number
  /** Of the photons, those that miss the water. */
  readonly spill: number
  readonly fixtures: readonly Fixture[]
  readonly heightMm: number
  readonly isHeightGiven: boolean
  /** Water above the plane. */
  readonly depthMm: number
  readonly isDepthGiven: boolean
  readonly display: { readonly lengthMm: number; readonly widthMm: number }
  /** Of the display, the sizes that nobody said. */
  readonly assumed: { readonly length: boolean; readonly width: boolean }
}

/**
 * A light over a setup's display. Null where there is nothing to draw: fish only, a tank whose areas cannot be computed, or
 * a light that lacks numbers. RangeError where the tank has neither size nor volume.
 */
export function drawLight(setup: Setup, piece: Piece, options: LightOptions = {}): LightDrawing | null {
  const scene = sceneFor(setup, 'light')
  const { plan } = scene
  const band = chooseBand(plan.goals.coral)
  if (!band || listMissing(piece).length > 0 || !hasAreas(plan)) return null
  const { quantity = 1, heightMm = chooseHeightMm(piece.specs) } = options
  const half = describeLightScene(scene, piece.specs, quantity, heightMm)
  const lit = { ...half, depthMm: options.depthMm ?? half.depthMm }
  const map = mapLight(lit)
  const percent = isDimmable(piece.specs) === true ? findBestDimming(map, band).powerPercent : 100
  const share = shareInBand(map, band, percent)
  const aboveShare = shareAbove(map, band[1], percent)
  const display = { lengthMm: lit.displayLengthMm, widthMm: lit.displayWidthMm }
  const { lengthMm, widthMm } = lit.lamp
  // A point needs no width to be modelled; it is drawn as deep as it is long.
  const outline = { lengthMm, widthMm: widthMm > 0 ? widthMm : lengthMm }
  const isAssumed = (size: 'Length' | 'Width') =>
    plan.assumed.has(`tank.outer${size}Mm`) && plan.assumed.has(`tank.display${size}Mm`)
  return {
    map,
    band,
    percent,
    share,
    aboveShare,
    belowShare: Math.max(0, 1 - share - aboveShare),
    brightestUmol: (summariseMap(map).brightestUmol * percent) / 100,
    spill: findSpill(scene, piece.specs, quantity, heightMm),
    fixtures: layOutLights(quantity, lengthMm, display).map((middle) => ({ ...middle, ...outline })),
    heightMm,
    isHeightGiven: options.heightMm !== undefined,
    depthMm: lit.depthMm,
    isDepthGiven: options.depthMm !== undefined,
    display,
    assumed: { length: isAssumed('Length'), width: isAssumed('Width') },
  }
}
