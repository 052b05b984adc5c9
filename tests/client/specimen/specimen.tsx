import { useState } from 'react'
import { createPrinter } from '#shared/units/print'
import type { UnitSystem } from '#shared/units/systems'
import { PageShell } from '../../../src/components/layout/page-shell'
import { SiteFooter } from '../../../src/components/layout/site-footer'
import { SiteHeader } from '../../../src/components/layout/site-header'
import { ThemeSwitch } from '../../../src/features/theme/components/theme-switch'
import { applyTheme, type Theme } from '../../../src/features/theme/theme'
import { UnitSwitch } from '../../../src/features/units/components/unit-switch'
import { DrawingsSpecimen } from './drawings-specimen'
import { PrimitivesSpecimen } from './primitives-specimen'

const links = [
  { href: '/find', label: 'Find' },
  { href: '/method', label: 'Method' },
]

/** Every building block once, with invented values: what the browser tests look at. */
export function Specimen() {
  const [system, setSystem] = useState<UnitSystem>('us')
  const [theme, setTheme] = useState<Theme>('system')
  const printer = createPrinter(system)
  const changeTheme = (next: Theme) => {
    setTheme(next)
    applyTheme(next)
  }
  return (
    <PageShell
      header={
        <SiteHeader
          links={links}
          account={<a href="/sign-in">Sign in</a>}
          unitSwitch={<UnitSwitch system={system} next="/find?q=1" onChange={setSystem} />}
          themeSwitch={<ThemeSwitch theme={theme} next="/find?q=1" onChange={changeTheme} />}
        />
      }
      footer={<SiteFooter isDemo />}
    >
      <h1>Which heater still fits?</h1>
      <DrawingsSpecimen printer={printer} />
      <PrimitivesSpecimen printer={printer} />
    </PageShell>
  )
}
