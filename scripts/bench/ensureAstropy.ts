import { spawnSync } from 'node:child_process'
import { mkdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { ensurePrograms } from '../services/debian'
import { Problem } from '../services/Problem'
import { PYTHON } from './independent'

/** The package with the commands brings the library; by one of them it is known to be there. */
const astropy = {
  name: 'Astropy',
  commands: ['fitsheader'],
  packages: ['python3-astropy', 'python3-scipy', 'astropy-utils'],
}

const present = () => spawnSync(PYTHON, ['-c', 'import astropy, scipy']).status === 0

/** Sees to Debian's python3-astropy, which the measurements are compared with; says so where it cannot be had. */
const logs = fileURLToPath(new URL('../../.data/logs/', import.meta.url))
if (!present()) {
  mkdirSync(logs, { recursive: true })
  try {
    await ensurePrograms([astropy], `${logs}bench-apt-get.log`)
  } catch (error) {
    if (!(error instanceof Problem)) throw error
    console.log(`${error.message} The comparison with it is skipped.`)
  }
}
