import { useController } from 'react-hook-form'
import { useLocation } from 'react-router-dom'
import { limits } from '#shared/limits'
import { ErrorSummary } from '../../../components/ui/error-summary'
import { TextField } from '../../../components/ui/text-field'
import { fieldIdOf } from '../model/form-errors'
import type { TypedForm } from '../model/typed-form'
import { useProposePage, type ProposePageOptions } from '../hooks/use-propose-page'
import { BackingAll } from './backing-all'
import { DraftLine } from './draft-line'
import { DuplicatesList } from './duplicates-list'
import { EvidenceBox } from './evidence-box'
import { HaltPanels } from './halt-panels'
import { NameFields, NotesField } from './identity-fields'
import { PasteBox } from './paste-box'
import { SendBar } from './send-bar'
import { SpecSections } from './spec-sections'

/** Everything that can be said of a piece, in whatever units, and where it is from. */
export function ProposeForm(props: ProposePageOptions) {
  const { propose, send, draft, uploads, actions, summary, takeMapped, removeFile, kept } = useProposePage(props)
  const { form, base, typed, read, printer } = propose
  const { control } = form
  const { pathname, search } = useLocation()
  const next = `${pathname}${search}`
  const summaryField = useController({ control, name: 'summary' })
  const setFiles = (files: TypedForm['files']) => form.setValue('files', files)
  const isAmending = send.saved !== null && send.saved.proposal.status !== 'draft'
  return (
    <>
      <DraftLine restored={draft.restored} revision={base.gear?.revision ?? null} onDrop={actions.throwAway} />
      <div className="mt-4">
        <ErrorSummary
          title="It is not sent yet: some answers need another look"
          errors={summary}
          attempt={send.attempt}
        />
      </div>
      <HaltPanels send={send} propose={propose} next={next} />
      <form noValidate className="mt-6" onSubmit={(event) => void send.onSubmit(event)}>
        <section aria-labelledby="name-title">
          <h2 id="name-title" className="mb-3">
            What it is called
          </h2>
          <NameFields control={control} />
          {base.gear === null && <DuplicatesList kind={base.kind} {...typed.identity} />}
        </section>
        <div className="mt-6">
          <PasteBox kind={base.kind} system={printer.system} onTake={takeMapped} />
        </div>
        <BackingAll control={control} />
        <SpecSections
          control={control}
          base={base}
          printer={printer}
          doubts={propose.doubts}
          actions={actions}
          errors={propose.errors}
        />
        <section className="mt-8 max-w-3xl" aria-label="Notes">
          <NotesField control={control} />
        </section>
        <EvidenceBox
          kind={base.kind}
          changed={Object.keys(read.values).filter((key) => read.values[key] !== null)}
          files={typed.files}
          uploads={uploads.uploads}
          onAdd={uploads.add}
          onChange={setFiles}
          onRemove={removeFile}
          blocked={
            send.person === null
              ? 'Files can be attached once you are signed in; the rest can be typed now.'
              : undefined
          }
        />
        <div className="mt-8 max-w-3xl">
          <TextField
            id={fieldIdOf('summary')}
            name="summary"
            label="In a few words: what changes, and why"
            hint="For whoever reviews it, and for the history of the piece."
            maxLength={limits.summary}
            value={summaryField.field.value}
            onChange={summaryField.field.onChange}
            error={summaryField.fieldState.error?.message}
          />
        </div>
        <SendBar
          label={isAmending ? 'Send the amended proposal' : base.gear ? 'Propose the change' : 'Propose the piece'}
          isSending={send.isSending}
          isUploading={uploads.isSending}
          kept={kept}
        />
      </form>
    </>
  )
}
