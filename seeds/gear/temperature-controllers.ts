import { createFamily, measuredBy, remeasure, restate } from '../family'
import { british, continental, northAmerica } from '../mains'

const columns = ['maxLoadW', 'outlets', 'rangeMinC', 'rangeMaxC', 'highAlarm', 'powerW', 'cordMm'] as const

export const temperatureControllers = [
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Warmskerry',
    line: 'Keeper',
    date: '2024-04-22',
    author: 'kelp_and_calipers',
    gtinFrom: 11000,
    common: { ...northAmerica },
    columns,
    rows: {
      One: [1000, 1, 10, 40, true, 3, 1500],
      Two: [1200, 2, 10, 40, true, 3, 1500],
      Pro: [1440, 2, 5, 45, true, 4, 1800],
    },
    later: {
      Two: [remeasure('2025-02-02', 'driploop', 'plug-in meter, nothing switched on', { powerW: [2.4, 0.3] })],
    },
    notes: { Two: 'Both outlets switch together.' },
  }),
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Warmskerry',
    line: 'Keeper UK',
    date: '2024-04-22',
    author: 'kelp_and_calipers',
    common: { ...british },
    columns,
    rows: {
      One: [2000, 1, 10, 40, true, 3, 1500],
      Two: [2400, 2, 10, 40, true, 3, 1500],
    },
  }),
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Emberfathom',
    line: 'Sentry',
    date: '2025-01-13',
    author: 'ppt35',
    gtinFrom: 11010,
    common: {},
    columns: [...columns, 'volts', 'plugType', 'plugs'],
    rows: {
      S1: [2200, 1, 0, 50, false, 2, 1200, [230], 'G', 1],
      S2: [2200, 2, 0, 50, true, 2, 1200, [230], 'G', 1],
      'S2 EU': [2300, 2, 0, 50, true, 2, 1200, [230], 'F', 1],
      'S1 US': [1100, 1, 0, 50, false, 2, 1200, [120], 'A/B', 1],
      'S2 US': [1100, 2, 0, 50, true, 2, 1200, [120], 'A/B', 1],
    },
    discontinued: ['S1'],
    later: {
      'S2 US': [restate('2025-09-09', 'ppt35', 'The new sheet allows more', { maxLoadW: 1200 })],
    },
  }),
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Voltasker',
    line: 'Thermo',
    date: '2024-06-03',
    author: 'quietpump',
    common: { ...northAmerica },
    columns,
    rows: {
      '10': [1200, 1, -40, 100, false, 2, 1400],
      '12': [1200, 2, -40, 100, true, 3, 1400],
      '15': [1800, 2, -50, 99, true, 3, 1800],
      '4X': [1800, 4, -50, 99, true, 5, 1800],
    },
    notes: { '15': 'Made for brewing and greenhouses as much as for tanks; the probe is stainless steel.' },
  }),
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Isobrine',
    line: 'Degree',
    date: '2025-04-28',
    author: 'caliper_crab',
    common: { ...northAmerica },
    columns,
    rows: {
      Mini: [300, 1, 15, 35, false, 1, 1000],
      Duo: [800, 2, 15, 35, true, 2, 1500],
      'Duo Max': [1500, 2, 15, 35, true, 2, 1800],
      // Its sheet names neither the load nor the range.
      Clip: [null, 1, null, null, false, 1, 1000],
    },
    backing: { powerW: measuredBy('plug-in meter, nothing switched on') },
  }),
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Isobrine',
    line: 'Degree EU',
    date: '2025-04-28',
    author: 'caliper_crab',
    common: { ...continental },
    columns,
    rows: {
      Mini: [600, 1, 15, 35, false, 1, 1000],
      Duo: [2000, 2, 15, 35, true, 2, 1500],
      'Duo Max': [3000, 2, 15, 35, true, 2, 1800],
    },
  }),
  ...createFamily({
    kind: 'temperature-controller',
    brand: 'Hearthbrine',
    line: 'Backstop',
    date: '2025-11-17',
    author: 'saltmarsh_jo',
    common: { ...northAmerica },
    columns,
    rows: {
      '500': [500, 1, 18, 32, true, 1.5, 1200],
      '1000': [1000, 1, 18, 32, true, 1.5, 1200],
    },
    notes: { '500': 'Made as a second, independent cut-off behind a heater’s own thermostat.' },
  }),
]
