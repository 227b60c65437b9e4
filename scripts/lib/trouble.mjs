/** What the person at the keyboard can mend: told in one line, without a stack. */
export class Trouble extends Error {}

/** The run was asked to stop by a signal; not a fault. */
export class Stopped extends Error {
  /** @param {'SIGHUP' | 'SIGINT' | 'SIGTERM'} signal */
  constructor(signal) {
    super(`stopped by ${signal}`)
    this.signal = signal
  }
}

const diskFull = /ENOSPC|No space left on device|EDQUOT|Disk quota exceeded/i

/**
 * One line that says what went wrong, for known and unknown faults alike.
 * @param {unknown} error
 * @param {string} folder where the project writes
 */
export function inOneLine(error, folder) {
  const text = error instanceof Error ? error.message : String(error)
  const code = systemCode(error)
  if (diskFull.test(`${code} ${text} ${outputOf(error)}`)) {
    return `The disk that holds ${folder} is full. Free some space and start again.`
  }
  if (error instanceof Trouble) return flat(text)
  const path = error instanceof Error && 'path' in error ? ` (${error.path})` : ''
  if (code === 'EACCES' || code === 'EPERM') {
    return `This user may not write here: ${flat(text)}. Who made the folder, root perhaps, must start it.`
  }
  if (code === 'EROFS') return `The disk is mounted read-only${path}.`
  return flat(text)
}

/** @param {unknown} error */
export function systemCode(error) {
  return error instanceof Error && 'code' in error ? String(error.code) : ''
}

/**
 * What the program wrote whose failure this tells.
 * @param {unknown} error
 * @returns {string}
 */
function outputOf(error) {
  if (!(error instanceof Error)) return ''
  return 'output' in error ? String(error.output) : outputOf(error.cause)
}

/** @param {string} text */
function flat(text) {
  return text.replace(/\s*\n\s*/g, ' ').trim()
}
