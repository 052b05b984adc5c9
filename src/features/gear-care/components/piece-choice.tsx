import { useState } from 'react'
import { useQuery } from '@tanstack/react-query'
import { Button } from '../../../components/ui/button'
import { TextField } from '../../../components/ui/text-field'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { foundPiecesQuery } from '../api/find-pieces'

export interface PieceChoiceProps {
  readonly kind: string
  /** The piece itself, which is no choice. */
  readonly slug: string
  readonly chosen: string | null
  readonly onChoose: (slug: string) => void
}

/** Looks for another piece of the same kind by its name. */
export function PieceChoice({ kind, slug, chosen, onChoose }: PieceChoiceProps) {
  const { api } = useApp()
  const [text, setText] = useState('')
  const [asked, setAsked] = useState('')
  const { data, error } = useQuery(foundPiecesQuery(api, kind, asked))
  const found = data?.items.filter((item) => item.slug !== slug)
  return (
    <>
      <form
        role="search"
        className="flex flex-wrap items-end gap-2"
        onSubmit={(event) => {
          event.preventDefault()
          setAsked(text.trim())
        }}
      >
        <div className="min-w-0 grow">
          <TextField
            id="merge-search"
            label="Which piece stays?"
            hint="Its brand or model."
            type="search"
            maxLength={200}
            value={text}
            onChange={setText}
          />
        </div>
        <Button type="submit">Search</Button>
      </form>
      <p role="status" className="mt-2 text-sm">
        {error
          ? toApiError(error).message
          : found && asked !== ''
            ? found.length === 0
              ? `No other piece of this kind is called “${asked}”.`
              : `${found.length} found.`
            : ''}
      </p>
      {found && found.length > 0 && (
        <fieldset className="mt-1">
          <legend className="sr-only">The piece that stays</legend>
          {found.map((item) => (
            <label key={item.slug} className="flex min-h-11 items-center gap-2 border-b border-rule">
              <input
                type="radio"
                name="merge-into"
                value={item.slug}
                checked={chosen === item.slug}
                onChange={() => onChoose(item.slug)}
                className="size-5 accent-action"
              />
              <span className="min-w-0">
                {item.brand} · {item.model}{' '}
                <span className="text-sm text-ink-soft">
                  {item.gtin !== null && <>GTIN {item.gtin}, </>}revision {item.revision}
                </span>
              </span>
            </label>
          ))}
        </fieldset>
      )}
    </>
  )
}
