import { spotDiameterMm, lambertianOrder } from '../physics/beam'
import type { Coverage } from '../physics/light-coverage'
import { summariseMap } from '../physics/light-coverage'
import { defaultBeamAngleDeg } from '../physics/light-layout'
import type { LightMap, LightScene } from '../physics/light-map'
import { attenuationPerM, surfaceTransmission, transmissionTo, waterIndex } from '../physics/refraction'
import { put } from './quantities'
import type { Step } from './types'

/** How the map comes about: the beam, the way down, and what is read off the map. */
export function listLightSteps(
  { lamp, count, heightMm, depthMm }: LightScene,
  map: LightMap,
  band: readonly [number, number] | null,
  best: Coverage | null,
  spill: number,
): readonly Step[] {
  const angle = lamp.beamAngleDeg ?? defaultBeamAngleDeg[lamp.layout]
  const { brightestUmol, meanUmol } = summariseMap(map)
  const cells = map.cells.length
  return [
    {
      title: 'Order of the beam',
      formula: 'm = −ln 2 ÷ ln cos(beam angle ÷ 2)',
      text: `−ln 2 ÷ ln cos(${put(angle)}° ÷ 2)`,
      value: lambertianOrder(angle),
      unit: 'number',
      source: 'Kahn & Barry 1997, Proceedings of the IEEE 85 (cited from memory)',
    },
    {
      title: 'Width of its beam on the water, to half the intensity',
      formula: '2 h tan(beam angle ÷ 2)',
      text: `2 × ${put(heightMm)} mm × tan(${put(angle)}° ÷ 2)`,
      value: spotDiameterMm(angle, heightMm),
      unit: 'mm',
    },
    {
      title: 'What gets through the surface and down',
      formula: '0.979 × exp(−0.14 z)',
      text: `${surfaceTransmission} × exp(−${attenuationPerM} × ${put(depthMm / 1000)} m)`,
      value: transmissionTo(depthMm),
      unit: 'fraction',
      source: 'Fresnel at n = 1.34; Pope & Fry 1997, Applied Optics 36',
    },
    {
      title: 'Brightest point',
      formula: 'Σ over lights and sources of I(θ) sin θ dθ ÷ (r dr), with r = h tan θ + z tan θt, sin θt = sin θ ÷ n',
      text: `${put(count)} × ${lamp.layout}, h = ${put(heightMm)} mm, z = ${put(depthMm)} mm, n = ${waterIndex}`,
      value: brightestUmol,
      unit: 'umol/m2/s',
    },
    {
      title: 'Mean of the map',
      formula: 'Σ cells ÷ number of cells',
      text: `${map.columns} × ${map.rows} cells`,
      value: meanUmol,
      unit: 'umol/m2/s',
    },
    ...(band && best
      ? [
          {
            title: 'In the band',
            formula: 'cells in the band ÷ all cells, at the dimming of 1 % steps that serves best',
            text: `${Math.round(best.share * cells)} of ${cells} cells between ${put(band[0])} and ${put(band[1])} µmol/m²/s at ${best.powerPercent} %`,
            value: best.share,
            unit: 'fraction' as const,
          },
        ]
      : []),
    {
      title: 'Misses the water',
      formula: '1 − photons that meet the water ÷ photons that leave the lights',
      text: 'summed over 180 directions from each source',
      value: spill,
      unit: 'fraction',
    },
  ]
}
