import { Button } from '../../../components/ui/button'
import { TextField } from '../../../components/ui/text-field'
import { limits } from '#shared/limits'
import type { PlacedDoubt } from '../model/doubts'

export interface DoubtActions {
  readonly onTake: (doubt: PlacedDoubt, value: number) => void
  readonly onReason: (doubt: PlacedDoubt, reason: string) => void
  readonly reasonOf: (doubt: PlacedDoubt) => string | undefined
}

export interface DoubtNoteProps {
  readonly doubt: PlacedDoubt
  readonly actions: DoubtActions
}

/** A question about a number, that blocks nothing: take what was probably meant, or say why it is right. */
export function DoubtNote({ doubt, actions }: DoubtNoteProps) {
  const reason = actions.reasonOf(doubt)
  const reasonId = `why-${doubt.id.replaceAll(/[^\w-]/g, '-')}`
  return (
    <div
      role="group"
      aria-label="A question about this number"
      className="mt-3 border-l-[5px] border-changes bg-sheet px-4 py-3"
    >
      <p>
        <strong className="font-semibold">Is this right?</strong> {doubt.detail}
      </p>
      <div className="mt-2 flex flex-wrap gap-2">
        {doubt.suggestions.map(({ value, printed, because }) => (
          <Button
            key={value}
            size="sm"
            className="text-left whitespace-normal!"
            onClick={() => actions.onTake(doubt, value)}
          >
            Take {printed} ({because})
          </Button>
        ))}
        {reason === undefined && (
          <Button size="sm" onClick={() => actions.onReason(doubt, '')}>
            It is right
          </Button>
        )}
      </div>
      {reason !== undefined && (
        <div className="mt-3 max-w-xl">
          <TextField
            id={reasonId}
            label="Why it is right"
            hint="A moderator reads it beside the number. You can send it without."
            maxLength={limits.reason}
            autoFocus={reason === ''}
            value={reason}
            onChange={(text) => actions.onReason(doubt, text)}
          />
        </div>
      )}
    </div>
  )
}
