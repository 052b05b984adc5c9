import { useState } from 'react'
import { limits } from '#shared/limits'
import type { GearCare } from '#shared/schemas/review'
import { Dialog } from '../../../components/ui/dialog'
import { useCareAction } from '../api/use-care-action'
import { MergePreview } from './merge-preview'
import { PieceChoice } from './piece-choice'
import { WordsForm } from './words-form'

export interface MergeDialogProps {
  readonly care: GearCare
  readonly onClose: () => void
  readonly onMerged: () => void
}

/** Two entries of one piece become one: which stays, what that does, and why. */
export function MergeDialog({ care: { slug, kind, brand, model }, onClose, onMerged }: MergeDialogProps) {
  const [into, setInto] = useState<string | null>(null)
  const { mutate, isPending, error } = useCareAction(slug)
  const merge = (words: string) => {
    if (into === null) return
    mutate({ action: 'merge', into, words }, { onSuccess: onMerged })
  }
  return (
    <Dialog title={`Merge ${brand} · ${model} into another piece`} onClose={onClose}>
      <div className="grid gap-5">
        <div>
          <PieceChoice kind={kind} slug={slug} chosen={into} onChoose={setInto} />
        </div>
        {into !== null && (
          <>
            <MergePreview from={slug} into={into} />
            <WordsForm
              id="merge-words"
              label="Why are they the same piece?"
              action="Merge them"
              maxLength={limits.words}
              isBusy={isPending}
              failure={error}
              onSend={merge}
            />
          </>
        )}
      </div>
    </Dialog>
  )
}
