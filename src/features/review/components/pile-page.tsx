import { useState, type ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import { DeskTabs } from './desk-tabs'

export interface PilePageProps<T> {
  readonly items: readonly T[]
  /** Address of the page after this one. */
  readonly nextHref: string | null
  readonly intro: string
  readonly emptyTitle: string
  readonly emptyText: string
  readonly renderItem: (item: T, onSettled: (message: string) => void) => ReactNode
}

/** A pile of the desk beside the queue: each item is settled where it lies. */
export function PilePage<T>({ items, nextHref, intro, emptyTitle, emptyText, renderItem }: PilePageProps<T>) {
  const [message, setMessage] = useState('')
  return (
    <>
      <h1>Review desk</h1>
      <DeskTabs />
      <p className="mt-3 max-w-prose text-ink-soft">{intro}</p>
      <p role="status" className={message === '' ? 'sr-only' : 'mt-3 border-l-[5px] border-fits bg-sheet px-4 py-3'}>
        {message}
      </p>
      <div className="mt-4">
        {items.length > 0 ? (
          <ol className="border-b-[1.5px] border-ink">{items.map((item) => renderItem(item, setMessage))}</ol>
        ) : (
          <EmptyState title={emptyTitle}>{emptyText}</EmptyState>
        )}
      </div>
      {nextHref !== null && (
        <p className="mt-4">
          <Link to={nextHref} className={buttonClass()}>
            Next page
          </Link>
        </p>
      )}
    </>
  )
}
