import { Link } from 'react-router-dom'
import { kindKeys, kinds } from '#shared/kinds/index'
import { paths } from '../../../config/paths'
import { capitalise } from '../../../lib/capitalise'

/** What is to be added, before what can be said of it. */
export function KindChooser() {
  return (
    <>
      <h1>Add a piece of gear</h1>
      <p className="mt-2 max-w-prose">What is it? Each kind has its own sheet of measures.</p>
      <ul className="mt-5 grid gap-x-6 border-t border-rule sm:grid-cols-2 lg:grid-cols-3">
        {kindKeys.map((key) => (
          <li key={key} className="border-b border-rule">
            <Link
              to={`${paths.gearNew}?kind=${key}`}
              className="flex min-h-11 items-center justify-between gap-3 py-2 font-semibold hover:text-action"
            >
              {capitalise(kinds[key].label)}
              <span aria-hidden="true" className="font-mono text-ink-soft">
                {kinds[key].attributes.length} measures
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </>
  )
}
