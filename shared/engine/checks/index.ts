import { getKind, kindKeys, type KindKey } from '../../kinds/index'
import type { KindRules, Rule } from '../rule'
import { createElectricRules } from './electric'
import { heaterRules } from './heater'
import { lightRules } from './light'
import { lightControllerRules } from './light-controller'
import { lightMountRules } from './light-mount'
import { createMadeForRule } from './made-for'
import { powerStripRules } from './power-strip'
import { returnPumpRules } from './return-pump'
import { standRules } from './stand'
import { tankRules } from './tank'
import { temperatureControllerRules } from './temperature-controller'
import { wavemakerRules } from './wavemaker'

/** Kinds with rules of their own. The others answer through the general rules, and say so. */
const own: Partial<Record<KindKey, KindRules>> = {
  tank: tankRules,
  stand: standRules,
  light: lightRules,
  'light-mount': lightMountRules,
  'light-controller': lightControllerRules,
  heater: heaterRules,
  'temperature-controller': temperatureControllerRules,
  'return-pump': returnPumpRules,
  wavemaker: wavemakerRules,
  'power-strip': powerStripRules,
}

/** The general rules that apply to a kind: by whether it has the attributes they read, and no stricter rule of its own. */
function createGeneralRules(kind: KindKey): readonly Rule[] {
  const has = new Set(getKind(kind).attributes.map(({ key }) => key))
  const ownIds = new Set(own[kind]?.rules.map(({ id }) => id))
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
  const particular = own[kind]
  return particular ? { ...particular, rules: [...particular.rules, ...general] } : { rules: general }
}

const all = Object.fromEntries(kindKeys.map((kind) => [kind, assemble(kind)])) as Readonly<Record<KindKey, KindRules>>

export const getRules = (kind: KindKey): KindRules => all[kind]

/** Whether a kind is judged by rules of its own yet. */
export const hasOwnRules = (kind: KindKey): boolean => own[kind] !== undefined

/** Every rule of every kind, for the method page and for the published kinds. */
export const listRules = (): readonly Rule[] => kindKeys.flatMap((kind) => all[kind].rules)
