import { processStat } from './processes.mjs'

const controller = new AbortController()

/** Aborted, with the signal as its reason, once the run was asked to stop. */
export const stopRequested = controller.signal

/**
 * From now on a signal asks the run to stop and does not end it. A terminal sends its signal to
 * the whole group and npm passes it on again, so a second one says nothing new.
 */
export function listenForSignals() {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => controller.abort(signal))
  }
  stopWithNpm()
}

/** npm that was killed outright passes no signal on: its script would go on without it. */
function stopWithNpm() {
  if (process.env.npm_lifecycle_event === undefined) return
  const npm = npmAbove()
  const watch = setInterval(() => {
    if (npmAbove() === npm) return
    clearInterval(watch)
    controller.abort('SIGTERM')
  }, 500)
  watch.unref()
}

/** The process that started this one, past the shell that npm puts between. */
function npmAbove() {
  const parent = processStat(process.ppid)
  return parent?.name === 'sh' ? parent.parent : process.ppid
}

/** @returns {Promise<void>} */
export function untilStopRequested() {
  return new Promise((resolve) => {
    if (stopRequested.aborted) resolve()
    else stopRequested.addEventListener('abort', () => resolve())
  })
}
