import clsx from 'clsx'
import { Link } from 'react-router-dom'
import type { GearItem } from '#shared/schemas/gear'
import { paths } from '../../../config/paths'
import { formId, type Browse } from '../hooks/use-browse'
import { useDraft } from '../hooks/use-draft'
import { mostCompared } from '../link/browse-state'
import type { Span } from '../model/find-matches'
import { MarkedText } from './marked-text'

export interface NameCellProps {
  readonly item: GearItem
  readonly browse: Browse
  /** Stretches of the name that were searched for. */
  readonly matches: readonly Span[]
  readonly className: string
}

/** Brand and model, leading to the sheet, and a box that puts the piece beside others. */
export function NameCell({ item, browse, matches, className }: NameCellProps) {
  const { slug, brand, model, status } = item
  const { state, sendForm } = browse
  const [isCompared, setIsCompared] = useDraft(state.compare.includes(slug))
  const name = `${brand} ${model}`
  const isFull = state.compare.length >= mostCompared && !isCompared
  return (
    <th
      role="rowheader"
      scope="row"
      className={clsx(
        'col-span-2 block text-left font-normal md:sticky md:left-0 md:z-[5] md:table-cell md:max-w-72 md:min-w-56 md:border-r md:border-b md:border-rule md:bg-paper md:pr-3 md:pl-1 md:align-baseline md:group-last:border-b-0',
        className,
      )}
    >
      <span className="flex items-baseline gap-2.5">
        <label className="-m-1.5 flex-none self-start p-1.5 print:hidden">
          <input
            type="checkbox"
            form={formId}
            name="compare"
            value={slug}
            checked={isCompared}
            disabled={isFull}
            title={isFull ? `Up to ${mostCompared} pieces can be compared` : undefined}
            onChange={({ currentTarget }) => {
              setIsCompared(currentTarget.checked)
              if (currentTarget.form) sendForm(currentTarget.form)
            }}
            className="block size-4 translate-y-0.5 accent-action"
          />
          <span className="sr-only">Compare {name}</span>
        </label>
        <span className="min-w-0">
          <Link to={paths.gear(slug)} className="font-semibold underline-offset-4 hover:text-action hover:underline">
            <MarkedText text={name} spans={matches} />
          </Link>
          {status === 'discontinued' && <span className="block text-xs font-semibold text-changes">discontinued</span>}
        </span>
      </span>
    </th>
  )
}
