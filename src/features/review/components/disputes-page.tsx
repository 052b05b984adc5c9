import { useSuspenseQuery } from '@tanstack/react-query'
import { useLocation } from 'react-router-dom'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { disputesQuery } from '../api/get-disputes'
import { DisputeCard } from './dispute-card'
import { PilePage } from './pile-page'

/** Values that sources disagree about, to be settled by hand. */
export function DisputesPage() {
  const { api } = useApp()
  const cursor = new URLSearchParams(useLocation().search).get('cursor')
  const { items, next } = useSuspenseQuery(disputesQuery(api, cursor)).data
  return (
    <PilePage
      items={items}
      nextHref={next === null ? null : `${paths.disputes}?cursor=${encodeURIComponent(next)}`}
      intro="A value that was turned to and fro is not turned again: it waits here with everything that was said of it, until somebody chooses and says why."
      emptyTitle="Nothing is disputed"
      emptyText="No value went to and fro."
      renderItem={(dispute, onSettled) => <DisputeCard key={dispute.id} dispute={dispute} onSettled={onSettled} />}
    />
  )
}
