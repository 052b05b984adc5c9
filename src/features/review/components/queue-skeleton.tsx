import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'

/** Rows on their way, as tall as they will be. */
export function QueueSkeleton() {
  return (
    <LoadingBlock label="Loading the queue">
      <div className="mt-3 border-b-[1.5px] border-ink md:mt-12">
        {Array.from({ length: 6 }, (_, at) => (
          <div key={at} className="border-t border-rule py-3">
            <Skeleton className="h-5 w-1/2" />
            <Skeleton className="mt-2 h-4 w-1/3" />
          </div>
        ))}
      </div>
    </LoadingBlock>
  )
}
