import { useId, useState, type DragEvent } from 'react'
import { getAttribute, type KindKey } from '#shared/kinds/index'
import { Button } from '../../../components/ui/button'
import { acceptedTypes } from '../model/check-file'
import type { TypedFile } from '../model/typed-form'
import type { Upload } from '../hooks/use-uploads'
import { FileCard } from './file-card'

export interface EvidenceBoxProps {
  readonly kind: KindKey
  /** Keys that the proposal sets. */
  readonly changed: readonly string[]
  readonly files: readonly TypedFile[]
  readonly uploads: readonly Upload[]
  readonly onAdd: (files: Iterable<File>) => void
  readonly onChange: (files: readonly TypedFile[]) => void
  readonly onRemove: (file: TypedFile) => void
  /** Why nothing can be attached yet; undefined where it can. */
  readonly blocked?: string | undefined
}

function UploadLine({ upload: { name, share, failure, stop } }: { readonly upload: Upload }) {
  const id = useId()
  if (failure !== undefined)
    return (
      <li role="alert" className="border border-l-[5px] border-no bg-sheet px-4 py-3">
        <p>{failure}</p>
        <Button size="sm" className="mt-2" aria-label={`Put ${name} away`} onClick={stop}>
          Put away
        </Button>
      </li>
    )
  const percent = Math.round(share * 100)
  return (
    <li className="border border-rule bg-sheet px-4 py-3">
      <label htmlFor={id} className="block text-sm break-words">
        {share < 1 ? `Sending ${name}` : `Looking at ${name}`} <span className="font-mono">{percent}%</span>
      </label>
      <progress id={id} max={100} value={percent} className="mt-1 h-2 w-full accent-action" />
      <Button size="sm" className="mt-2" aria-label={`Stop sending ${name}`} onClick={stop}>
        Stop
      </Button>
    </li>
  )
}

/** Photos and documents that back the values: chosen or dropped, sent at once, seen by nobody else before approval. */
export function EvidenceBox(props: EvidenceBoxProps) {
  const { kind, changed, files, uploads, onAdd, onChange, onRemove, blocked } = props
  const [isOver, setIsOver] = useState(false)
  const labelOf = (key: string) => getAttribute(kind, key)?.label ?? key
  const drop = (event: DragEvent) => {
    event.preventDefault()
    setIsOver(false)
    if (blocked === undefined) onAdd(event.dataTransfer.files)
  }
  return (
    <section className="mt-10" aria-labelledby="evidence-title">
      <h2 id="evidence-title">Evidence</h2>
      <p className="mt-1 max-w-prose text-ink-soft">
        A photo of the calipers on the piece, or its maker’s sheet. Photos lose their place and camera data; nobody but
        you and the moderators sees a file before it is approved.
      </p>
      <div
        onDragOver={(event) => {
          event.preventDefault()
          setIsOver(true)
        }}
        onDragLeave={() => setIsOver(false)}
        onDrop={drop}
        className={`mt-3 border-[1.5px] border-dashed px-5 py-4 ${isOver ? 'border-action bg-action-soft' : 'border-ink-soft'}`}
      >
        <label htmlFor="evidence-files" className="block text-sm font-semibold">
          Photos and PDFs
        </label>
        <p id="evidence-files-hint" className="text-sm text-ink-soft">
          {blocked ?? 'Choose files, or drop them here. JPEG, PNG, WebP or PDF, up to 25 MB each.'}
        </p>
        <input
          id="evidence-files"
          type="file"
          multiple
          accept={acceptedTypes}
          disabled={blocked !== undefined}
          aria-describedby="evidence-files-hint"
          className="mt-2 block max-w-full text-base file:mr-3 file:min-h-11 file:cursor-pointer file:rounded-ui file:border-[1.5px] file:border-solid file:border-ink-soft file:bg-sheet file:px-4 file:font-semibold file:text-ink hover:file:border-action hover:file:text-action disabled:opacity-55"
          onChange={({ currentTarget }) => {
            onAdd([...(currentTarget.files ?? [])])
            currentTarget.value = ''
          }}
        />
      </div>
      <ul className="mt-3 grid gap-3 sm:grid-cols-2">
        {uploads.map((upload) => (
          <UploadLine key={upload.key} upload={upload} />
        ))}
        {files.map((file) => (
          <FileCard
            key={file.id}
            file={file}
            targets={changed.map((key) => ({ key, label: labelOf(key) }))}
            onChange={(next) => onChange(files.map((one) => (one.id === next.id ? next : one)))}
            onRemove={() => onRemove(file)}
          />
        ))}
      </ul>
    </section>
  )
}
