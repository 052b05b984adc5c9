import { NavLink } from 'react-router-dom'
import { paths } from '../../../config/paths'

const tabs = [
  { to: paths.review, label: 'Proposals' },
  { to: paths.disputes, label: 'Disputes' },
  { to: paths.reports, label: 'Error reports' },
] as const

/** The three piles of the desk. */
export function DeskTabs() {
  return (
    <nav aria-label="Review desk" className="mt-3 border-b-[1.5px] border-ink">
      <ul className="flex flex-wrap gap-x-6">
        {tabs.map(({ to, label }) => (
          <li key={to}>
            <NavLink
              to={to}
              end
              className="flex min-h-11 items-center border-y-[3px] border-transparent text-ink-soft hover:text-action aria-[current=page]:border-b-action aria-[current=page]:font-semibold aria-[current=page]:text-ink"
            >
              {label}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  )
}
