import { getAttribute } from '../../kinds/index'
import { measure } from '../../kinds/build'
import {
  chooseBand,
  chooseHeightMm,
  describeLightScene,
  findSpill,
  isDimmable,
  listMissing,
} from '../checks/light-plane'
import { findBestDimming, shareInBand, summariseMap } from '../physics/light-coverage'
import { defaultBeamAngleDeg } from '../physics/light-layout'
import { mapLight, type LightScene } from '../physics/light-map'
import { createScene } from '../scene'
import { thresholds } from '../thresholds'
import type { Setup } from '../types'
import { fromKind, fromSetupField, ownField, required } from './fields'
import { listLightSteps } from './light-steps'
import { lightKeys, toLight, type LightValues } from './light-values'
import { assume, isPlan, listUsed, planInputs } from './plan-inputs'
import type { Refused, Worksheet } from './types'

/** Tank and corals; what is kept is asked for by the worksheet itself. */
export const withCoral = (setup: Setup, { coral }: LightValues): Setup =>
  coral === undefined ? setup : { ...setup, goals: { ...setup.goals, coral } }

function refuseLight(values: LightValues): Refused | null {
  const missing = listMissing(toLight(values))
  if (missing.length === 0) return null
  return {
    ok: false,
    problems: missing.map((key) => ({
      path: `light.${key}`,
      detail: `Give the light’s ${getAttribute('light', key)?.label ?? key}${key.startsWith('ppfd') ? ', or its photon flux' : ''}.`,
    })),
  }
}

const coralField = fromSetupField('coral', 'goals.coral')

const lightUses = [
  'outerLengthMm',
  'outerWidthMm',
  'outerHeightMm',
  'displayLengthMm',
  'displayWidthMm',
  'waterLineMm',
].map((key) => `tank.${key}`)

export const lightMap: Worksheet = {
  name: 'light-map',
  title: 'Light over a tank',
  intro: 'How a light spreads over one level of the water: the band that corals are kept in, and what misses the tank.',
  setup: {
    sections: ['tank'],
    asks: [
      'tank.volumeL',
      'tank.outerLengthMm',
      'tank.outerWidthMm',
      'tank.outerHeightMm',
      'tank.displayLengthMm',
      'tank.displayWidthMm',
      'tank.waterLineMm',
    ],
  },
  fields: [
    ...lightKeys.map((key) => {
      const field = fromKind(`light.${key}`, 'light', key)
      return key === 'layout' || key === 'lengthMm' ? required(field) : field
    }),
    ownField(
      'quantity',
      measure('quantity', 'how many lights', 'count', {
        plausible: [1, 12],
        usual: [1, 4],
        role: 'check',
        guide: 'Of the same, in a row or side by side.',
      }),
    ),
    ownField(
      'mountHeightMm',
      measure('mountHeightMm', 'lens above the water', 'mm', {
        plausible: [10, 3000],
        usual: [60, 500],
        role: 'check',
        guide: 'From the lens of the light to the water.',
      }),
    ),
    ownField(
      'depthMm',
      measure('depthMm', 'depth of the corals', 'mm', {
        plausible: [0, 2400],
        usual: [50, 500],
        role: 'check',
        guide: 'From the water surface down to the level that the map shows.',
      }),
    ),
    coralField,
  ],
  results: [
    { key: 'coverage', label: 'In the band', unit: 'fraction', none: 'no band without corals' },
    { key: 'dimming', label: 'Best set to', unit: 'fraction', none: 'no band without corals' },
    { key: 'maxUmol', label: 'Brightest point, undimmed', unit: 'umol/m2/s' },
    { key: 'meanUmol', label: 'Mean, undimmed', unit: 'umol/m2/s' },
    { key: 'minUmol', label: 'Dimmest point, undimmed', unit: 'umol/m2/s' },
    { key: 'spill', label: 'Misses the water', unit: 'fraction' },
  ],
  basis: {
    type: 'physics',
    source:
      'Generalised Lambertian beam (Kahn & Barry 1997, Proceedings of the IEEE 85), Snell and Fresnel at a flat surface, attenuation 0.14 per metre (Pope & Fry 1997); bands: common practice',
  },
  example: {
    tank: { outerLengthMm: 610, outerWidthMm: 406, outerHeightMm: 406 },
    light: { layout: 'panel', lengthMm: 200, widthMm: 120, ppfdUmol: 420, ppfdAtMm: 300, beamAngleDeg: 80 },
    quantity: 1,
    mountHeightMm: 200,
    coral: ['soft', 'lps'],
  },
  work(values: LightValues, setup, words) {
    const plan = planInputs(withCoral(setup, values), words)
    if (!isPlan(plan)) return plan
    const refused = refuseLight(values)
    if (refused) return refused
    const light = toLight(values)
    const { tank, goals } = plan
    const { quantity = 1, mountHeightMm = chooseHeightMm(light.specs), depthMm = tank.waterLineMm / 2 } = values
    if (depthMm >= tank.waterLineMm)
      return {
        ok: false,
        problems: [
          {
            path: 'depthMm',
            detail: `${words.length(depthMm)} is more than the ${words.length(tank.waterLineMm)} of water in the tank.`,
          },
        ],
      }
    const scene = createScene(plan, [])
    const lit: LightScene = { ...describeLightScene(scene, light.specs, quantity, mountHeightMm), depthMm }
    const map = mapLight(lit)
    const { lowestUmol, brightestUmol, meanUmol } = summariseMap(map)
    const band = chooseBand(goals.coral)
    const isDimmed = isDimmable(light.specs) === true
    const best = band && (isDimmed ? findBestDimming(map, band) : { powerPercent: 100, share: shareInBand(map, band) })
    const spill = findSpill(scene, light.specs, quantity, mountHeightMm)
    return {
      ok: true,
      result: {
        grid: { columns: map.columns, rows: map.rows, marginMm: map.marginMm, cells: Array.from(map.cells) },
        dimming: best && best.powerPercent / 100,
        band,
        minUmol: lowestUmol,
        meanUmol,
        maxUmol: brightestUmol,
        coverage: best && best.share,
        spill,
      },
      steps: listLightSteps(lit, map, band, best, spill),
      cautions: [
        ...(band === null ? ['Fish only: no band of light is asked for.'] : []),
        ...(band && brightestUmol < band[0] ? ['Even the brightest point stays under the band.'] : []),
        ...(spill > thresholds.lightSpill.value ? ['Much of the light misses the water: hang it lower.'] : []),
        'Reflections from walls and surface are left out, and the water is taken as clear and calm. Measure with a quantum meter before trusting corals to it, and acclimate slowly.',
      ],
      assumptions: [
        ...listUsed(plan, [...lightUses, 'goals.coral'], words, [coralField]),
        ...(values.mountHeightMm === undefined
          ? [assume('mountHeightMm', mountHeightMm, 'Lens above the water', words.length(mountHeightMm))]
          : []),
        ...(values.depthMm === undefined
          ? [assume('depthMm', depthMm, 'Depth of the corals', words.length(depthMm))]
          : []),
        ...(values.light.beamAngleDeg === undefined
          ? [
              assume(
                'light.beamAngleDeg',
                defaultBeamAngleDeg[lit.lamp.layout],
                'Beam angle',
                words.measure(defaultBeamAngleDeg[lit.lamp.layout], 'deg'),
              ),
            ]
          : []),
        ...(values.light.dimmable === undefined ? [assume('light.dimmable', true, 'Dimmable', 'yes')] : []),
      ],
    }
  },
}
