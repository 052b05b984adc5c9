import type { UnitSystem } from '#shared/units/systems'
import { PreferenceSwitch } from '../../../components/layout/preference-switch'

export interface UnitSwitchProps {
  readonly system: UnitSystem
  /** Path and query to come back to without scripts. */
  readonly next: string
  readonly onChange?: (system: UnitSystem) => void
}

const options = [
  { value: 'us', label: 'in · gal', name: 'Inches, gallons and °F (in · gal)' },
  { value: 'metric', label: 'mm · L', name: 'Millimetres, litres and °C (mm · L)' },
] as const

export function UnitSwitch({ system, next, onChange }: UnitSwitchProps) {
  return (
    <PreferenceSwitch
      preference="units"
      legend="Units"
      options={options}
      value={system}
      next={next}
      {...(onChange && { onChange })}
    />
  )
}
