import { countOf } from '../counting'
import { continuousShare, findLoadLimits, wattsToAmps } from '../physics/loads'
import { text } from '../../kinds/build'
import { thresholds } from '../thresholds'
import { fromKind, fromSetupField, ownField, required } from './fields'
import { put } from './quantities'
import { measure } from '../../kinds/build'
import type { Worksheet } from './types'

interface Load {
  readonly name?: string
  readonly powerW: number
  readonly plugs?: number
  readonly quantity?: number
}

interface Values {
  readonly items: readonly Load[]
  readonly strip?: { readonly ratedA?: number; readonly outlets?: number }
  readonly circuit: { readonly volts: number; readonly circuitA: number }
}

export const powerLoad: Worksheet = {
  name: 'power-load',
  title: 'Watts and plugs on one circuit',
  intro: 'Everything that runs around a tank, against what its power strip and circuit carry for hours on end.',
  fields: [
    ownField('items.*.name', text('name', 'what it is', 60, { role: 'display' })),
    required(
      ownField(
        'items.*.powerW',
        measure('powerW', 'power', 'W', {
          plausible: [0, 5000],
          usual: [2, 400],
          role: 'check',
          guide: 'Read the rating plate. Heaters at full power.',
        }),
      ),
    ),
    fromKind('items.*.plugs', 'heater', 'plugs', { label: 'plugs of each' }),
    ownField(
      'items.*.quantity',
      measure('quantity', 'how many', 'count', {
        plausible: [1, 99],
        usual: [1, 4],
        role: 'check',
        guide: 'Of the same.',
      }),
    ),
    fromKind('strip.ratedA', 'power-strip', 'ratedA', { label: 'rated current of the strip' }),
    fromKind('strip.outlets', 'power-strip', 'outlets', { label: 'outlets of the strip' }),
    required(fromSetupField('circuit.volts', 'mains.volts')),
    required(fromSetupField('circuit.circuitA', 'mains.circuitA')),
  ],
  lists: [{ path: 'items', label: 'device', least: 1, most: 40 }],
  results: [
    { key: 'watts', label: 'All together', unit: 'W' },
    { key: 'amps', label: 'Current', unit: 'A' },
    { key: 'limitW', label: 'May run without pause', unit: 'W' },
    { key: 'share', label: 'Share of that', unit: 'fraction' },
    { key: 'plugsUsed', label: 'Plugs', unit: 'count' },
  ],
  basis: thresholds.continuousShare.basis,
  example: {
    items: [
      { name: 'heater', powerW: 100 },
      { name: 'light', powerW: 60 },
      { name: 'return pump', powerW: 18 },
      { name: 'wavemaker', powerW: 6, quantity: 2 },
    ],
    strip: { ratedA: 15, outlets: 8 },
    circuit: { volts: 120, circuitA: 15 },
  },
  work({ items, strip = {}, circuit }: Values, _setup, words) {
    const { volts, circuitA } = circuit
    const loads = items.map(({ powerW, quantity = 1, plugs = 1 }) => ({ powerW, quantity, plugs }))
    const watts = loads.reduce((sum, { powerW, quantity }) => sum + powerW * quantity, 0)
    const plugsUsed = loads.reduce((sum, { plugs, quantity }) => sum + plugs * quantity, 0)
    const ratings = [circuitA, ...(strip.ratedA === undefined ? [] : [strip.ratedA])]
    const { continuousW: limitW, ratedW } = findLoadLimits(volts, ratings)
    const amps = wattsToAmps(watts, volts)
    const spoken = loads.map(({ powerW, quantity }) => (quantity === 1 ? put(powerW) : `${quantity} × ${put(powerW)}`))
    const outlets = strip.outlets
    return {
      ok: true,
      result: { watts, amps, limitW, plugsUsed, share: watts / limitW },
      steps: [
        {
          title: 'All together',
          formula: 'Σ number × power',
          text: `${spoken.join(' + ')} W`,
          value: watts,
          unit: 'W',
        },
        {
          title: 'Current',
          formula: 'power ÷ voltage (power factor 1)',
          text: `${put(watts)} W ÷ ${put(volts)} V`,
          value: amps,
          unit: 'A',
        },
        {
          title: 'May run without pause',
          formula: '80 % × lowest rating × voltage',
          text: `${put(continuousShare)} × ${ratings.length > 1 ? `min(${ratings.map((one) => put(one)).join(', ')})` : put(circuitA)} A × ${put(volts)} V`,
          value: limitW,
          unit: 'W',
          source: thresholds.continuousShare.basis.source,
        },
        {
          title: 'Share of that',
          formula: 'power ÷ what may run without pause',
          text: `${put(watts)} W ÷ ${put(limitW)} W`,
          value: watts / limitW,
          unit: 'fraction',
        },
      ],
      cautions: [
        ...(watts > ratedW
          ? [
              `${words.power(watts)} is more than the ${words.power(ratedW)} that strip and circuit are rated for: move some of it to another circuit.`,
            ]
          : watts > limitW
            ? ['Within the rating, but too much to run for hours: move some of it to another circuit.']
            : []),
        ...(outlets !== undefined && plugsUsed > outlets
          ? [
              `${countOf(plugsUsed - outlets, 'more outlet')} needed: a second strip on its own wall outlet, never one strip on another.`,
            ]
          : []),
        'Mains beside salt water: residual-current (ground-fault) protection, drip loops, no overloaded strips. Local electrical codes and a licensed electrician decide.',
        'Whatever else hangs on the circuit counts too.',
      ],
      assumptions: [],
    }
  },
}
