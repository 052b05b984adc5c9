import { useMemo } from 'react'
import { labelSetupPath, printSetupValue } from '#shared/engine/assumptions'
import { resolve } from '#shared/engine/setup/resolve'
import { usePrinter } from '../../../lib/use-printer'

/** Asked of the engine itself: a tank of which only the volume is known, so that everything else is assumed. */
const exampleVolumeL = 75.7

/** What a setup is taken to be where nobody said otherwise. */
export function DefaultTable() {
  const printer = usePrinter()
  const plan = useMemo(() => resolve({ units: 'metric', tank: { specs: {}, volumeL: exampleVolumeL }, items: [] }), [])
  return (
    <>
      <p className="mt-2 max-w-prose">
        For a tank of which only its volume is known, {printer.volume(exampleVolumeL)}. Each default that an answer uses
        is named beside it.
      </p>
      <dl className="mt-4 grid gap-x-10 sm:grid-cols-2 lg:grid-cols-3">
        {[...plan.assumed].map(([path, value]) => (
          <div key={path} className="flex justify-between gap-4 border-b border-rule py-1.5 text-sm">
            <dt className="first-letter:uppercase">{labelSetupPath(path, plan)}</dt>
            <dd className="text-right font-mono">{printSetupValue(path, value, printer) ?? String(value)}</dd>
          </div>
        ))}
      </dl>
    </>
  )
}
