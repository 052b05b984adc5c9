import { lazy, Suspense } from 'react'
import type { KindKey } from '#shared/kinds/index'
import type { AnswerDrawingProps } from './answer-drawing'

const drawnKinds: ReadonlySet<KindKey> = new Set<KindKey>(['heater', 'light', 'return-pump', 'stand', 'tank'])

const AnswerDrawing = lazy(() => import('./answer-drawing').then((module) => ({ default: module.AnswerDrawing })))

/** The drawing of an answer; what computes it is fetched when the first answer is opened. */
export function LazyAnswerDrawing(props: AnswerDrawingProps) {
  if (!drawnKinds.has(props.answer.kind)) return null
  return (
    // On a phone it takes the whole width, past the indentation of the checks.
    <div className="mt-1 mb-4 -ml-[4.125rem] max-w-3xl md:ml-0">
      <Suspense fallback={<div aria-hidden="true" className="h-80 border border-rule bg-sheet" />}>
        <AnswerDrawing {...props} />
      </Suspense>
    </div>
  )
}
