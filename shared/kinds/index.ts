import { autoTopOff } from './auto-top-off'
import { boosterPump } from './booster-pump'
import { heater } from './heater'
import { light } from './light'
import { lightController } from './light-controller'
import { lightMount } from './light-mount'
import { net } from './net'
import { powerStrip } from './power-strip'
import { returnPump } from './return-pump'
import { rock } from './rock'
import { roUnit } from './ro-unit'
import { salinityMeter } from './salinity-meter'
import { saltMix } from './salt-mix'
import { sand } from './sand'
import { scraper } from './scraper'
import { siphon } from './siphon'
import { skimmer } from './skimmer'
import { stand } from './stand'
import { tank } from './tank'
import { temperatureController } from './temperature-controller'
import { testKit } from './test-kit'
import type { Attribute, Kind } from './types'
import { wavemaker } from './wavemaker'

/** Every kind of gear, in the order in which people meet them. Keys never change. */
export const kindKeys = [
  'tank',
  'stand',
  'light',
  'light-mount',
  'light-controller',
  'heater',
  'temperature-controller',
  'return-pump',
  'wavemaker',
  'skimmer',
  'auto-top-off',
  'rock',
  'sand',
  'ro-unit',
  'booster-pump',
  'salinity-meter',
  'test-kit',
  'salt-mix',
  'scraper',
  'siphon',
  'net',
  'power-strip',
] as const

export type KindKey = (typeof kindKeys)[number]

export const kinds: Readonly<Record<KindKey, Kind>> = {
  tank,
  stand,
  light,
  'light-mount': lightMount,
  'light-controller': lightController,
  heater,
  'temperature-controller': temperatureController,
  'return-pump': returnPump,
  wavemaker,
  skimmer,
  'auto-top-off': autoTopOff,
  rock,
  sand,
  'ro-unit': roUnit,
  'booster-pump': boosterPump,
  'salinity-meter': salinityMeter,
  'test-kit': testKit,
  'salt-mix': saltMix,
  scraper,
  siphon,
  net,
  'power-strip': powerStrip,
}

export function isKindKey(text: string): text is KindKey {
  return Object.hasOwn(kinds, text)
}

export function getKind(key: KindKey): Kind {
  return kinds[key]
}

/** The attribute with that key, or undefined where the kind has none. */
export function getAttribute(kind: KindKey, key: string): Attribute | undefined {
  return kinds[kind].attributes.find((attribute) => attribute.key === key)
}
