import { z } from 'zod'
import { unitSystems } from '../units/systems'

export const themes = ['light', 'dark', 'system'] as const

/** What a visitor chose without an account; kept in cookies of the same names. */
export const preferencesSchema = z.strictObject({
  units: z.enum(unitSystems as ['us', 'metric'], { error: 'must be us or metric' }).optional(),
  theme: z.enum(themes, { error: 'must be light, dark or system' }).optional(),
  /** Where to go afterwards, on this site. */
  next: z.string().optional(),
})

export type Preferences = z.infer<typeof preferencesSchema>
