import { useQuery } from '@tanstack/react-query'
import { getKind, isKindKey } from '#shared/kinds/index'
import { printValue } from '#shared/kinds/print-value'
import type { Gear } from '#shared/schemas/gear'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { usePrinter } from '../../../lib/use-printer'
import { careGearQuery } from '../api/find-pieces'

export interface MergePreviewProps {
  readonly from: string
  readonly into: string
}

function Differences({ from, into }: { readonly from: Gear; readonly into: Gear }) {
  const printer = usePrinter()
  const attributes = isKindKey(into.kind) ? getKind(into.kind).attributes : []
  const different = attributes.filter(
    ({ key }) => JSON.stringify(from.specs[key] ?? null) !== JSON.stringify(into.specs[key] ?? null),
  )
  if (different.length === 0) return <p className="mt-2">Both say the same of every value.</p>
  return (
    <table className="mt-2 w-full table-fixed border-b border-rule text-sm">
      <caption className="text-left font-semibold">What the two say differently</caption>
      <thead>
        <tr>
          {['Value', 'This one', 'The one that stays'].map((title) => (
            <th key={title} scope="col" className="py-1 pr-2 text-left">
              {title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {different.map((attribute) => (
          <tr key={attribute.key}>
            <th scope="row" className="border-t border-rule py-1 pr-2 text-left align-top font-normal">
              {attribute.label}
            </th>
            {[from, into].map(({ slug, specs }) => (
              <td key={slug} className="border-t border-rule py-1 pr-2 align-top font-mono break-words">
                {specs[attribute.key] === undefined ? '–' : printValue(attribute, specs[attribute.key], printer)}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  )
}

/** What merging does, before it is done. */
export function MergePreview({ from, into }: MergePreviewProps) {
  const { api } = useApp()
  const one = useQuery(careGearQuery(api, from))
  const other = useQuery(careGearQuery(api, into))
  const failed = one.error ?? other.error
  if (failed) return <p className="text-no">{toApiError(failed).message}</p>
  if (!one.data || !other.data)
    return (
      <LoadingBlock label="Loading both pieces">
        <Skeleton className="h-24 w-full" />
      </LoadingBlock>
    )
  return (
    <div className="border-l-[5px] border-ink bg-paper px-4 py-3">
      <h3 className="font-semibold">What happens</h3>
      <ul className="mt-1 list-disc space-y-1 pl-5 text-sm">
        <li>
          The address of {one.data.brand} · {one.data.model} leads to {other.data.brand} · {other.data.model} from then
          on.
        </li>
        <li>Lists, search and answers show the one that stays. Its values stay as they are.</li>
        <li>The history of both is kept, and merging can be undone.</li>
      </ul>
      <div className="mt-3">
        <Differences from={one.data} into={other.data} />
      </div>
    </div>
  )
}
