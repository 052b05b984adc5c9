import { conductivityMSCm } from '../physics/practical-salinity'
import { brixOfSeawater, seawaterIndex } from '../physics/salinity'
import { seawaterDensityKgM3, specificGravity } from '../physics/seawater'
import { fromSetupField, required } from './fields'
import { put } from './quantities'
import type { Step, Worksheet } from './types'

interface Values {
  readonly salinityPpt: number
  readonly temperatureC: number
}

function writeGravity(salinityPpt: number, atC: number): Step {
  const [sea, pure] = [seawaterDensityKgM3(salinityPpt, atC), seawaterDensityKgM3(0, atC)]
  return {
    title: `Specific gravity ${atC}/${atC} °C`,
    formula: `ρ(S, ${atC} °C) ÷ ρ(0, ${atC} °C)`,
    text: `${put(sea, 7)} kg/m³ ÷ ${put(pure, 7)} kg/m³`,
    value: specificGravity(salinityPpt, atC, atC),
    unit: 'number',
    decimals: 4,
    source: 'Both temperatures named, as ASTM E100-14, 3.2.3.1, asks',
  }
}

export const seawater: Worksheet = {
  name: 'seawater',
  title: 'What salinity reads on other scales',
  intro:
    'One salinity as density, specific gravity, conductivity, refractive index, and what a refractometer made for sugar would show.',
  fields: [
    required(fromSetupField('salinityPpt', 'goals.salinityPpt', { plausible: [2, 42] })),
    required(
      fromSetupField('temperatureC', 'goals.temperatureC', {
        plausible: [0, 35],
        guide: 'Of the sample, when it is measured.',
      }),
    ),
  ],
  results: [
    { key: 'sg2525', label: 'Specific gravity 25/25 °C', unit: 'number', decimals: 4 },
    { key: 'sg2020', label: 'Specific gravity 20/20 °C', unit: 'number', decimals: 4 },
    { key: 'conductivityMScm', label: 'Conductivity at this temperature', unit: 'mS/cm', decimals: 1 },
    { key: 'densityKgM3', label: 'Density at this temperature', unit: 'kg/m3', decimals: 2 },
    { key: 'refractiveIndex', label: 'Refractive index at this temperature', unit: 'number', decimals: 5 },
    { key: 'brixEquivalent', label: 'On a sugar scale, at 20 °C', unit: 'Brix', decimals: 2 },
  ],
  basis: {
    type: 'standard',
    source:
      'EOS-80 and PSS-78: UNESCO Technical Papers in Marine Science 44; Quan & Fry 1995, Applied Optics 34; sugar scale: ICUMSA 1974',
  },
  example: { salinityPpt: 35, temperatureC: 25 },
  work({ salinityPpt: s, temperatureC: t }: Values, _setup, words) {
    const densityKgM3 = seawaterDensityKgM3(s, t)
    const conductivity = conductivityMSCm(s, t)
    const refractiveIndex = seawaterIndex(s, t)
    const brixEquivalent = brixOfSeawater(s)
    const [gravity25, gravity20] = [writeGravity(s, 25), writeGravity(s, 20)]
    const at = `S = ${put(s)}, t = ${put(t)} °C`
    return {
      ok: true,
      result: {
        densityKgM3,
        sg2525: gravity25.value,
        sg2020: gravity20.value,
        conductivityMScm: conductivity,
        refractiveIndex,
        brixEquivalent,
      },
      steps: [
        {
          title: 'Density',
          formula: 'ρ = ρw(t) + A(t) S + B(t) S^1.5 + C S²',
          text: at,
          value: densityKgM3,
          unit: 'kg/m3',
          decimals: 2,
          source: 'EOS-80, UNESCO 44, eqs 13–14',
        },
        gravity25,
        gravity20,
        {
          title: 'Conductivity',
          formula: 'PSS-78 solved for C, from C(35, 15 °C) = 42.914 mS/cm',
          text: at,
          value: conductivity,
          unit: 'mS/cm',
          decimals: 1,
          source: 'UNESCO 44, eqs 1–4',
        },
        {
          title: 'Refractive index',
          formula: 'n(S, t, 589.26 nm)',
          text: at,
          value: refractiveIndex,
          unit: 'number',
          decimals: 5,
          source: 'Quan & Fry 1995',
        },
        {
          title: 'On a sugar scale',
          formula: '°Brix of the sucrose solution with the same n at 20 °C',
          text: `n(${put(s)}, 20 °C) = ${put(seawaterIndex(s, 20), 6)}`,
          value: brixEquivalent,
          unit: 'Brix',
          decimals: 2,
          source: 'ICUMSA 1974',
        },
      ],
      cautions: [
        'Water of 35 ppt spans 1.0234 to 1.0269 by convention of specific gravity alone: say which one a number is in.',
        'A sugar scale squeezes 34 to 36 ppt into a quarter of a degree: too coarse to keep sea water by.',
        ...(t > 30 ? [`The refractive index is extrapolated above ${words.temperature(30)}.`] : []),
      ],
      assumptions: [],
    }
  },
}
