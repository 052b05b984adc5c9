import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { Check } from '#shared/engine/types'
import { Link } from 'react-router-dom'
import { findSketch, MeasureSketch } from '../../../components/drawings/measure-sketch'
import { paths } from '../../../config/paths'

/** The numbers that verdicts wait for, each with a drawing of where to measure it. */
export function MissingMeasures({ kind, checks }: { readonly kind: KindKey; readonly checks: readonly Check[] }) {
  const keys = [...new Set(checks.flatMap(({ missing = [] }) => missing))]
  const attributes = keys.flatMap((key) => getAttribute(kind, key) ?? [])
  if (attributes.length === 0) return null
  return (
    <div className="mt-3 border-[1.5px] border-dashed border-ink-soft px-4 py-3">
      <h4 className="text-sm font-semibold">Nobody has recorded yet</h4>
      <ul className="mt-2 grid gap-x-6 gap-y-3 sm:grid-cols-2">
        {attributes.map(({ key, label, guide }) => {
          const shape = findSketch(key, kind)
          return (
            <li key={key} className="flex gap-3 text-sm">
              {shape && <MeasureSketch shape={shape} />}
              <span className="min-w-0">
                <span className="block font-semibold first-letter:uppercase">{label}</span>
                <span className="text-ink-soft">{guide ?? 'From its box or its maker’s sheet.'}</span>
              </span>
            </li>
          )
        })}
      </ul>
      <p className="mt-2 text-sm print:hidden">
        <Link to={`${paths.measuringSheet}?kind=${kind}`} className="link">
          A sheet to print and measure by
        </Link>
      </p>
    </div>
  )
}
