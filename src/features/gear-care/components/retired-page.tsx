import { Link } from 'react-router-dom'
import { EmptyState } from '../../../components/ui/empty-state'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { CareLink } from './care-link'

export interface RetiredPageProps {
  readonly slug: string
  /** That it was retired, and why. */
  readonly detail: string
}

/** In place of a piece that was taken out of the record. */
export function RetiredPage({ slug, detail }: RetiredPageProps) {
  return (
    <>
      <h1>Taken out of the record</h1>
      <div className="mt-6">
        <EmptyState
          title="This entry was retired"
          action={
            <Link to={paths.gearList} className={buttonClass()}>
              Browse the gear
            </Link>
          }
        >
          <p className="whitespace-pre-line">{detail}</p>
          <p>It is left out of lists, search and answers. What was recorded of it is kept.</p>
        </EmptyState>
      </div>
      <CareLink slug={slug} />
    </>
  )
}
