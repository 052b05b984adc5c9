import { useState, type ReactNode } from 'react'
import type { Plan } from '#shared/engine/setup/plan'
import type { Check } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { Disclosure } from '../ui/disclosure'
import { CheckItem } from './check-item'

export interface CheckListProps {
  readonly checks: readonly Check[]
  readonly plan: Plan
  readonly printer: Printer
  /** Where the working of a check is shown, if anywhere. */
  readonly workingHrefOf?: (checkId: string) => string | undefined
  /** Drawn above the checks once they are opened. */
  readonly drawing?: ReactNode
}

/** Every check behind a verdict, folded away; drawings and gauges are made only for who opens it. */
export function CheckList({ checks, plan, printer, workingHrefOf, drawing }: CheckListProps) {
  const [isOpen, setIsOpen] = useState(false)
  if (checks.length === 0) return null
  return (
    <Disclosure
      summary={checks.length === 1 ? 'The check' : `All ${checks.length} checks`}
      isOpen={isOpen}
      onToggle={setIsOpen}
    >
      {isOpen && drawing}
      <ul>
        {checks.map((check) => (
          <CheckItem
            key={check.id}
            check={check}
            plan={plan}
            printer={printer}
            hasGauge={isOpen}
            workingHref={workingHrefOf?.(check.id)}
          />
        ))}
      </ul>
    </Disclosure>
  )
}
