import { useState, useSyncExternalStore } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'

const never = () => () => undefined

/** The whole address of the setup; none on the server, which is not where the visitor is. */
const useAddress = (href: string): string | null =>
  useSyncExternalStore(
    never,
    () => `${location.origin}${href}`,
    () => null,
  )

export interface ShareBarProps {
  readonly href: string
  readonly formHref: string
}

/** The setup is its link: copy it, print it, or go on describing. */
export function ShareBar({ href, formHref }: ShareBarProps) {
  const address = useAddress(href)
  const [said, setSaid] = useState('')
  const copy = () => {
    if (address === null) return
    // Without a secure connection there is no clipboard to ask at all.
    Promise.resolve()
      .then(() => navigator.clipboard.writeText(address))
      .then(
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
