import { useEffect } from 'react'
import { useLocation } from 'react-router-dom'
import { getAttribute } from '#shared/kinds/index'
import { useApp } from '../../../lib/app-context'
import { printMoment } from '../../../lib/print-moment'
import { fetchProposal, type SavedProposal } from '../api/save-proposal'
import { dropDraft } from '../model/drafts'
import { typeSuggestion, type PlacedDoubt } from '../model/doubts'
import { summarise } from '../model/form-errors'
import { layOver } from '../model/touched'
import type { FormBase, TypedFile, TypedForm } from '../model/typed-form'
import type { Mapping } from '../paste/read-pasted'
import { useKeptDraft } from './use-kept-draft'
import { useProposeForm } from './use-propose-form'
import { useSend } from './use-send'
import { useUploads } from './use-uploads'

export interface ProposePageOptions {
  /** What a draft of this form is kept under. */
  readonly place: string
  readonly base: FormBase
  readonly typed: TypedForm
  readonly saved: SavedProposal | null
}

/** The address may name a field: it takes focus, as somebody came to correct it. */
function useNamedField(): void {
  const { hash } = useLocation()
  useEffect(() => {
    const field = hash.length > 1 ? document.getElementById(decodeURIComponent(hash.slice(1))) : null
    field?.scrollIntoView({ block: 'center' })
    field?.focus({ preventScroll: true })
  }, [hash])
}

/** All that the propose form does, put together. */
export function useProposePage({ place, base, typed, saved }: ProposePageOptions) {
  const { api } = useApp()
  const propose = useProposeForm({ base, typed })
  const { form, printer } = propose
  const { setValue, getValues } = form
  const send = useSend(propose, saved, () => dropDraft(place))
  const draft = useKeptDraft({
    place,
    base: propose.base,
    typed: propose.typed,
    system: propose.system,
    proposalId: send.saved?.proposal.id ?? null,
    isOver: send.isSent,
    onRestore: (found) => {
      propose.fill(layOver(propose.base, found.typed))
      if (found.proposalId === null || send.saved) return
      // The draft on the server may be gone by now; then the next save makes a new one.
      void fetchProposal(api, found.proposalId).then(
        (known) => {
          if (known.proposal.can.amend) send.keepMine(known)
        },
        () => undefined,
      )
    },
  })
  const uploads = useUploads({
    findProposalId: send.findProposalId,
    onTaken: (file) => setValue('files', [...getValues('files'), file]),
  })
  useNamedField()

  const actions = {
    onTake: (doubt: PlacedDoubt, value: number) => {
      const text = typeSuggestion(base.kind, doubt, value, printer)
      setValue(doubt.place as never, text as never, { shouldValidate: false })
    },
    onReason: (doubt: PlacedDoubt, reason: string) =>
      setValue('reasons', { ...getValues('reasons'), [doubt.id]: reason }),
    reasonOf: (doubt: PlacedDoubt) => propose.typed.reasons[doubt.id],
    throwAway: () => {
      draft.drop()
      propose.startOver()
    },
  }

  const takeMapped = (mapped: readonly Mapping[]) => {
    for (const { key, text } of mapped) {
      if (getAttribute(base.kind, key)) setValue(`specs.${key}.text`, text)
      else setValue(`identity.${key as keyof TypedForm['identity']}`, text)
    }
  }

  const removeFile = (file: TypedFile) => {
    setValue(
      'files',
      getValues('files').filter(({ id }) => id !== file.id),
    )
    // What is not named by the proposal any more is swept away in time even where this does not arrive.
    void api.delete(`/evidence/${encodeURIComponent(file.id)}`).catch(() => undefined)
  }

  const kept = send.isSaved
    ? 'Kept in this browser and among your drafts.'
    : draft.keptAt === null
      ? ''
      : `Kept in this browser, ${printMoment(draft.keptAt)}.`
  return {
    propose,
    send,
    draft,
    uploads,
    actions,
    takeMapped,
    removeFile,
    kept,
    summary: summarise(base.kind, send.told),
  }
}
