import { requireFinite } from './finite'

export const standardPressureKPa = 101.325

/** Gas constant of dry air, J/(kg K): ASHRAE Fundamentals 2017, chapter 1. */
const dryAirGasConstant = 287.042

/**
 * Saturation pressure of water vapour over liquid water, kPa, at a temperature in °C.
 * Source: Hyland & Wexler, as ASHRAE Fundamentals 2017, chapter 1, eq. 6. Range 0–200 °C. RangeError for NaN or a
 * temperature at or below absolute zero.
 */
export function saturationPressureKPa(temperatureC: number): number {
  if (!Number.isFinite(temperatureC)) requireFinite({ temperatureC })
  const kelvin = temperatureC + 273.15
  if (kelvin <= 0) throw new RangeError(`temperatureC must be above absolute zero, got ${temperatureC}`)
  const ln =
    -5.8002206e3 / kelvin +
    1.3914993 +
    kelvin * (-4.8640239e-2 + kelvin * (4.1764768e-5 - kelvin * 1.4452093e-8)) +
    6.5459673 * Math.log(kelvin)
  return Math.exp(ln) / 1000
}

/** Humidity ratio, kg of vapour per kg of dry air (ASHRAE Fundamentals 2017, chapter 1, eq. 20). RangeError for NaN. */
export function humidityRatio(vapourKPa: number, pressureKPa = standardPressureKPa): number {
  if (!Number.isFinite(vapourKPa + pressureKPa)) requireFinite({ vapourKPa, pressureKPa })
  return (0.621945 * vapourKPa) / (pressureKPa - vapourKPa)
}

/** Mass of dry air in a cubic metre of moist air, kg/m³: the density that Shah's model is written in. RangeError for NaN. */
export function dryAirDensityKgM3(temperatureC: number, vapourKPa: number, pressureKPa = standardPressureKPa): number {
  if (!Number.isFinite(temperatureC + vapourKPa + pressureKPa)) requireFinite({ temperatureC, vapourKPa, pressureKPa })
  return ((pressureKPa - vapourKPa) * 1000) / (dryAirGasConstant * (temperatureC + 273.15))
}

/**
 * Heat taken by evaporating a kilogram of water, kJ/kg: 2501 − 2.361 t (FAO Irrigation and Drainage Paper 56; quoted from
 * memory, within 0.3 kJ/kg of IAPWS-IF97 at 25 °C). Range 0–50 °C. RangeError for NaN.
 */
export function latentHeatKJKg(temperatureC: number): number {
  if (!Number.isFinite(temperatureC)) requireFinite({ temperatureC })
  return 2501 - 2.361 * temperatureC
}
