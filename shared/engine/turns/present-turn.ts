import type { Printer } from '../../units/print'
import { units } from '../../units/units'
import type { Turn, Verdict } from '../types'
import type { FoundTurn } from './find-turn'

/** "It would fit if the rear chamber were 12 mm longer." */
export function presentTurn({ knob, to, verdict }: FoundTurn, was: Verdict, words: Printer): Turn {
  const how = was === 'changes' ? ' as it is' : verdict === 'changes' ? ' with changes' : ''
  return {
    path: knob.path,
    from: knob.from,
    to,
    unit: units[knob.attribute.unit].ucum,
    verdict,
    message: `It would fit${how} if ${knob.say(to, words)}.`,
  }
}
