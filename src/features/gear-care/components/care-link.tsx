import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { careQuery } from '../api/get-care'
import { useSignedIn } from '../../../lib/session'
import { hasCare } from '../has-care'

/** For moderators alone: to where the entry as a whole is looked after. */
export function CareLink({ slug }: { readonly slug: string }) {
  const { api } = useApp()
  const isModerator = useSignedIn()?.can.review === true
  const { data: care } = useQuery({ ...careQuery(api, slug), enabled: isModerator })
  if (!care || !hasCare(care)) return null
  return (
    <p className="mt-10 print:hidden">
      <Link to={paths.gearCare(slug)} className="link inline-flex min-h-8 items-center">
        Merge or retire this entry
      </Link>
    </p>
  )
}
