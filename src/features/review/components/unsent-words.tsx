import type { Proposal } from '#shared/schemas/proposals'
import { Button } from '../../../components/ui/button'
import { TextareaField } from '../../../components/ui/textarea-field'
import { useMessage } from '../api/use-message'
import type { KeptDraft } from '../hooks/use-kept-draft'
import { nameKey } from '../model/list-fields'

export interface UnsentWordsProps {
  readonly proposal: Pick<Proposal, 'id' | 'kind' | 'can'>
  readonly kept: KeptDraft
  readonly onSaid: (message: string) => void
}

/** What somebody had typed for a decision that another one took: to be used otherwise, or thrown away. */
export function UnsentWords({ proposal: { id, kind, can }, kept, onSaid }: UnsentWordsProps) {
  const { mutate, isPending, isError } = useMessage(id)
  const { draft, change, drop } = kept
  const said = Object.entries(draft.fields).filter(([, { words }]) => words.trim() !== '')
  const all = [draft.words, ...said.map(([key, { words }]) => `${nameKey(kind, key)}: ${words}`)]
  const text = all.filter((words) => words.trim() !== '').join('\n')
  if (text === '') return null
  const send = () =>
    mutate(text, {
      onSuccess: () => {
        drop()
        onSaid('Your words were sent.')
      },
    })
  return (
    <div className="mt-4">
      <TextareaField
        id="unsent-words"
        label="Your words, not sent"
        rows={4}
        value={text}
        error={isError ? 'They could not be sent just now. Try again.' : undefined}
        onChange={(words) => change({ words, fields: {} })}
      />
      <p className="mt-2 flex flex-wrap gap-2">
        {can.say && (
          <Button isBusy={isPending} onClick={send}>
            Say it in the talk
          </Button>
        )}
        <Button variant="quiet" onClick={drop}>
          Throw them away
        </Button>
      </p>
    </div>
  )
}
