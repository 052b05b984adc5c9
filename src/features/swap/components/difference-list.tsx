import type { Difference } from '#shared/engine/swap/types'
import { DifferenceLine } from '../../../components/drawings/difference-line'

const senseWords = { better: 'better', worse: 'worse', different: 'different' } as const
const senseClasses = { better: 'text-fits', worse: 'text-changes', different: 'text-ink-soft' } as const

const longest = 160

/** The message begins with the label, which stands over it already; chambers one by one are for whoever asks. */
function Words({ label, message }: Pick<Difference, 'label' | 'message'>) {
  const start = `${label}: `.toLowerCase()
  const text = message.toLowerCase().startsWith(start) ? message.slice(start.length) : message
  if (text.length <= longest) return <p className="text-ink-soft">{text}</p>
  return (
    <details className="text-ink-soft">
      <summary className="min-h-6 text-action">Read both</summary>
      {text}
    </details>
  )
}

/** In what a candidate is not like what is gone, each on a line of its own where it is a number. */
export function DifferenceList({ differences }: { readonly differences: readonly Difference[] }) {
  if (differences.length === 0) return <p className="text-sm">The same in everything that is recorded of both.</p>
  return (
    <ul className="grid gap-x-8 gap-y-2 sm:grid-cols-2">
      {differences.map(({ key, label, from, to, sense, message }) => (
        <li key={key} className="min-w-0 text-sm">
          <p className="flex flex-wrap justify-between gap-x-3">
            <span className="min-w-0 font-semibold first-letter:uppercase">{label}</span>
            <span className={`font-semibold ${senseClasses[sense]}`}>{senseWords[sense]}</span>
          </p>
          {typeof from === 'number' && typeof to === 'number' && (
            <div className="px-1.5">
              <DifferenceLine from={from} to={to} sense={sense} />
            </div>
          )}
          <Words label={label} message={message} />
        </li>
      ))}
    </ul>
  )
}
