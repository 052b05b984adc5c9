import type { ReactNode } from 'react'
import { Form, Link } from 'react-router-dom'
import { SuggestInput } from '../../../components/suggest/suggest-input'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'

export interface QuestionBoxProps {
  readonly asked?: string
  readonly example: string
  readonly label?: string
  readonly button?: string
  /** Hidden fields that go along. */
  readonly children?: ReactNode
}

/** A question in the person's own words; a plain form, so that it works before and without scripts. */
export function QuestionBox({
  asked = '',
  example,
  label = 'Ask in your own words',
  button = 'Answer',
  children,
}: QuestionBoxProps) {
  return (
    <Form action={paths.find} method="get" preventScrollReset role="search">
      {children}
      <label htmlFor="question" className="block text-sm font-semibold">
        {label}
      </label>
      <div className="mt-1 flex flex-wrap items-end gap-3 border-b-2 border-ink pb-2 focus-within:border-action">
        <SuggestInput
          id="question"
          name="q"
          key={asked}
          scope={{ page: 'question', kind: null }}
          defaultValue={asked}
          maxLength={400}
          enterKeyHint="search"
          aria-describedby={asked === '' ? 'question-example' : undefined}
          className="block min-h-11 w-full bg-transparent text-base outline-none md:text-lg"
        />
        <Button type="submit" variant="primary">
          {button}
        </Button>
      </div>
      {asked === '' && (
        <p id="question-example" className="mt-1 text-sm text-ink-soft">
          Such as{' '}
          <Link to={`${paths.find}?${new URLSearchParams({ q: example }).toString()}`} className="link">
            {example}
          </Link>
        </p>
      )}
    </Form>
  )
}
