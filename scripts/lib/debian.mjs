import { existsSync } from 'node:fs'
import { logPath, ProgramFailed, run } from './programs.mjs'
import { Trouble } from './trouble.mjs'

export const isRoot = process.getuid?.() === 0

/**
 * Installs a Debian package, for who may; everyone else is told what to install.
 * @param {string} name
 * @param {string} what it is, for people
 * @param {(what: string) => void} say
 */
export async function installPackage(name, what, say) {
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Trouble(`${what} is needed, and this system has no apt-get to install it with.`)
  }
  if (!isRoot) {
    throw new Trouble(
      `${what} is needed and not installed. Install it with: sudo apt-get install ${name}`,
    )
  }
  say(`installing Debian's ${name}`)
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' }
  const waiting = ['-o', 'DPkg::Lock::Timeout=300', '-qq']
  try {
    await run('apt-get', [...waiting, 'update'], { env, log: `debian-${name}`, shielded: true })
    const install = ['install', '-y', '--no-install-recommends', name]
    await run('apt-get', [...waiting, ...install], { env, log: `debian-${name}`, shielded: true })
  } catch (error) {
    if (!(error instanceof ProgramFailed)) throw error
    throw new Trouble(
      `${what} was not installed: ${error.reason(/^E: /)}. All apt-get wrote: ${logPath(`debian-${name}`)}`,
      { cause: error },
    )
  }
}
