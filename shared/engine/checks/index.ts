import { getKind, kindKeys, type KindKey } from '../../kinds/index'
import type { KindRules, Rule } from '../rule'
import { autoTopOffRules } from './auto-top-off'
import { boosterPumpRules } from './booster-pump'
import { netRules, siphonRules } from './care'
import { createElectricRules } from './electric'
import { heaterRules } from './heater'
import { lightRules } from './light'
import { lightControllerRules } from './light-controller'
import { lightMountRules } from './light-mount'
import { createMadeForRule } from './made-for'
import { powerStripRules } from './power-strip'
import { returnPumpRules } from './return-pump'
import { roUnitRules } from './ro-unit'
import { rockRules } from './rock'
import { salinityMeterRules } from './salinity-meter'
import { saltMixRules } from './salt-mix'
import { sandRules } from './sand'
import { scraperRules } from './scraper'
import { skimmerRules } from './skimmer'
import { standRules } from './stand'
import { tankRules } from './tank'
import { temperatureControllerRules } from './temperature-controller'
import { testKitRules } from './test-kit'
import { wavemakerRules } from './wavemaker'

/** What is particular to each kind; the general rules come on top. */
const own: Readonly<Record<KindKey, KindRules>> = {
  tank: tankRules,
  stand: standRules,
  light: lightRules,
  'light-mount': lightMountRules,
  'light-controller': lightControllerRules,
  heater: heaterRules,
  'temperature-controller': temperatureControllerRules,
  'return-pump': returnPumpRules,
  wavemaker: wavemakerRules,
  skimmer: skimmerRules,
  'auto-top-off': autoTopOffRules,
  rock: rockRules,
  sand: sandRules,
  'ro-unit': roUnitRules,
  'booster-pump': boosterPumpRules,
  'salinity-meter': salinityMeterRules,
  'test-kit': testKitRules,
  'salt-mix': saltMixRules,
  scraper: scraperRules,
  siphon: siphonRules,
  net: netRules,
  'power-strip': powerStripRules,
}

/** The general rules that apply to a kind: by whether it has the attributes they read, and no stricter rule of its own. */
function createGeneralRules(kind: KindKey): readonly Rule[] {
  const has = new Set(getKind(kind).attributes.map(({ key }) => key))
  const ownIds = new Set(own[kind].rules.map(({ id }) => id))
  const passesPowerOn = kind === 'power-strip' || kind === 'temperature-controller'
  const electric = getKind(kind).electric ? createElectricRules(kind) : []
  return [...electric, createMadeForRule(kind)].filter(
    ({ id, reads }) =>
      reads.some((key) => has.has(key)) &&
      !ownIds.has(id) &&
      !(passesPowerOn && id.endsWith('.load')) &&
      !(kind === 'power-strip' && id.endsWith('.plugs')),
  )
}

function assemble(kind: KindKey): KindRules {
  const general = createGeneralRules(kind)
  return { ...own[kind], rules: [...own[kind].rules, ...general] }
}

const all = Object.fromEntries(kindKeys.map((kind) => [kind, assemble(kind)])) as Readonly<Record<KindKey, KindRules>>

export const getRules = (kind: KindKey): KindRules => all[kind]

/** Every rule of every kind, for the method page and for the published kinds. */
export const listRules = (): readonly Rule[] => kindKeys.flatMap((kind) => all[kind].rules)
