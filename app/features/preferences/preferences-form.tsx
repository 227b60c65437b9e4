import { useFetcher, useLocation } from 'react-router'
import { preferenceChoices, preferenceNames } from './schema'
import { PREFERENCES_PATH, usePreferences } from './use-preferences'

/** Light and units; takes effect at once with JavaScript and by its button without. */
export function PreferencesForm() {
  const fetcher = useFetcher({ key: PREFERENCES_PATH })
  const preferences = usePreferences()
  const { pathname, search } = useLocation()
  return (
    <fetcher.Form
      method="post"
      action={PREFERENCES_PATH}
      className="flex flex-wrap items-end gap-x-6 gap-y-3 md:justify-end"
      onChange={(event) => {
        const chosen = new FormData(event.currentTarget)
        chosen.delete('back')
        fetcher.submit(chosen, { method: 'post', action: PREFERENCES_PATH })
      }}
    >
      <input type="hidden" name="back" value={`${pathname}${search}`} />
      {preferenceNames.map((name) => {
        const { label, options } = preferenceChoices[name]
        return (
          <label key={name} className="grid gap-1 text-note text-ink-soft">
            {label}
            <select
              name={name}
              value={preferences[name]}
              onChange={() => undefined}
              className="h-touch border-b border-ink pl-1 text-body font-strong text-ink"
            >
              {Object.entries(options).map(([value, text]) => (
                <option key={value} value={value}>
                  {text}
                </option>
              ))}
            </select>
          </label>
        )
      })}
      <noscript>
        <button type="submit" className="h-touch border border-ink px-4 text-body">
          Use these
        </button>
      </noscript>
    </fetcher.Form>
  )
}
