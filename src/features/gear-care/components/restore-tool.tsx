import { useState } from 'react'
import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate } from 'react-router-dom'
import { limits } from '#shared/limits'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { useSignedIn } from '../../../lib/session'
import { careQuery } from '../api/get-care'
import { useCareAction } from '../api/use-care-action'
import { WordsForm } from './words-form'

export interface RestoreToolProps {
  readonly slug: string
  /** An earlier revision that the page shows, to begin with. */
  readonly shown: number
}

/** Makes an earlier state of a piece the present one again: for those who may, as one more revision. */
export function RestoreTool({ slug, shown }: RestoreToolProps) {
  const { api } = useApp()
  const navigate = useNavigate()
  const isModerator = useSignedIn()?.can.review === true
  const { data: care } = useQuery({ ...careQuery(api, slug), enabled: isModerator })
  const { mutate, isPending, error } = useCareAction(slug)
  const [chosen, setChosen] = useState<number | null>(null)
  if (!care?.can.restore || care.revision < 2) return null
  const newest = care.revision
  const revision = chosen ?? (shown > 0 && shown < newest ? shown : newest - 1)
  const earlier = Array.from({ length: newest - 1 }, (_, at) => newest - 1 - at)
  const restore = (words: string) =>
    mutate(
      { action: 'restore', revision, words, seen: newest },
      { onSuccess: () => void navigate(`${paths.gearHistory(slug)}?before=${newest}&after=${newest + 1}`) },
    )
  return (
    <section className="mt-10 border-t-[1.5px] border-ink pt-4 print:hidden" aria-labelledby="restore">
      <h2 id="restore">Go back to an earlier state</h2>
      <p className="mt-1 max-w-prose text-ink-soft">
        It becomes revision {newest + 1}, equal to the one you choose. Nothing in between is lost.{' '}
        <Link to={`${paths.gearHistory(slug)}?before=${revision}&after=${newest}`} className="link">
          See what would change back
        </Link>
      </p>
      <div className="mt-3">
        <WordsForm
          id="restore-words"
          label="Why?"
          hint="Stands as the summary of the new revision."
          action={`Make revision ${revision} the present state`}
          maxLength={limits.summary}
          isBusy={isPending}
          failure={error}
          onSend={restore}
        >
          <SelectField
            id="restore-revision"
            label="State to go back to"
            options={earlier.map((number) => ({ value: String(number), label: `revision ${number}` }))}
            value={String(revision)}
            onChange={(value) => setChosen(Number(value))}
          />
        </WordsForm>
      </div>
    </section>
  )
}
