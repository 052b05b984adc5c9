import type { KindKey } from '../../kinds/index'
import type { Rule } from '../rule'
import { practiceBasis } from '../thresholds'

type Parts = Omit<Rule, 'id' | 'basis' | 'uses'> & Partial<Pick<Rule, 'basis' | 'uses'>>

/** A rule of a kind, common practice unless it names another basis, resting on nothing assumed unless it names that. */
export const createRuleMaker =
  (kind: KindKey) =>
  (check: string, parts: Parts): Rule => ({ basis: practiceBasis, uses: [], ...parts, id: `${kind}.${check}` })
