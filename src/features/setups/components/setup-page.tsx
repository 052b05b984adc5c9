import { ErrorState } from '../../../components/ui/error-state'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { canReport, useSetupReport } from '../hooks/use-setup-report'
import { FormOfAddress } from './new-setup-page'
import { ReportView } from './report-view'

/** The setup of a link: its report, or where it cannot be judged, the form with what is wrong in it. */
export function SetupPage() {
  const { visit, shown, refused, error, retry } = useSetupReport()
  if (!canReport(visit) || refused)
    return (
      <>
        <h1>Your setup needs another look</h1>
        <p className="mt-2 max-w-prose text-lg">
          Everything you typed is kept. What is named below keeps it from being judged.
        </p>
        <FormOfAddress refused={refused} isSent />
      </>
    )
  if (shown) return <ReportView shown={shown} />
  if (error)
    return (
      <>
        <h1>Your setup</h1>
        <div className="mt-6">
          <ErrorState title="The report could not be fetched" onRetry={retry}>
            Your setup is safe: it lives in the address of this page.
          </ErrorState>
        </div>
      </>
    )
  return (
    <>
      <h1>Your setup</h1>
      <LoadingBlock label="Loading the report">
        <div className="mt-4 space-y-4">
          <Skeleton className="h-8 w-2/3" />
          <Skeleton className="h-40 w-full" />
          <Skeleton className="h-80 w-full" />
        </div>
      </LoadingBlock>
    </>
  )
}
