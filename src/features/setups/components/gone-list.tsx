import { Link } from 'react-router-dom'
import { dropItem, listItems } from '../../../components/setup/items-raw'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import type { SetupReport } from '../hooks/use-setup-report'

/** Pieces that are gone and count for nothing: what takes their place, or that they are there after all. */
export function GoneList({ shown }: { readonly shown: SetupReport }) {
  const { visit, nameOf, hrefOf, printer } = shown
  const gone = listItems(visit.raw).filter(({ state }) => state === 'gone')
  if (gone.length === 0) return null
  const withoutState = (id: string) =>
    Object.fromEntries(Object.entries(visit.raw).filter(([path]) => path !== `items.${id}.state`))
  return (
    <section className="mt-10">
      <h2>Gone</h2>
      <ul className="mt-2 border-t border-rule">
        {gone.map(({ id }) => (
          <li key={id} className="flex flex-wrap items-center justify-between gap-3 border-b border-rule py-3">
            <span className="min-w-0 font-heading text-lg font-bold">{nameOf(id)}</span>
            <span className="flex flex-wrap gap-2 print:hidden">
              <Link
                to={writeSetupHref(paths.swap(id), visit.raw, printer.system)}
                aria-label={`What replaces it? ${nameOf(id)}`}
                className={buttonClass({ size: 'sm', variant: 'primary' })}
              >
                What replaces it?
              </Link>
              <Link to={hrefOf(withoutState(id))} className={buttonClass({ size: 'sm' })}>
                It is there after all
              </Link>
              <Link to={hrefOf(dropItem(visit.raw, id))} className={buttonClass({ size: 'sm' })}>
                Leave it out
              </Link>
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}
