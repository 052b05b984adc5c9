import type { Span } from '../model/find-matches'

/** A text with stretches of it marked; they are in order and do not overlap. */
export function MarkedText({ text, spans }: { readonly text: string; readonly spans: readonly Span[] }) {
  if (spans.length === 0) return text
  const starts = [0, ...spans.map(({ end }) => end)]
  return starts.map((start, at) => {
    const span = spans[at]
    return (
      <span key={start}>
        {text.slice(start, span?.start)}
        {span && <mark className="bg-action-soft text-inherit">{text.slice(span.start, span.end)}</mark>}
      </span>
    )
  })
}
