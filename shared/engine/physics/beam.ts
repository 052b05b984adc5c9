import { requireFinite } from './finite'

/**
 * Order m of a generalised Lambertian beam, whose intensity falls as cosᵐθ: m = −ln 2 / ln cos θ½, from the full angle
 * between the directions of half intensity, 0–180° (held to 1–179°).
 * Source: Kahn & Barry 1997, Proceedings of the IEEE 85, 265 (cited from memory). RangeError for NaN.
 */
export function lambertianOrder(beamAngleDeg: number): number {
  requireFinite({ beamAngleDeg })
  const half = (Math.min(179, Math.max(1, beamAngleDeg)) / 2) * (Math.PI / 180)
  return -Math.LN2 / Math.log(Math.cos(half))
}

/** Intensity straight down, µmol/(s sr), of a beam that sends out `photonFluxUmolS` in all: (m+1)Φ/2π. RangeError for NaN. */
export function axialIntensityUmolSSr(photonFluxUmolS: number, order: number): number {
  requireFinite({ photonFluxUmolS, order })
  return ((order + 1) * photonFluxUmolS) / (2 * Math.PI)
}

/**
 * PPFD on a level plane in air, µmol/(m² s), `heightMm` below a point source and `offsetMm` to its side:
 * I₀ cosᵐ⁺¹θ / d². RangeError for NaN; height must be above 0.
 */
export function ppfdInAirUmol(axialIntensity: number, order: number, heightMm: number, offsetMm: number): number {
  requireFinite({ axialIntensity, order, heightMm, offsetMm })
  if (heightMm <= 0) throw new RangeError(`heightMm must be above 0, got ${heightMm}`)
  const distance2 = heightMm * heightMm + offsetMm * offsetMm
  return (axialIntensity * (heightMm / Math.sqrt(distance2)) ** (order + 1) * 1e6) / distance2
}

/** Diameter of the circle on a plane inside which a beam is above half of its axial intensity, mm: 2h tan(θ/2). */
export function spotDiameterMm(beamAngleDeg: number, heightMm: number): number {
  requireFinite({ beamAngleDeg, heightMm })
  return 2 * heightMm * Math.tan((beamAngleDeg / 2) * (Math.PI / 180))
}
