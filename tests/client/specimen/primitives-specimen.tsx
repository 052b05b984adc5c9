import { useState } from 'react'
import type { Printer } from '#shared/units/print'
import { Button } from '../../../src/components/ui/button'
import { CautionBox } from '../../../src/components/ui/caution-box'
import { Disclosure } from '../../../src/components/ui/disclosure'
import { EmptyState } from '../../../src/components/ui/empty-state'
import { ErrorState } from '../../../src/components/ui/error-state'
import { ErrorSummary } from '../../../src/components/ui/error-summary'
import { LoadingBlock } from '../../../src/components/ui/loading-block'
import { MeasureField } from '../../../src/components/ui/measure-field'
import { SelectField } from '../../../src/components/ui/select-field'
import { Skeleton } from '../../../src/components/ui/skeleton'
import { TextField } from '../../../src/components/ui/text-field'
import { VerdictBadge } from '../../../src/components/ui/verdict-badge'
import { VerdictIcon } from '../../../src/components/ui/verdict-icon'

const verdicts = ['fits', 'changes', 'no', 'unknown'] as const

export function PrimitivesSpecimen({ printer }: { readonly printer: Printer }) {
  const [raw, setRaw] = useState('4 1/2 in')
  const [errors, setErrors] = useState<readonly { fieldId: string; message: string }[]>([])
  const fail = () => setErrors([{ fieldId: 'depth', message: 'Give the depth as a length, such as 12 in' }])
  return (
    <div className="mt-6 grid gap-8">
      <ErrorSummary errors={errors} />
      <section className="flex flex-wrap items-center gap-4">
        {verdicts.map((verdict) => (
          <VerdictIcon key={verdict} verdict={verdict} size={36} />
        ))}
        {verdicts.map((verdict) => (
          <VerdictBadge key={verdict} verdict={verdict} />
        ))}
        <VerdictBadge verdict="fits" label={`${printer.length(35)} to spare`} />
      </section>
      <section className="flex flex-wrap items-center gap-3">
        <Button variant="primary" onClick={fail}>
          Answer
        </Button>
        <Button>Print a measuring sheet</Button>
        <Button variant="quiet">Start again</Button>
        <Button size="sm">Show 14 more</Button>
        <Button variant="primary" isBusy>
          Answering
        </Button>
        <Button disabled>Not now</Button>
      </section>
      <section className="grid gap-5 sm:grid-cols-2 lg:grid-cols-3">
        <TextField id="question" name="q" label="Question" hint="As you would ask it at a counter" defaultValue="" />
        <MeasureField
          id="length"
          name="length"
          label="Chamber length"
          value={raw}
          onChange={setRaw}
          echo={raw === '' ? `assumed ${printer.length(100)}` : `read as ${printer.length(114.3)}`}
        />
        <MeasureField
          id="depth"
          name="depth"
          label="Water depth"
          defaultValue="20 gal"
          error="Give the depth as a length, such as 12 in"
        />
        <SelectField
          id="material"
          label="Walls"
          emptyLabel="Not sure"
          options={[
            { value: 'glass', label: 'Glass' },
            { value: 'acrylic', label: 'Acrylic' },
          ]}
        />
      </section>
      <p className="max-w-prose">
        We read <span className="given measure">{printer.size([100, 127, 305])}</span> and assumed{' '}
        <span className="assumed measure">{printer.temperature(25.5)}</span>.{' '}
        <a href="#length" className="link">
          Print a measuring sheet
        </a>
        .
      </p>
      <section>
        <Disclosure summary="14 too long or too thick for the chamber">They would stand out of the water.</Disclosure>
        <Disclosure summary="9 too weak for the coldest room" isOpen>
          They would not hold the goal on the coldest night.
        </Disclosure>
      </section>
      <CautionBox title="Mains and salt water.">
        Use a ground-fault protected outlet and drip loops, and let a licensed electrician decide where local codes ask
        for one.
      </CautionBox>
      <section className="grid gap-5 md:grid-cols-3">
        <EmptyState title="Nothing asked yet" action={<Button variant="primary">Describe the tank</Button>}>
          Give a volume or the outside size, and the answers appear here.
        </EmptyState>
        <ErrorState title="The answers could not be fetched" onRetry={() => undefined} requestId="01J8">
          Your setup is still in the address of this page. Wait a moment and try again.
        </ErrorState>
        <LoadingBlock label="Loading answers">
          <div className="space-y-3">
            <Skeleton className="h-6 w-40" />
            <Skeleton />
            <Skeleton className="h-5 w-3/4" />
          </div>
        </LoadingBlock>
      </section>
    </div>
  )
}
