import { useFetchers, useRouteLoaderData } from 'react-router'
import { defaultPreferences, type Preferences, preferencesFrom } from './schema'

export const PREFERENCES_PATH = '/preferences'

/** What is remembered, or what was just chosen while it is being remembered. */
export function usePreferences(): Preferences {
  const root = useRouteLoaderData('root') as { preferences: Preferences } | undefined
  const chosen = useFetchers().find(
    (fetcher) => fetcher.formAction === PREFERENCES_PATH && fetcher.formData,
  )
  if (chosen?.formData) return preferencesFrom(Object.fromEntries(chosen.formData))
  return root?.preferences ?? defaultPreferences
}
