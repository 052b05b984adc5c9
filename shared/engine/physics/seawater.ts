import { requireFinite } from './finite'

// Temperatures of EOS-80 are on IPTS-68 (t68 = 1.00024 t90). At 25 °C the scales are 0.006 K apart, which is 0.002 kg/m³:
// thermometer readings are used as they are.

function purePolynomial(t: number): number {
  return 999.842594 + t * (6.793952e-2 + t * (-9.09529e-3 + t * (1.001685e-4 + t * (-1.120083e-6 + t * 6.536332e-9))))
}

/**
 * Density of sea water at one atmosphere, kg/m³, from practical salinity (≈ g/kg) and temperature in °C.
 * Source: EOS-80, Fofonoff & Millard 1983, UNESCO Technical Papers in Marine Science 44, eqs 13–14. Range: salinity
 * 0–42, −2…40 °C; outside it the polynomial is extrapolated, and negative salinity is read as 0. RangeError for NaN.
 */
export function seawaterDensityKgM3(salinityPpt: number, temperatureC: number): number {
  requireFinite({ salinityPpt, temperatureC })
  const s = Math.max(0, salinityPpt)
  const t = temperatureC
  const a = 8.24493e-1 + t * (-4.0899e-3 + t * (7.6438e-5 + t * (-8.2467e-7 + t * 5.3875e-9)))
  const b = -5.72466e-3 + t * (1.0227e-4 - t * 1.6546e-6)
  return purePolynomial(t) + a * s + b * s ** 1.5 + 4.8314e-4 * s * s
}

/**
 * Specific heat of sea water at one atmosphere, J/(kg K). Source: UNESCO 44, eqs 26–28 (after Millero et al. 1973).
 * Range: salinity 0–40, 0–35 °C. RangeError for NaN.
 */
export function seawaterSpecificHeatJKgK(salinityPpt: number, temperatureC: number): number {
  requireFinite({ salinityPpt, temperatureC })
  const s = Math.max(0, salinityPpt)
  const t = temperatureC
  const pure = 4217.4 + t * (-3.720283 + t * (0.1412855 + t * (-2.654387e-3 + t * 2.093236e-5)))
  const a = -7.643575 + t * (0.1072763 - t * 1.38385e-3)
  const b = 0.1770383 + t * (-4.07718e-3 + t * 5.148e-5)
  return pure + a * s + b * s ** 1.5
}

/** Heat needed to warm `volumeL` of sea water by one kelvin, J/K: ρ V cp. RangeError for NaN. */
export function heatCapacityJK(volumeL: number, salinityPpt: number, temperatureC: number): number {
  requireFinite({ volumeL })
  const densityKgL = seawaterDensityKgM3(salinityPpt, temperatureC) / 1000
  return volumeL * densityKgL * seawaterSpecificHeatJKgK(salinityPpt, temperatureC)
}

/**
 * Kinematic viscosity of sea water, m²/s. Source: Sharqawy, Lienhard & Zubair 2010, Desalination and Water Treatment 16,
 * eqs 22–23, over the density of EOS-80. Range: 0–42 g/kg and −2…40 °C (the density's). RangeError for NaN.
 */
export function seawaterKinematicViscosityM2S(salinityPpt: number, temperatureC: number): number {
  return seawaterViscosityPaS(salinityPpt, temperatureC) / seawaterDensityKgM3(salinityPpt, temperatureC)
}

/** Dynamic viscosity of sea water, Pa s; same source. Range: 0–150 g/kg, 0–180 °C. RangeError for NaN. */
export function seawaterViscosityPaS(salinityPpt: number, temperatureC: number): number {
  requireFinite({ salinityPpt, temperatureC })
  const s = Math.max(0, salinityPpt) / 1000
  const t = temperatureC
  const pure = 4.2844e-5 + 1 / (0.157 * (t + 64.993) ** 2 - 91.296)
  const a = 1.541 + 1.998e-2 * t - 9.52e-5 * t * t
  const b = 7.974 - 7.561e-2 * t + 4.724e-4 * t * t
  return pure * (1 + a * s + b * s * s)
}

/**
 * Specific gravity: density of the sample at its temperature over that of pure water at the reference temperature.
 * Both temperatures must be named (ASTM E100-14, 3.2.3.1): 25/25 °C for most instruments of the trade. RangeError for NaN.
 */
export function specificGravity(salinityPpt: number, sampleC: number, waterC: number): number {
  return seawaterDensityKgM3(salinityPpt, sampleC) / seawaterDensityKgM3(0, waterC)
}
