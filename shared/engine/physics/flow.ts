import { requireFinite } from './finite'
import { seawaterKinematicViscosityM2S } from './seawater'
import { standardGravityMS2 } from './weight'

export interface Pipe {
  readonly boreMm: number
  readonly lengthMm: number
  /** Sum of the loss coefficients of entry, exit and fittings. */
  readonly fittingsK: number
  /** Not given: smooth plastic. */
  readonly roughnessMm?: number
}

/** Of smooth plastic pipe and hose, mm. */
export const plasticRoughnessMm = 0.0015

/** Viscosity of sea water at salinity 35 and 25 °C, m²/s: plumbing is judged at one temperature. */
export const plumbingViscosityM2S = seawaterKinematicViscosityM2S(35, 25)

/** Sharp entry (from memory) and exit into still water. */
const entryK = 0.5
const exitK = 1

/** Speed in a bore, m/s. RangeError for NaN. */
export function flowSpeedMS(flowLph: number, boreMm: number): number {
  requireFinite({ flowLph, boreMm })
  return flowLph / 3.6e6 / ((Math.PI / 4) * (boreMm / 1000) ** 2)
}

/** Reynolds number v D / ν. RangeError for NaN. */
export function reynoldsNumber(speedMS: number, boreMm: number, viscosityM2S = plumbingViscosityM2S): number {
  requireFinite({ speedMS, boreMm, viscosityM2S })
  return (Math.abs(speedMS) * boreMm) / 1000 / viscosityM2S
}

/**
 * Darcy friction factor: 64/Re below 2300, else Swamee & Jain 1976, 0.25/log₁₀(ε/3.7D + 5.74/Re^0.9)², which holds for
 * 5000 ≤ Re ≤ 1e8 and 1e-6 ≤ ε/D ≤ 1e-2 and is used from 2300 on. RangeError for NaN.
 */
export function frictionFactor(reynolds: number, relativeRoughness: number): number {
  requireFinite({ reynolds, relativeRoughness })
  if (reynolds < 2300) return 64 / Math.max(reynolds, 1e-9)
  return 0.25 / Math.log10(relativeRoughness / 3.7 + 5.74 / reynolds ** 0.9) ** 2
}

/** Friction factor of fully rough flow, f_T, on which the loss of a bend is based. RangeError for NaN. */
export function roughFrictionFactor(relativeRoughness: number): number {
  requireFinite({ relativeRoughness })
  return 0.25 / Math.log10(relativeRoughness / 3.7) ** 2
}

/**
 * Loss coefficient of entry, exit and standard elbows, 30 f_T for each of 90° and 16 f_T for each of 45° (Flow of Fluids,
 * TP-410M). RangeError for NaN.
 */
export function fittingsK(elbows90: number, boreMm: number, roughnessMm = plasticRoughnessMm, elbows45 = 0): number {
  requireFinite({ elbows90, elbows45, boreMm, roughnessMm })
  return entryK + exitK + (elbows90 * 30 + elbows45 * 16) * roughFrictionFactor(roughnessMm / boreMm)
}

/**
 * Head lost in a pipe, m: Darcy–Weisbach f (L/D) v²/2g for its length and ΣK v²/2g for its fittings. RangeError for NaN.
 */
export function pipeLossM(flowLph: number, pipe: Pipe, viscosityM2S = plumbingViscosityM2S): number {
  const { boreMm, lengthMm } = pipe
  const roughnessMm = pipe.roughnessMm ?? plasticRoughnessMm
  requireFinite({ flowLph, boreMm, lengthMm, roughnessMm, fittingsK: pipe.fittingsK })
  if (flowLph <= 0) return 0
  const speed = flowSpeedMS(flowLph, boreMm)
  const friction = frictionFactor(reynoldsNumber(speed, boreMm, viscosityM2S), roughnessMm / boreMm)
  return ((friction * (lengthMm / boreMm) + pipe.fittingsK) * speed * speed) / (2 * standardGravityMS2)
}

/** Head that a flow takes, m: the height that it is lifted and what the pipe takes. It rises with the flow. RangeError for NaN. */
export function systemHeadM(flowLph: number, staticHeadM: number, pipe: Pipe): number {
  requireFinite({ staticHeadM })
  return staticHeadM + pipeLossM(flowLph, pipe)
}
