import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'

/** Rows on their way, as tall as they will be. */
export function ListSkeleton() {
  return (
    <LoadingBlock label="Loading the list">
      <div className="border-y-[1.5px] border-ink">
        {Array.from({ length: 10 }, (_, at) => (
          <div key={at} className="border-b border-rule py-3">
            <Skeleton className="h-5 w-2/3" />
          </div>
        ))}
      </div>
    </LoadingBlock>
  )
}
