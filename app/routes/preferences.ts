import { data, redirect } from 'react-router'
import { writePreferences } from '~/features/preferences/cookie.server'
import { preferencesSchema } from '~/features/preferences/schema'
import type { Route } from './+types/preferences'

export function loader() {
  return redirect('/')
}

export async function action({ request }: Route.ActionArgs) {
  const form = await request.formData()
  const chosen = preferencesSchema.safeParse(Object.fromEntries(form))
  if (!chosen.success) {
    return data({ problems: chosen.error.issues.map((issue) => issue.message) }, { status: 400 })
  }
  const headers = { 'set-cookie': await writePreferences(chosen.data) }
  const back = form.get('back')
  return back === null
    ? data({ problems: [] }, { headers })
    : redirect(pathHere(back, request), { headers })
}

/** Only ever back to a page of this site. */
function pathHere(back: FormDataEntryValue, request: Request): string {
  const here = new URL(request.url)
  const url = typeof back === 'string' && URL.canParse(back, here) ? new URL(back, here) : here
  return url.origin === here.origin && url.pathname !== here.pathname
    ? `${url.pathname}${url.search}`
    : '/'
}
