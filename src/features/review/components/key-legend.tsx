import { Button } from '../../../components/ui/button'
import { useKeysChoice } from '../hooks/use-keys-choice'
import type { Shortcut } from '../hooks/use-shortcuts'

export interface KeyLegendProps {
  readonly shortcuts: readonly Pick<Shortcut, 'key' | 'label'>[]
}

/** The keys of a page, and the switch that turns them off. No use on a phone. */
export function KeyLegend({ shortcuts }: KeyLegendProps) {
  const [isOn, choose] = useKeysChoice()
  return (
    <div className="hidden flex-wrap items-center gap-x-4 gap-y-1 text-sm text-ink-soft sm:flex print:hidden">
      {isOn && (
        <dl className="flex flex-wrap gap-x-4 gap-y-1" aria-label="Keys">
          {shortcuts.map(({ key, label }) => (
            <div key={key} className="flex items-center gap-1.5">
              <dt>
                <kbd className="rounded-ui border border-ink-soft bg-sheet px-1.5 font-mono text-xs text-ink">
                  {key}
                </kbd>
              </dt>
              <dd>{label}</dd>
            </div>
          ))}
        </dl>
      )}
      <Button variant="quiet" size="sm" className="-ml-3" onClick={() => choose(!isOn)}>
        {isOn ? 'Turn the keys off' : 'Turn the keys on'}
      </Button>
    </div>
  )
}
