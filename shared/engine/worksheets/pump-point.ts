import { measure } from '../../kinds/build'
import { findCurveFaults } from '../../kinds/consistency-lists'
import { listLossSteps } from './pump-steps'
import { fittingsK, systemHeadM, type Pipe } from '../physics/flow'
import { findOperatingPoint, readPumpCurve, type CurvePoint, type PumpCurve } from '../physics/pump'
import { fromGroup, fromKind, fromSetupField, ownField, required } from './fields'
import { assume } from './plan-inputs'
import { put } from './quantities'
import type { Worksheet } from './types'

export interface PumpValues {
  readonly flowCurve: readonly CurvePoint[]
  readonly staticHeadM: number
  readonly boreMm: number
  readonly pipeLengthM: number
  readonly fittings?: { readonly elbows90?: number; readonly elbows45?: number }
  readonly volumeL?: number
}

/** As the checks take where nobody counted: up and over the rim. */
const usualElbows90 = 2

/** The pipe of a worksheet, and the curve; null where its points name fewer than two flows. */
export function readPumpValues(values: PumpValues): { curve: PumpCurve | null; pipe: Pipe } {
  const { boreMm, pipeLengthM, fittings = {} } = values
  const { elbows90 = usualElbows90, elbows45 = 0 } = fittings
  return {
    curve: readPumpCurve(values.flowCurve),
    pipe: { boreMm, lengthMm: pipeLengthM * 1000, fittingsK: fittingsK(elbows90, boreMm, undefined, elbows45) },
  }
}

const countElbows = (key: string, angle: number) =>
  measure(key, `${angle}° elbows`, 'count', {
    plausible: [0, 40],
    usual: [0, 6],
    role: 'check',
    guide: `Standard ${angle}° elbows between pump and outlet.`,
  })

export const pumpPoint: Worksheet = {
  name: 'pump-point',
  title: 'Where a return pump works',
  intro: 'A pump’s curve against the lift and the pipe: the flow that really arrives.',
  fields: [
    required(fromGroup('flowCurve.*.flowLph', 'return-pump', 'flowCurve', 'flowLph')),
    required(fromGroup('flowCurve.*.headM', 'return-pump', 'flowCurve', 'headM')),
    required(
      ownField(
        'staticHeadM',
        measure('staticHeadM', 'lift', 'm', {
          plausible: [0, 30],
          usual: [0, 2.5],
          role: 'check',
          guide: 'From the water that the pump stands in up to the water or outlet that it feeds.',
        }),
      ),
    ),
    required(
      fromKind('boreMm', 'return-pump', 'boreMm', {
        label: 'bore of the pipe',
        guide: 'Calipers inside the pipe or hose.',
      }),
    ),
    required(
      ownField(
        'pipeLengthM',
        measure('pipeLengthM', 'length of the pipe', 'm', {
          plausible: [0, 100],
          usual: [0.3, 5],
          role: 'check',
          guide: 'All of it from pump to outlet, level stretches too.',
        }),
      ),
    ),
    ownField('fittings.elbows90', countElbows('elbows90', 90)),
    ownField('fittings.elbows45', countElbows('elbows45', 45)),
    fromSetupField('volumeL', 'tank.volumeL', { label: 'water to turn over' }),
  ],
  lists: [{ path: 'flowCurve', label: 'point', least: 2, most: 40 }],
  results: [
    { key: 'flowLph', label: 'Flow', unit: 'L/h' },
    { key: 'headM', label: 'Against', unit: 'm' },
    { key: 'turnoverPerHour', label: 'Turnover', unit: '/h', none: 'give the volume' },
  ],
  basis: {
    type: 'physics',
    source: 'Darcy–Weisbach with Swamee & Jain 1976 friction; fittings by Flow of Fluids, TP-410M; sea water at 25 °C',
  },
  example: {
    flowCurve: [
      { flowLph: 0, headM: 2 },
      { flowLph: 1600, headM: 0 },
    ],
    staticHeadM: 0.9,
    boreMm: 16,
    pipeLengthM: 1.8,
    fittings: { elbows90: 2, elbows45: 0 },
    volumeL: 75,
  },
  work(values: PumpValues, _setup, words) {
    const faults = findCurveFaults({ flowCurve: values.flowCurve })
    if (faults.length > 0)
      return {
        ok: false,
        problems: faults.map(({ path, detail }) => ({ path, detail: `A curve no pump has: ${detail}.` })),
      }
    const { curve, pipe } = readPumpValues(values)
    if (curve === null)
      return {
        ok: false,
        problems: [
          {
            path: 'flowCurve',
            detail: 'Give two points of different flow at least: flow at no head, and the head at which flow ends.',
          },
        ],
      }
    const { staticHeadM, volumeL } = values
    const { flowLph, headM } = findOperatingPoint(curve, (lph) => systemHeadM(lph, staticHeadM, pipe))
    const turnoverPerHour = volumeL === undefined ? null : flowLph / volumeL
    const most = curve.at(-1)?.flowLph ?? 0
    return {
      ok: true,
      result: { flowLph, headM, turnoverPerHour },
      steps: [
        {
          title: 'Flow where both meet',
          formula: 'pump’s head at Q = lift + pipe and fittings at Q, solved for Q',
          text: curve.map((point) => `${put(point.flowLph)} L/h at ${put(point.headM)} m`).join('; '),
          value: flowLph,
          unit: 'L/h',
        },
        ...(flowLph > 0 ? listLossSteps(flowLph, staticHeadM, pipe) : []),
        ...(volumeL === undefined
          ? []
          : [
              {
                title: 'Turnover',
                formula: 'flow ÷ water',
                text: `${put(flowLph)} L/h ÷ ${put(volumeL)} L`,
                value: turnoverPerHour,
                unit: '/h' as const,
              },
            ]),
      ],
      cautions: [
        ...(flowLph === 0 ? ['The pump does not lift the water that high: nothing arrives.'] : []),
        ...(flowLph > 0 && flowLph >= most * (1 - 1e-9)
          ? ['The curve ends before it meets the pipe: the pump may give more than is known of it.']
          : []),
        'Makers’ curves are measured with clean pumps and short hoses. Catch the outlet with a bucket and a stopwatch to be sure.',
      ],
      assumptions:
        values.fittings?.elbows90 === undefined
          ? [assume('fittings.elbows90', usualElbows90, '90° elbows', words.number(usualElbows90, 'count'))]
          : [],
    }
  },
}
