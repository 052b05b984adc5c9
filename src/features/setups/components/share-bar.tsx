import { useState, useSyncExternalStore } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'

const never = () => () => undefined

/** The page's whole address; none on the server, which is not where the visitor is. */
const useAddress = (search: string): string | null =>
  useSyncExternalStore(
    never,
    () => `${location.origin}${location.pathname}${search}`,
    () => null,
  )

export interface ShareBarProps {
  readonly search: string
  readonly formHref: string
}

/** The setup is its link: copy it, print it, or go on describing. */
export function ShareBar({ search, formHref }: ShareBarProps) {
  const address = useAddress(search)
  const [said, setSaid] = useState('')
  const copy = () => {
    if (address === null) return
    navigator.clipboard.writeText(address).then(
      () => setSaid('Copied. Whoever opens it sees this setup, in their own units.'),
      () => setSaid('Your browser did not allow it: copy the address of this page instead.'),
    )
  }
  return (
    <>
      <div className="mt-5 flex flex-wrap items-center gap-2 print:hidden">
        {address !== null && <Button onClick={copy}>Copy the link</Button>}
        {address !== null && <Button onClick={() => print()}>Print</Button>}
        <Link to={formHref} className={buttonClass()}>
          Change the setup
        </Link>
        <span role="status" className="text-sm text-ink-soft">
          {said}
        </span>
      </div>
      {address !== null && <p className="hidden text-sm break-all print:block">{address}</p>}
    </>
  )
}
