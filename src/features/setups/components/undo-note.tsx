import { Link, useLocation } from 'react-router-dom'
import { applyUndo, readUndo } from '../../../components/setup/undo'
import { buttonClass } from '../../../components/ui/button-class'
import type { SetupReport } from '../hooks/use-setup-report'

/** After a swap: what was put in, and the way back. */
export function UndoNote({ shown }: { readonly shown: SetupReport }) {
  const { search } = useLocation()
  const { visit, nameOf, hrefOf } = shown
  const undo = readUndo(new URLSearchParams(search).get('undo'))
  if (!undo) return null
  return (
    <p
      role="status"
      className="mt-5 flex flex-wrap items-center justify-between gap-3 border border-l-[5px] border-action bg-sheet px-4 py-3 print:hidden"
    >
      <span className="min-w-0">
        <strong>{nameOf(undo.id)}</strong> was put in. This is the setup with it.
      </span>
      <Link to={hrefOf(applyUndo(visit.raw, undo))} className={buttonClass({ size: 'sm' })}>
        Undo
      </Link>
    </p>
  )
}
