import { NavLink } from 'react-router-dom'
import { paths } from '../../config/paths'

const tabs = [
  { href: paths.admin, label: 'People' },
  { href: paths.adminAudit, label: 'Audit trail' },
  { href: paths.adminLetters, label: 'Letters' },
]

/** The pages of those who answer for the site. */
export function AdminTabs() {
  return (
    <nav aria-label="Administration" className="overflow-x-auto border-b border-rule">
      <ul className="flex gap-x-5">
        {tabs.map(({ href, label }) => (
          <li key={href} className="flex">
            <NavLink
              end
              to={href}
              className="flex min-h-11 items-center border-y-[3px] border-transparent whitespace-nowrap text-ink-soft -outline-offset-2 hover:text-action aria-[current=page]:border-b-action aria-[current=page]:font-semibold aria-[current=page]:text-ink"
            >
              {label}
            </NavLink>
          </li>
        ))}
      </ul>
    </nav>
  )
}
