import { createCookie } from 'react-router'
import { type Preferences, preferencesFrom } from './schema'

const cookie = createCookie('preferences', {
  path: '/',
  maxAge: 365 * 24 * 60 * 60,
  sameSite: 'lax',
  httpOnly: true,
})

export async function readPreferences(request: Request): Promise<Preferences> {
  return preferencesFrom(await cookie.parse(request.headers.get('cookie')))
}

export function writePreferences(preferences: Preferences): Promise<string> {
  return cookie.serialize(preferences)
}
