import { useSuspenseQuery } from '@tanstack/react-query'
import { useLocation } from 'react-router-dom'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { reportsQuery } from '../api/get-reports'
import { PilePage } from './pile-page'
import { ReportCard } from './report-card'

/** What readers say is wrong. */
export function ReportsPage() {
  const { api } = useApp()
  const cursor = new URLSearchParams(useLocation().search).get('cursor')
  const { items, next } = useSuspenseQuery(reportsQuery(api, cursor)).data
  return (
    <PilePage
      items={items}
      nextHref={next === null ? null : `${paths.reports}?cursor=${encodeURIComponent(next)}`}
      intro="What readers say is wrong, with or without an account. It changes nothing by itself."
      emptyTitle="No reports are open"
      emptyText="Nobody says that something is wrong."
      renderItem={(report, onSettled) => <ReportCard key={report.id} report={report} onSettled={onSettled} />}
    />
  )
}
