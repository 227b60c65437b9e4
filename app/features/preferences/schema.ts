import { z } from 'zod'
import { defaultUnits, type Units, unitChoices } from '~/features/units/units'

/** What a browser remembers of its user; nobody needs an account for it. */
export interface Preferences extends Units {
  theme: 'system' | 'light' | 'dark' | 'night'
}

export const preferenceChoices = {
  theme: {
    label: 'Light',
    options: { system: 'As the device', light: 'Day', dark: 'Dark', night: 'Night, dim red' },
  },
  ...unitChoices,
} as const satisfies {
  [Name in keyof Preferences]: { label: string; options: Record<Preferences[Name], string> }
}

export const defaultPreferences: Preferences = { theme: 'system', ...defaultUnits }

export const preferenceNames = Object.keys(preferenceChoices) as (keyof Preferences)[]

function oneOf<Name extends keyof Preferences>(name: Name) {
  const options = Object.keys(preferenceChoices[name].options) as Preferences[Name][]
  return z.enum(options, { error: `${name} must be one of ${options.join(', ')}` })
}

export const preferencesSchema = z.object({
  theme: oneOf('theme'),
  speed: oneOf('speed'),
  length: oneOf('length'),
  force: oneOf('force'),
})

/** Whatever is readable of something remembered earlier; the defaults in place of the rest. */
export function preferencesFrom(remembered: unknown): Preferences {
  const lenient = z.object({
    theme: oneOf('theme').catch(defaultPreferences.theme),
    speed: oneOf('speed').catch(defaultPreferences.speed),
    length: oneOf('length').catch(defaultPreferences.length),
    force: oneOf('force').catch(defaultPreferences.force),
  })
  return lenient.catch(defaultPreferences).parse(remembered)
}
