import type { Rule } from '#shared/engine/rule'
import { getAttribute, type KindKey } from '#shared/kinds/index'
import { BasisNote } from './basis-note'

export interface RuleTableProps {
  readonly kind: KindKey
  readonly rules: readonly Rule[]
}

const worstWords = { fail: 'does not fit', change: 'fits with changes' } as const

/** The checks of one kind: the rule in words, the worst it can say, its basis and what it reads. */
export function RuleTable({ kind, rules }: RuleTableProps) {
  return (
    <ul>
      {rules.map((rule) => (
        <li
          key={rule.id}
          id={rule.id}
          className="grid gap-x-8 gap-y-1 border-t border-rule py-3 md:grid-cols-[12rem_minmax(0,1fr)]"
        >
          <div>
            <h4 className="font-semibold">{rule.label}</h4>
            <p className="font-mono text-xs break-all text-ink-soft">{rule.id}</p>
          </div>
          <div className="max-w-prose text-sm">
            <p className="text-base">{rule.rule}</p>
            <p className="mt-1 text-ink-soft">
              At worst: {worstWords[rule.worst]}. Basis: <BasisNote basis={rule.basis} />.
            </p>
            <p className="text-ink-soft">
              Reads {rule.reads.map((key) => getAttribute(kind, key)?.label ?? key).join(', ') || 'the setup alone'}.
            </p>
          </div>
        </li>
      ))}
    </ul>
  )
}
