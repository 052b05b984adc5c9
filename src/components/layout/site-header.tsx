import type { ReactNode } from 'react'
import { Link, NavLink } from 'react-router-dom'
import { Wordmark } from './wordmark'

export interface SiteHeaderProps {
  /** Those for wide screens alone are in the footer too. */
  readonly links: readonly { readonly href: string; readonly label: string; readonly isWideOnly?: true }[]
  /** Who is signed in, or the way there. */
  readonly account: ReactNode
  readonly unitSwitch: ReactNode
  readonly themeSwitch: ReactNode
}

/** Two rows on a phone (name and units; pages and theme), one from there on. */
export function SiteHeader({ links, account, unitSwitch, themeSwitch }: SiteHeaderProps) {
  return (
    <header className="border-b-[1.5px] border-ink print:border-b-0">
      <div className="page-width flex flex-wrap items-center gap-x-3 pt-3 md:h-16 md:flex-nowrap md:gap-x-6 md:pt-0">
        <Link to="/" className="mr-auto md:mr-0">
          <Wordmark />
        </Link>
        <div className="flex items-center gap-2 md:order-3 md:gap-4 print:hidden">
          {account}
          {unitSwitch}
        </div>
        <span aria-hidden="true" className="basis-full md:hidden" />
        <nav aria-label="Pages" className="min-w-0 grow basis-0 self-stretch overflow-x-auto md:order-2 print:hidden">
          <ul className="flex h-full gap-x-5">
            {links.map(({ href, label, isWideOnly }) => (
              <li key={href} className={isWideOnly ? 'hidden lg:flex' : 'flex'}>
                <NavLink
                  to={href}
                  className="flex min-h-11 items-center border-y-[3px] border-transparent text-ink-soft -outline-offset-2 hover:text-action aria-[current=page]:border-b-action aria-[current=page]:font-semibold aria-[current=page]:text-ink"
                >
                  {label}
                </NavLink>
              </li>
            ))}
          </ul>
        </nav>
        <div className="md:order-4 print:hidden">{themeSwitch}</div>
      </div>
    </header>
  )
}
