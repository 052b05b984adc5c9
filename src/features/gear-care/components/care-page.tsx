import { useState } from 'react'
import { useSuspenseQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { limits } from '#shared/limits'
import type { GearCare } from '#shared/schemas/review'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { careQuery } from '../api/get-care'
import { useCareAction } from '../api/use-care-action'
import { hasCare } from '../has-care'
import { MergeDialog } from './merge-dialog'
import { WordsForm } from './words-form'

type Act = 'retire' | 'unretire' | 'unmerge'

const acts = [
  {
    act: 'retire',
    title: 'Retire it',
    text: 'Its address says that it was retired, and lists, search and answers leave it out. Its history is kept, and it can be brought back.',
    label: 'Why does it leave the record?',
    button: 'Retire this entry',
    done: 'The entry was retired.',
  },
  {
    act: 'unretire',
    title: 'Bring it back',
    text: 'It is shown again as it was when it was retired.',
    label: 'Why does it come back?',
    button: 'Bring it back',
    done: 'The entry is back.',
  },
  {
    act: 'unmerge',
    title: 'Undo the merging',
    text: 'It has an entry and an address of its own again, as it was before.',
    label: 'Why are they two pieces after all?',
    button: 'Undo the merging',
    done: 'They are two entries again.',
  },
] as const satisfies readonly { readonly act: Act; readonly [key: string]: string }[]

function Standing({ care: { state, mergedInto, retiredReason, slug, revision } }: { readonly care: GearCare }) {
  if (state === 'merged' && mergedInto !== null)
    return (
      <p className="mt-2">
        Merged: its address leads to{' '}
        <Link to={paths.gear(mergedInto)} className="link">
          {mergedInto}
        </Link>
        .
      </p>
    )
  if (state === 'retired')
    return <p className="mt-2 max-w-prose">Retired{retiredReason !== null && <>: {retiredReason}</>}</p>
  return (
    <p className="mt-2">
      In the record, at revision {revision}.{' '}
      <Link to={paths.gearHistory(slug)} className="link">
        Go back to an earlier state
      </Link>
    </p>
  )
}

/** What a moderator may do with an entry as a whole. */
export function CarePage({ slug }: { readonly slug: string }) {
  const { api } = useApp()
  const { data: care } = useSuspenseQuery(careQuery(api, slug))
  const { mutate, isPending, error, variables, reset } = useCareAction(slug)
  const [isMerging, setMerging] = useState(false)
  const [message, setMessage] = useState('')
  const { brand, model, can } = care
  return (
    <>
      <p className="text-sm text-ink-soft">
        <Link to={paths.gear(slug)} className="link">
          {brand} · {model}
        </Link>
      </p>
      <h1 className="mt-1">Look after this entry</h1>
      <Standing care={care} />
      <p role="status" className={message === '' ? 'sr-only' : 'mt-3 border-l-[5px] border-fits bg-sheet px-4 py-3'}>
        {message}
      </p>
      {!hasCare(care) && <p className="mt-4">There is nothing that you can do with it here.</p>}
      {can.merge && (
        <section className="mt-8 border-t-[1.5px] border-ink pt-4">
          <h2>Merge it into another entry</h2>
          <p className="mt-1 mb-3 max-w-prose text-ink-soft">
            For two entries of one and the same piece: this one’s address leads to the other one from then on.
          </p>
          <Button onClick={() => setMerging(true)}>Choose the entry that stays</Button>
        </section>
      )}
      {acts
        .filter(({ act }) => can[act])
        .map(({ act, title, text, label, button, done }) => (
          <section key={act} className="mt-8 border-t-[1.5px] border-ink pt-4">
            <h2>{title}</h2>
            <p className="mt-1 mb-3 max-w-prose text-ink-soft">{text}</p>
            <WordsForm
              id={`${act}-words`}
              label={label}
              action={button}
              maxLength={limits.words}
              isBusy={isPending}
              failure={variables?.action === act ? error : null}
              onSend={(words) => {
                reset()
                mutate({ action: act, words }, { onSuccess: () => setMessage(done) })
              }}
            />
          </section>
        ))}
      {isMerging && (
        <MergeDialog
          care={care}
          onClose={() => setMerging(false)}
          onMerged={() => {
            setMerging(false)
            setMessage('Merged: the address leads to the other entry now.')
          }}
        />
      )}
    </>
  )
}
