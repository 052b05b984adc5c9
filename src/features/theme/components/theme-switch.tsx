import { PreferenceSwitch } from '../../../components/layout/preference-switch'
import type { Theme } from '../theme'
import { ThemeIcon } from './theme-icon'

export interface ThemeSwitchProps {
  readonly theme: Theme
  /** Path and query to come back to without scripts. */
  readonly next: string
  readonly onChange?: (theme: Theme) => void
}

const options = [
  { value: 'light', label: <ThemeIcon theme="light" />, name: 'Light paper' },
  { value: 'dark', label: <ThemeIcon theme="dark" />, name: 'Dark water' },
  { value: 'system', label: <ThemeIcon theme="system" />, name: 'Light or dark as the system has it' },
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
