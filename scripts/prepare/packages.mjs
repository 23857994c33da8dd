import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { npmCi } from './npmCi.mjs'

const root = fileURLToPath(new URL('../../', import.meta.url))

/** Runs `npm ci` when node_modules is missing or differs from the lock; two tries, for slow networks. */
export async function installPackages() {
  if (installedMatchesLock(root)) return
  console.log('Installing the npm packages (one to three minutes the first time) ...')
  const started = Date.now()
  for (let attempt = 1; attempt <= 2; attempt += 1) {
    const { code, output } = await npmCi(root)
    if (code === 0) {
      console.log(`npm packages installed in ${Math.round((Date.now() - started) / 1000)} s.`)
      return
    }
    const { networkTrouble, message, remedy } = explain(output)
    if (networkTrouble && attempt === 1) {
      console.log('The network did not answer in time; trying once more ...')
      continue
    }
    throw problem(message, remedy, output)
  }
}

/** npm writes node_modules/.package-lock.json last, so a half-finished install never matches. */
export function installedMatchesLock(folder) {
  const hidden = join(folder, 'node_modules', '.package-lock.json')
  if (!existsSync(hidden)) return false
  try {
    const wanted = JSON.parse(readFileSync(join(folder, 'package-lock.json'), 'utf8')).packages
    const present = JSON.parse(readFileSync(hidden, 'utf8')).packages
    return Object.entries(wanted).every(([path, entry]) => {
      if (path === '' || entry.link) return true
      const found = present[path]
      if (!found) return entry.optional === true
      return found.version === entry.version
    })
  } catch {
    return false
  }
}

function explain(output) {
  if (/ENOENT.*npm|spawn npm/.test(output)) {
    return { message: 'npm was not found.', remedy: 'Install npm (it comes with Node 20), then run again.' }
  }
  if (/EAI_AGAIN|ENOTFOUND|ETIMEDOUT|ECONNRESET|ECONNREFUSED|ERR_SOCKET_TIMEOUT|network/i.test(output)) {
    return {
      networkTrouble: true,
      message: 'The npm registry could not be reached.',
      remedy: 'Check the network or the proxy (`npm config get registry`, `npm ping`), then run again.',
    }
  }
  if (/ENOSPC/.test(output)) {
    return { message: 'The disk is full.', remedy: 'Free about 1 GB where the project lies, then run again.' }
  }
  if (/EACCES|EPERM/.test(output)) {
    return {
      message: 'npm may not write into node_modules.',
      remedy: 'Run as the owner of the project folder, or give it to yourself with chown, then run again.',
    }
  }
  if (/EUSAGE|in sync/.test(output)) {
    return {
      message: 'package-lock.json does not fit package.json.',
      remedy: 'Restore both files from git, or run `npm install` if you changed a dependency on purpose.',
    }
  }
  return { message: 'npm ci failed.', remedy: 'Read the npm output above, put that right, then run again.' }
}

function problem(message, remedy, output) {
  const logs = join(root, '.data', 'logs')
  mkdirSync(logs, { recursive: true })
  const file = join(logs, 'npm-ci.log')
  writeFileSync(file, output)
  const error = new Error(`${message} (npm ci; all of its output is in .data/logs/npm-ci.log)`)
  error.remedy = remedy
  const noise = /^npm (info|http (?!.*failed with)|warn EBADENGINE)/
  error.details = output
    .split('\n')
    .filter((line) => line.trim() && !noise.test(line))
    .slice(-8)
  return error
}
