import type { ReactNode } from 'react'

export interface PreferenceOption<V extends string> {
  readonly value: V
  /** What the button shows; an icon needs `name`. */
  readonly label: ReactNode
  /** Read out. */
  readonly name: string
}

export interface PreferenceSwitchProps<V extends string> {
  /** Query name at `/preferences`, and of the cookie it sets. */
  readonly preference: 'units' | 'theme'
  readonly legend: string
  readonly options: readonly PreferenceOption<V>[]
  readonly value: V
  /** Where the form returns to: path and query of this page. */
  readonly next: string
  /** With scripts: called instead of sending the form. */
  readonly onChange?: (value: V) => void
}

/** A row of choices that is a plain form without scripts. */
export function PreferenceSwitch<V extends string>(props: PreferenceSwitchProps<V>) {
  const { preference, legend, options, value, next, onChange } = props
  return (
    <form method="get" action="/preferences" className="flex">
      <fieldset className="flex rounded-ui border border-ink-soft">
        <legend className="sr-only">{legend}</legend>
        <input type="hidden" name="next" value={next} />
        {options.map((option) => (
          <button
            key={option.value}
            name={preference}
            value={option.value}
            aria-pressed={option.value === value}
            aria-label={option.name}
            title={option.name}
            onClick={
              onChange &&
              ((event) => {
                event.preventDefault()
                onChange(option.value)
              })
            }
            className="flex min-h-8 min-w-8 items-center justify-center px-2 font-mono text-xs hover:text-action aria-pressed:bg-ink aria-pressed:font-semibold aria-pressed:text-paper sm:px-2.5"
          >
            {option.label}
          </button>
        ))}
      </fieldset>
    </form>
  )
}
