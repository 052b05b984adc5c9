import { Link } from 'react-router-dom'
import { worksheets } from '#shared/engine/worksheets/registry'
import { paths } from '../../../config/paths'
import { useLastSetup } from '../../../lib/last-setup'

/** Every calculation, by the question that it answers. */
export function WorksheetList() {
  const setup = useLastSetup()
  return (
    <ul className="mt-8 grid gap-x-10 gap-y-8 sm:grid-cols-2 lg:grid-cols-3">
      {worksheets.map(({ name, title, intro }) => (
        <li key={name} className="border-t-[1.5px] border-ink pt-3">
          <h2>
            <Link to={paths.worksheet(name)} className="link">
              {title}
            </Link>
          </h2>
          <p className="mt-1 text-sm">{intro}</p>
          {setup !== null && (
            <p className="mt-2 text-sm">
              <Link
                to={`${paths.worksheet(name)}?from=setup&${setup}`}
                aria-label={`Fill in from my setup: ${title}`}
                className="link"
              >
                Fill in from my setup
              </Link>
            </p>
          )}
        </li>
      ))}
    </ul>
  )
}
