import { thresholds } from '#shared/engine/thresholds'
import { usePrinter } from '../../../lib/use-printer'
import { BasisNote } from './basis-note'

/** Every number that a verdict turns on and that is not computed. */
export function ThresholdTable() {
  const printer = usePrinter()
  return (
    <div className="mt-4 overflow-x-auto">
      <table className="w-full min-w-[36rem] border-collapse text-left text-sm">
        <thead>
          <tr className="border-b border-ink">
            <th scope="col" className="py-2 pr-6 font-semibold">
              Number
            </th>
            <th scope="col" className="py-2 pr-6 font-semibold">
              What it says
            </th>
            <th scope="col" className="py-2 font-semibold">
              Where it is from
            </th>
          </tr>
        </thead>
        <tbody>
          {Object.entries(thresholds).map(([key, { value, unit, text, basis }]) => (
            <tr key={key} className="border-b border-rule align-top">
              <td className="py-2 pr-6 font-mono whitespace-nowrap">
                {unit === 'ratio' ? value : printer.measure(value, unit)}
              </td>
              <td className="py-2 pr-6">{text}.</td>
              <td className="py-2 text-ink-soft">
                <BasisNote basis={basis} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
