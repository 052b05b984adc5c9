import type { KindKey } from '#shared/kinds/index'

/** The kind of gear that meets an essential need. */
export const needKinds: Readonly<Record<string, KindKey | undefined>> = {
  heat: 'heater',
  outlets: 'power-strip',
  'cycle-tests': 'test-kit',
  'salinity-reading': 'salinity-meter',
  salt: 'salt-mix',
  'pure-water': 'ro-unit',
  circulation: 'wavemaker',
  'glass-cleaning': 'scraper',
  light: 'light',
}
