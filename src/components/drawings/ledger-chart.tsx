import type { LedgerDrawing, LedgerRow } from '#shared/engine/drawings/ledger'
import type { Printer } from '#shared/units/print'
import { percent } from './scale-domain'

export interface LedgerChartProps {
  readonly ledger: LedgerDrawing
  readonly printer: Printer
  readonly nameOf: (itemId: string) => string
}

const countOf = (count: number, word: string): string => `${count} ${word}${count === 1 ? '' : 's'}`

function describePlugs({ plugs, onController }: LedgerRow): string {
  if (plugs === null) return 'plugs not recorded'
  const own = plugs - onController
  if (onController === 0) return countOf(plugs, 'plug')
  return own === 0
    ? `${countOf(onController, 'plug')}, in a controller`
    : `${countOf(own, 'plug')} and ${onController} in a controller`
}

/** A pin for each plug: filled in a strip or wall, hollow in a controller, dotted where nobody counted them. */
function Plugs({ row }: { readonly row: LedgerRow }) {
  const count = Math.min(row.plugs ?? 1, 8)
  return (
    <svg width={count * 14} height="14" aria-hidden="true" className="flex-none">
      {Array.from({ length: count }, (_, at) => (
        <circle
          key={at}
          cx={at * 14 + 7}
          cy="7"
          r="4.5"
          strokeWidth="1.5"
          strokeDasharray={row.plugs === null ? '1.5 2' : undefined}
          className={at < (row.plugs ?? 0) - row.onController ? 'fill-ink stroke-ink' : 'fill-sheet stroke-ink'}
        />
      ))}
    </svg>
  )
}

/** Every piece that plugs in, line by line: its plugs as pins, its watts as a bar on the scale of what may run on. */
export function LedgerChart({ ledger, printer, nameOf }: LedgerChartProps) {
  const { rows, plugs, outlets, watts, continuousW, ratedW } = ledger
  const most = Math.max(ratedW, watts, 1)
  const share = (value: number) => percent((100 * value) / most)
  const lines = rows.map((row, at) => ({
    row,
    from: rows.slice(0, at).reduce((sum, earlier) => sum + (earlier.watts ?? 0), 0),
  }))
  const isOver = watts > continuousW
  return (
    <figure className="min-w-0 border border-rule bg-sheet">
      <table className="w-full border-collapse text-sm">
        <caption className="px-3 pt-2 text-left text-sm text-ink-soft">
          Plugs and watts, one on top of the other
        </caption>
        <thead className="sr-only">
          <tr>
            <th scope="col">Piece</th>
            <th scope="col">Plugs</th>
            <th scope="col">Watts</th>
          </tr>
        </thead>
        <tbody>
          {lines.map(({ row, from }) => (
            <tr key={row.itemId} className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-3 border-b border-rule px-3 py-2">
              <th scope="row" className="min-w-0 text-left font-semibold">
                {row.quantity > 1 && `${row.quantity} × `}
                {nameOf(row.itemId)}
              </th>
              <td className="flex items-center justify-end gap-2 text-ink-soft">
                <span className="sr-only sm:not-sr-only">{describePlugs(row)}</span>
                <Plugs row={row} />
              </td>
              <td className="col-span-2 grid grid-cols-[minmax(0,1fr)_5.5rem] items-center gap-3">
                <svg width="100%" height="12" aria-hidden="true" className="block">
                  <line x1="0" x2="100%" y1="6" y2="6" strokeWidth="1" className="stroke-rule" />
                  {row.watts !== null && (
                    <rect
                      x={share(from)}
                      width={share(row.watts)}
                      y="1"
                      height="10"
                      className={from + row.watts > continuousW ? 'fill-changes' : 'fill-action'}
                    />
                  )}
                  <line
                    x1={share(continuousW)}
                    x2={share(continuousW)}
                    y1="0"
                    y2="12"
                    strokeWidth="2"
                    className="stroke-ink"
                  />
                </svg>
                <span className="text-right font-mono">
                  {row.watts === null ? 'not recorded' : printer.power(row.watts)}
                </span>
              </td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-3 px-3 py-2 font-semibold">
            <th scope="row" className="text-left">
              Together
            </th>
            <td className={plugs > outlets ? 'text-changes' : undefined}>
              {countOf(plugs, 'plug')} for {countOf(outlets, 'outlet')}
            </td>
            <td className={`col-span-2 text-right font-mono ${isOver ? 'text-changes' : ''}`}>
              {printer.power(watts)} of {printer.power(continuousW)}
            </td>
          </tr>
        </tfoot>
      </table>
      <figcaption className="px-3 pb-3 text-sm text-ink-soft">
        {rows.length === 0
          ? 'Nothing that is there plugs in.'
          : `The upright line is ${printer.power(continuousW)}, what may run without pause; the scale ends at ${printer.power(most)}.`}
      </figcaption>
    </figure>
  )
}
