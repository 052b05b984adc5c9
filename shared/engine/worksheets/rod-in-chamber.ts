import { measure } from '../../kinds/build'
import { positionsBy } from '../checks/heater-space'
import { chooseStand, describeStand, type Rod, type Stand } from '../checks/rod-space'
import type { Basin } from '../setup/places'
import { fromGroup, fromKind, ownField, required } from './fields'
import { assume } from './plan-inputs'
import { listRodSteps } from './rod-steps'
import { usualClearanceMm, type RodValues } from './rod-values'
import type { Worksheet } from './types'

const asMeasured = (value: number) => ({ value, source: 'measured' as const })

/** Where the rod goes, by the very search that the heater's check makes. */
export function standRod(values: RodValues): Stand | undefined {
  const { lengthMm, diameterMm, minImmersionMm = lengthMm, orientation = 'any', chamber } = values
  const rod: Rod = {
    length: asMeasured(lengthMm),
    diameter: asMeasured(diameterMm),
    immersed: asMeasured(minImmersionMm),
    quantity: 1,
    clearanceMm: values.clearanceMm ?? usualClearanceMm,
  }
  const basin: Basin = {
    ...chamber,
    id: 'chamber',
    name: 'chamber',
    heightMm: chamber.heightMm ?? Number.POSITIVE_INFINITY,
    path: 'chamber',
    source: 'measured',
  }
  return chooseStand(rod, [basin], [], positionsBy[orientation] ?? [])[0]
}

const placed = { upright: 'standing', leaning: 'leaning', flat: 'lying' } as const

export const rodInChamber: Worksheet = {
  name: 'rod-in-chamber',
  title: 'A rod in a chamber',
  intro: 'Whether a heater or probe stands, leans or lies in a chamber, with water around it, and what is left over.',
  fields: [
    required(fromKind('lengthMm', 'heater', 'lengthMm', { plausible: [10, 2000] })),
    required(fromKind('diameterMm', 'heater', 'diameterMm', { label: 'thickness' })),
    fromKind('minImmersionMm', 'heater', 'minImmersionMm', { plausible: [5, 2000] }),
    fromKind('orientation', 'heater', 'orientation', { label: 'may be placed' }),
    required(fromGroup('chamber.lengthMm', 'tank', 'chambers', 'lengthMm')),
    required(fromGroup('chamber.widthMm', 'tank', 'chambers', 'widthMm')),
    required(fromGroup('chamber.waterDepthMm', 'tank', 'chambers', 'waterDepthMm')),
    fromGroup('chamber.heightMm', 'tank', 'chambers', 'heightMm'),
    fromGroup('chamber.openingLengthMm', 'tank', 'chambers', 'openingLengthMm'),
    fromGroup('chamber.openingWidthMm', 'tank', 'chambers', 'openingWidthMm'),
    ownField(
      'clearanceMm',
      measure('clearanceMm', 'water around it', 'mm', {
        plausible: [0, 500],
        usual: [5, 30],
        role: 'check',
        guide: 'To leave between the rod and each wall, seen from above.',
      }),
    ),
  ],
  results: [
    { key: 'position', label: 'Position', unit: null },
    { key: 'slackMm', label: 'To spare at the tightest', unit: 'mm' },
    { key: 'angleDeg', label: 'Angle to the floor', unit: 'deg', none: 'in no position' },
  ],
  basis: {
    type: 'physics',
    source:
      'Rectangle in rectangle: Carver 1957, American Mathematical Monthly 64; Wetzel 2000, Mathematics Magazine 73(3)',
  },
  example: {
    lengthMm: 290,
    diameterMm: 24,
    orientation: 'any',
    chamber: { lengthMm: 100, widthMm: 120, waterDepthMm: 300 },
  },
  work(values: RodValues, _setup, words) {
    const { lengthMm, minImmersionMm } = values
    if (minImmersionMm !== undefined && minImmersionMm > lengthMm)
      return {
        ok: false,
        problems: [
          {
            path: 'minImmersionMm',
            detail: `${words.length(minImmersionMm)} is more than the ${words.length(lengthMm)} of the rod.`,
          },
        ],
      }
    const stand = standRod(values)
    if (stand === undefined)
      return { ok: false, problems: [{ path: 'orientation', detail: 'No position is allowed.' }] }
    const { fits, placement, limitMm, measuredMm } = stand
    const { clearanceMm = usualClearanceMm, orientation, chamber } = values
    return {
      ok: true,
      result: {
        position: fits ? placement.position : 'none',
        angleDeg: fits ? placement.angleDeg : null,
        slackMm: limitMm - measuredMm,
      },
      steps: listRodSteps(values),
      cautions: [
        describeStand(stand)(words),
        ...(fits && placement.position !== 'upright'
          ? [`Only where its maker allows it ${placed[placement.position]}, and wholly under water.`]
          : []),
        'Leaning is judged on the safe side: a rod said to fit does, one said not to may in rare cases.',
      ],
      assumptions: [
        ...(values.clearanceMm === undefined
          ? [assume('clearanceMm', clearanceMm, 'Water around it', words.length(clearanceMm))]
          : []),
        ...(orientation === undefined ? [assume('orientation', 'any', 'May be placed', 'any')] : []),
        ...(minImmersionMm === undefined
          ? [assume('minImmersionMm', lengthMm, 'Least immersion', 'the whole rod')]
          : []),
        ...(chamber.heightMm === undefined
          ? [assume('chamber.heightMm', 'open', 'Chamber height', 'nothing above it')]
          : []),
      ],
    }
  },
}
