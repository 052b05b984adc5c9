import type { Answer } from '#shared/engine/types'
import type { FitAnswer } from '#shared/schemas/answer'
import { getKind } from '#shared/kinds/index'
import { SharedScale } from '../../../components/drawings/shared-scale'
import type { Finder } from '../hooks/use-finder'
import { AnswerCard } from './answer-card'

export interface ScalesProps {
  readonly finder: Finder
  readonly first: FitAnswer
  /** The picked piece, where it stands in no open list. */
  readonly apart: Answer | null
  readonly pointed: string | null
  readonly onPoint: (slug: string | null) => void
}

/** Every candidate as a mark on the scales that decide. */
export function Scales({ finder, first, apart, pointed, onPoint }: ScalesProps) {
  const { scales = [], marks = [] } = first
  const { state, printer, go } = finder
  if (scales.length === 0 || marks.length === 0) return null
  const names = new Map(marks.map(({ slug, brand, model }) => [slug, `${brand} · ${model}`]))
  return (
    <section className="mt-10">
      <h2>
        Where {marks.length} {getKind(state.kind).plural} stand
      </h2>
      <p className="text-sm text-ink-soft">
        Each pin is one piece. Press one, or use the arrow keys, to see it in the drawing and in its answer.
      </p>
      <div className="mt-4 space-y-5">
        {scales.map((scale) => (
          <SharedScale
            key={scale.key}
            scale={scale}
            marks={marks}
            printer={printer}
            nameOf={(slug) => names.get(slug) ?? slug}
            selected={state.picked}
            pointed={pointed}
            onPick={(slug) => go({ picked: slug }, true)}
            onPoint={onPoint}
          />
        ))}
      </div>
      {apart && (
        <ol aria-label="The piece you picked" className="mt-4 border-t border-rule">
          <AnswerCard answer={apart} finder={finder} isLit isPicked />
        </ol>
      )}
    </section>
  )
}
