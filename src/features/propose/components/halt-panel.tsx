import { useEffect, useRef, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import type { Meanwhile } from '../model/rebase'

interface PanelProps {
  readonly title: string
  /** Counts the attempts: each brings the panel into focus. */
  readonly attempt: number
  readonly children: ReactNode
}

function Panel({ title, attempt, children }: PanelProps) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => box.current?.focus(), [attempt])
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      aria-labelledby="halt-title"
      className="mt-6 border-2 border-changes bg-sheet p-4 scroll-mt-4"
    >
      <h2 id="halt-title">{title}</h2>
      {children}
    </div>
  )
}

/** It can only be sent by somebody: everything typed waits here until they are back. */
export function SignInPanel({ next, attempt }: { readonly next: string; readonly attempt: number }) {
  return (
    <Panel title="Sign in to send it" attempt={attempt}>
      <p className="mt-1 max-w-prose">
        A proposal has an author, who is told what becomes of it. Everything you typed is kept in this browser and will
        be here when you come back.
      </p>
      <p className="mt-3 flex flex-wrap gap-3">
        <Link to={paths.signIn(next)} className={buttonClass({ variant: 'primary' })}>
          Sign in and come back
        </Link>
      </p>
    </Panel>
  )
}

export interface MeanwhilePanelProps {
  readonly title: string
  readonly attempt: number
  readonly changes: readonly Meanwhile[]
  readonly goOn: string
  readonly onGoOn: () => void
}

/** Somebody was quicker: what they changed beside what is typed here, field by field. */
export function MeanwhilePanel({ title, attempt, changes, goOn, onGoOn }: MeanwhilePanelProps) {
  return (
    <Panel title={title} attempt={attempt}>
      <p className="mt-1 max-w-prose">
        Nothing you typed is lost: it stands in the form below. Look at what changed, mend yours where it is no longer
        right, and send it again.
      </p>
      {changes.length === 0 ? (
        <p className="mt-2">None of the values differ; only words around them did.</p>
      ) : (
        <div className="mt-3 overflow-x-auto" tabIndex={0} role="region" aria-label="What changed meanwhile">
          <table className="w-full min-w-[30rem] text-sm">
            <caption className="sr-only">What changed meanwhile</caption>
            <thead>
              <tr className="text-left text-ink-soft">
                <th scope="col" className="py-1 pr-4 font-normal">
                  Value
                </th>
                <th scope="col" className="py-1 pr-4 font-normal">
                  When you began
                </th>
                <th scope="col" className="py-1 pr-4 font-normal">
                  Now
                </th>
                <th scope="col" className="py-1 font-normal">
                  Yours
                </th>
              </tr>
            </thead>
            <tbody>
              {changes.map(({ key, label, was, now, mine }) => (
                <tr key={key} className="border-t border-rule align-top">
                  <th scope="row" className="py-2 pr-4 text-left font-semibold first-letter:uppercase">
                    {label}
                  </th>
                  <td className="py-2 pr-4 font-mono">{was}</td>
                  <td className="py-2 pr-4 font-mono font-semibold">{now}</td>
                  <td className="py-2 font-mono">{mine ?? 'as now'}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      <Button className="mt-3" onClick={onGoOn}>
        {goOn}
      </Button>
    </Panel>
  )
}
