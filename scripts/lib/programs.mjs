import { spawn } from 'node:child_process'
import { mkdirSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { stripVTControlCharacters } from 'node:util'
import { root } from './root.mjs'
import { stopRequested } from './signals.mjs'
import { Stopped } from './trouble.mjs'

/** How long a program that is told to stop may take; npm would finish installing first. */
const patienceMs = 2000

/** A program that ended with another code than 0, and what it wrote. */
export class ProgramFailed extends Error {
  /**
   * @param {string} program
   * @param {number | null} code
   * @param {string} output
   */
  constructor(program, code, output) {
    super(`${program} ended with code ${code}`)
    this.output = output
  }

  /**
   * The first line that tells the reason, without the mark it is known by.
   * @param {RegExp} mark
   */
  reason(mark) {
    const lines = this.output.split('\n').filter((line) => line.trim() !== '')
    const telling = lines.find((line) => mark.test(line)) ?? lines.at(-1)
    return telling?.replace(mark, '').trim() || this.message
  }
}

/**
 * Runs a program to its end and gives what it wrote to both outputs.
 * @param {string} program
 * @param {string[]} args
 * @param {{
 *   cwd?: string, env?: NodeJS.ProcessEnv, show?: boolean, log?: string, shielded?: boolean,
 * }} [options] `show` passes its output on; `log` keeps it under that name in `.local/log`;
 *   `shielded` lets what must not be broken off half way come to its end first
 * @returns {Promise<string>}
 */
export function run(program, args, options = {}) {
  const { cwd = root, env = process.env, show = false, shielded = false, log } = options
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd,
      env,
      detached: shielded,
      stdio: ['ignore', 'pipe', 'pipe'],
    })
    let output = ''
    for (const stream of /** @type {const} */ (['stdout', 'stderr'])) {
      child[stream].setEncoding('utf8').on('data', (text) => {
        output += stripVTControlCharacters(text)
        if (show) process[stream].write(text)
      })
    }
    const stop = () => {
      child.kill('SIGTERM')
      setTimeout(() => child.kill('SIGKILL'), patienceMs).unref()
    }
    if (!shielded) stopRequested.addEventListener('abort', stop)
    if (!shielded && stopRequested.aborted) stop()
    child.on('error', reject)
    child.on('close', (code) => {
      stopRequested.removeEventListener('abort', stop)
      try {
        if (log !== undefined) keepLog(log, output)
      } catch (error) {
        return reject(error)
      }
      if (stopRequested.aborted && !shielded) reject(new Stopped(stopRequested.reason))
      else if (code === 0) resolve(output)
      else reject(new ProgramFailed(program, code, output))
    })
  })
}

/** @param {string} name */
export const logPath = (name) => join(root, '.local', 'log', `${name}.log`)

/**
 * @param {string} name
 * @param {string} output
 */
function keepLog(name, output) {
  mkdirSync(join(root, '.local', 'log'), { recursive: true })
  writeFileSync(logPath(name), output)
}
