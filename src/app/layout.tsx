import { useEffect, useRef } from 'react'
import { Outlet, useLocation, useNavigation } from 'react-router-dom'
import { PageShell } from '../components/layout/page-shell'
import { SiteFooter } from '../components/layout/site-footer'
import { SiteHeader } from '../components/layout/site-header'
import { paths } from '../config/paths'
import { AccountEntry } from '../features/accounts/components/account-entry'
import { ThemeSwitch } from '../features/theme/components/theme-switch'
import { applyTheme } from '../features/theme/theme'
import { UnitSwitch } from '../features/units/components/unit-switch'
import { useApp, usePreferences } from '../lib/app-context'
import { keepPreferences, type Preferences } from '../lib/preferences'

const links = [
  { href: paths.find, label: 'Find' },
  { href: paths.setupNew, label: 'Setups' },
  { href: paths.gearList, label: 'Gear' },
  { href: paths.worksheets, label: 'Worksheets', isWideOnly: true as const },
  { href: paths.method, label: 'Method', isWideOnly: true as const },
]

/** A page of its own begins at the top, with focus on its content; a changed query of the same page moves nothing. */
function useFreshStart(pathname: string, hash: string): void {
  const shown = useRef(pathname)
  useEffect(() => {
    if (shown.current === pathname) return
    shown.current = pathname
    // The address names a part of the page: that has focus.
    if (hash.length > 1 && document.getElementById(decodeURIComponent(hash.slice(1)))) return
    window.scrollTo(0, 0)
    // What went wrong with the form that led here has taken it already.
    if (document.activeElement?.closest('[role="alert"]')) return
    document.getElementById('main')?.focus({ preventScroll: true })
  }, [pathname, hash])
}

function PendingBar() {
  const { state } = useNavigation()
  return (
    <div role="status" className="fixed inset-x-0 top-0 z-30 print:hidden">
      {state === 'loading' && (
        <>
          <div className="h-[3px] w-2/3 bg-action" />
          <span className="sr-only">Loading</span>
        </>
      )}
    </div>
  )
}

/** Header, page, footer. */
export function Layout() {
  const { preferences } = useApp()
  const { system, theme } = usePreferences()
  const { pathname, search, hash } = useLocation()
  useFreshStart(pathname, hash)
  const next = `${pathname}${search}`
  const change = (wanted: Partial<Preferences>) => {
    preferences.set(wanted)
    keepPreferences(preferences.get())
  }
  return (
    <PageShell
      header={
        <SiteHeader
          links={links}
          account={<AccountEntry />}
          unitSwitch={<UnitSwitch system={system} next={next} onChange={(wanted) => change({ system: wanted })} />}
          themeSwitch={
            <ThemeSwitch
              theme={theme}
              next={next}
              onChange={(wanted) => {
                applyTheme(wanted)
                change({ theme: wanted })
              }}
            />
          }
        />
      }
      footer={<SiteFooter isDemo />}
    >
      <PendingBar />
      <Outlet />
    </PageShell>
  )
}
