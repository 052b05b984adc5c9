import { getAttribute, getKind } from '../../kinds/index'
import { findSetupField } from '../../kinds/setup-fields'
import type { MeasureAttribute } from '../../kinds/types'
import { units } from '../../units/units'
import type { Printer } from '../../units/print'
import type { Judged } from '../judge'
import type { Candidate, Rule } from '../rule'
import type { Scene } from '../scene'
import { findSaidNumber } from '../setup/find-said'
import { giveValue } from '../setup/give'
import type { Plan } from '../setup/plan'
import type { Item, Setup } from '../types'
import { readNumber } from '../values'
import { changeables, type Changeable } from './changeable'

/** One number of the setup that could be another. */
export interface Knob {
  /** As in links and requests: `tank.chambers.0.lengthMm`, `items.stand.specs.loadRatingKg`. */
  readonly path: string
  readonly attribute: MeasureAttribute
  readonly from: number
  /** Between what it may be said to be. */
  readonly range: readonly [number, number]
  readonly only?: 'more' | 'less'
  readonly isRelative: boolean
  readonly give: (setup: Setup, value: number) => Setup
  /** What would have to hold, to stand after "It would fit if". */
  readonly say: (to: number, words: Printer) => string
}

const expandPath = (path: string, { tank }: Plan): readonly string[] =>
  path.includes('*') ? tank.chambers.map((_, index) => path.replace('*', String(index))) : [path]

/** An opening is never assumed, so that no rule has to name it beside the chamber's own sizes. */
const isUsed = ({ uses }: Rule, { path }: Changeable): boolean =>
  uses.includes(path) || (path.includes('.opening') && uses.includes('tank.chambers.*.widthMm'))

const measuresLength = ({ unit }: Rule): boolean => unit !== null && units[unit].quantity === 'length'

/** Whether somebody would change this to keep that check: nobody builds another tank to need a weaker heater. */
const isSensible = (rule: Rule, { isBuilt }: Changeable): boolean => !isBuilt || measuresLength(rule)

/** What carries the tank is a limit by itself; no rule has to assume it. */
const isLimit = ({ judgement: { limit } }: Judged, value: number | undefined): boolean =>
  value !== undefined && limit === value

function listSetupKnobs({ plan }: Scene, failing: readonly Judged[], candidate: Candidate): readonly Knob[] {
  return changeables.flatMap((changeable): readonly Knob[] => {
    const isOfTank = changeable.path.startsWith('tank.')
    // The tank that is there makes room for the one that is judged.
    if (isOfTank && candidate.piece.kind === 'tank') return []
    if (!failing.every(({ rule }) => isSensible(rule, changeable))) return []
    return expandPath(changeable.path, plan).flatMap((path): readonly Knob[] => {
      const from = findSaidNumber(plan, path)
      const attribute = findSetupField(path)?.attribute
      if (from === undefined || attribute?.type !== 'measure') return []
      const isOfSupport = path.startsWith('support.')
      if (!failing.every((one) => (isOfSupport ? isLimit(one, from) : isUsed(one.rule, changeable)))) return []
      const knob: Knob = {
        path,
        attribute,
        from,
        range: changeable.isLivedIn ? attribute.usual : attribute.plausible,
        isRelative: changeable.isRelative === true,
        give: (setup, value) => giveValue(setup, path, value),
        say: (to, words) => changeable.say({ path, from, to, plan }, words),
        ...(changeable.only && { only: changeable.only }),
      }
      return [knob]
    })
  })
}

const giveSpec = (setup: Setup, id: string, key: string, value: number): Setup => ({
  ...setup,
  items: setup.items.map((item) => {
    const was = item.piece.specs[key]
    if (item.id !== id || !was) return item
    return { ...item, piece: { ...item.piece, specs: { ...item.piece.specs, [key]: { ...was, value } } } }
  }),
})

/** What a piece measures and weighs is the piece itself: saying it otherwise names nothing to look for. */
const isOfBody = ({ key, unit }: MeasureAttribute): boolean => units[unit].quantity === 'length' || key === 'massKg'

/** A number of another piece that is the very limit which is broken: the stand's rating, the pressure the RO/DI unit needs. */
function listItemKnobs({ others }: Scene, failing: readonly Judged[]): readonly Knob[] {
  return others.flatMap((item: Item) =>
    getKind(item.piece.kind).attributes.flatMap((own): readonly Knob[] => {
      const attribute = getAttribute(item.piece.kind, own.key)
      const from = readNumber(item.piece.specs, own.key)
      if (attribute?.type !== 'measure' || attribute.role !== 'check' || from === undefined) return []
      if (isOfBody(attribute)) return []
      if (!failing.every((one) => one.rule.unit === attribute.unit && isLimit(one, from))) return []
      const name = `the ${getKind(item.piece.kind).label}’s ${attribute.label}`
      return [
        {
          path: `items.${item.id}.specs.${own.key}`,
          attribute,
          from,
          range: attribute.plausible,
          isRelative: false,
          give: (setup, value) => giveSpec(setup, item.id, own.key, value),
          say: (to, words) => `${name} were at ${to > from ? 'least' : 'most'} ${words.measure(to, attribute.unit)}`,
        },
      ]
    }),
  )
}

/** Everything that by itself could turn all the checks that are not kept. */
export const listKnobs = (scene: Scene, failing: readonly Judged[], candidate: Candidate): readonly Knob[] => [
  ...listSetupKnobs(scene, failing, candidate),
  ...listItemKnobs(scene, failing),
]
