import { Link } from 'react-router-dom'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { useLastSetup } from '../../../lib/last-setup'
import type { Gear } from '#shared/schemas/gear'

/** A tank is drawn in the finder; any other piece is picked among those of its kind. */
function checkHref({ kind, slug }: Gear): string {
  const query = kind === 'tank' ? { kind: 'heater', 'tank.gear': slug } : { kind, picked: slug }
  return `${paths.find}?${new URLSearchParams(query).toString()}`
}

/** Leads to the finder: with the visitor's own setup where this browser remembers one. */
export function CheckLinks({ gear }: { readonly gear: Gear }) {
  const setup = useLastSetup()
  const { kind, slug } = gear
  const isOwn = setup !== null && kind !== 'tank'
  return (
    <p className="mt-4 flex flex-wrap items-center gap-3 print:hidden">
      {isOwn && (
        <Link to={`${paths.find}?kind=${kind}&${setup}&picked=${slug}`} className={buttonClass({ variant: 'primary' })}>
          Check against my setup
        </Link>
      )}
      <Link to={checkHref(gear)} className={buttonClass({ variant: isOwn ? 'plain' : 'primary' })}>
        {kind === 'tank' ? 'See what fits this tank' : isOwn ? 'Start from an empty setup' : 'Check it against a setup'}
      </Link>
      <Link to={`${paths.gearList}?kind=${kind}&compare=${slug}`} className={buttonClass()}>
        Compare with others
      </Link>
    </p>
  )
}
