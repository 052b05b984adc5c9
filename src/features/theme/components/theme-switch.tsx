import { Monitor, Moon, Sun } from 'lucide-react'
import { PreferenceSwitch } from '../../../components/layout/preference-switch'
import type { Theme } from '../theme'

export interface ThemeSwitchProps {
  readonly theme: Theme
  /** Path and query to come back to without scripts. */
  readonly next: string
  readonly onChange?: (theme: Theme) => void
}

const options = [
  { value: 'light', label: <Sun size={15} aria-hidden="true" />, name: 'Light paper' },
  { value: 'dark', label: <Moon size={15} aria-hidden="true" />, name: 'Dark water' },
  { value: 'system', label: <Monitor size={15} aria-hidden="true" />, name: 'Light or dark as the system has it' },
] as const

export function ThemeSwitch({ theme, next, onChange }: ThemeSwitchProps) {
  return (
    <PreferenceSwitch
      preference="theme"
      legend="Theme"
      options={options}
      value={theme}
      next={next}
      {...(onChange && { onChange })}
    />
  )
}
