import { useState } from 'react'
import type { EvidenceRef } from '#shared/schemas/gear'
import { apiBase } from '../../lib/api-client'
import { Dialog } from '../ui/dialog'

export interface EvidenceFilesProps {
  readonly files: readonly EvidenceRef[]
  /** What they back: "length". */
  readonly of: string
}

const fileHref = (id: string): string => `${apiBase}/evidence/${encodeURIComponent(id)}`

const nameFile = ({ caption }: EvidenceRef, of: string, at: number): string => caption ?? `Photo ${at + 1}: ${of}`

interface PhotoProps {
  readonly file: EvidenceRef
  readonly name: string
  readonly onOpen: () => void
}

function Photo({ file, name, onOpen }: PhotoProps) {
  return (
    <a
      href={fileHref(file.id)}
      onClick={(event) => {
        if (event.metaKey || event.ctrlKey) return
        event.preventDefault()
        onOpen()
      }}
      className="block rounded-ui border-[1.5px] border-ink-soft bg-grid hover:border-action"
    >
      <img
        src={`${fileHref(file.id)}/thumbnail`}
        alt={name}
        width={96}
        height={96}
        loading="lazy"
        className="size-24 object-cover text-xs"
      />
    </a>
  )
}

/** Photos as thumbnails that open large, documents as links. */
export function EvidenceFiles({ files, of }: EvidenceFilesProps) {
  const [open, setOpen] = useState<EvidenceRef | null>(null)
  if (files.length === 0) return null
  return (
    <>
      <ul className="mt-1 flex flex-wrap gap-2">
        {files.map((file, at) => (
          <li key={file.id}>
            {file.kind === 'photo' ? (
              <Photo file={file} name={nameFile(file, of, at)} onOpen={() => setOpen(file)} />
            ) : (
              <a href={fileHref(file.id)} className="link inline-flex min-h-8 items-center">
                {file.caption ?? `Document ${at + 1}: ${of}`} (PDF)
              </a>
            )}
          </li>
        ))}
      </ul>
      {open && (
        <Dialog title={nameFile(open, of, files.indexOf(open))} onClose={() => setOpen(null)} isWide>
          <img
            src={fileHref(open.id)}
            alt={nameFile(open, of, files.indexOf(open))}
            {...(open.width !== null && open.height !== null && { width: open.width, height: open.height })}
            className="h-auto max-h-[75dvh] w-auto max-w-full"
          />
        </Dialog>
      )}
    </>
  )
}
