import { accessSync, constants, existsSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { Problem } from './Problem'
import { runToEnd, type RunResult } from './runToEnd'

/** A program that comes from Debian's packages. */
export interface Program {
  /** What people call it. */
  name: string
  /** Any of these commands will do. */
  commands: readonly string[]
  packages: readonly string[]
}

export const programs = {
  // The -core packages bring the server without a system service: nothing starts at boot, nothing takes port 3306.
  mariadb: {
    name: 'MariaDB',
    commands: ['mariadbd'],
    packages: ['mariadb-server-core', 'mariadb-client-core'],
  },
  chromium: { name: 'Chromium', commands: ['chromium', 'chromium-browser'], packages: ['chromium'] },
  pdftotext: { name: 'pdftotext', commands: ['pdftotext'], packages: ['poppler-utils'] },
} satisfies Record<string, Program>

const usualFolders = ['/usr/local/sbin', '/usr/local/bin', '/usr/sbin', '/usr/bin', '/sbin', '/bin']

/** The path of a command, also from the sbin folders that ordinary users do not have on their PATH. */
export function findCommand(commands: readonly string[]): string | undefined {
  const folders = [...(process.env.PATH ?? '').split(':').filter(Boolean), ...usualFolders]
  for (const command of commands) {
    const found = folders.map((folder) => join(folder, command)).find(isExecutable)
    if (found) return found
  }
  return undefined
}

function isExecutable(path: string): boolean {
  try {
    accessSync(path, constants.X_OK)
    return true
  } catch {
    return false
  }
}

/** Installs whatever is missing with apt-get, in one go, as root or through sudo. */
export async function ensurePrograms(wanted: readonly Program[], logFile: string): Promise<void> {
  const missing = wanted.filter((program) => !findCommand(program.commands))
  if (missing.length === 0) return
  const names = missing.map((program) => program.name).join(', ')
  const packages = missing.flatMap((program) => program.packages)
  const byHand = `sudo apt-get install --no-install-recommends ${packages.join(' ')}`
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Problem(
      `${names} is missing, and this system has no apt-get to install it with.`,
      `Install ${names} by the system's own means so that \`${missing[0]?.commands[0]}\` is found, then run again.`,
    )
  }
  console.log(`Installing ${names} from the system's packages (${packages.join(' ')}) ...`)
  let result = await aptGet(['install', ...packages], byHand)
  let output = result.output
  if (result.code !== 0) {
    // Fresh images have no package lists, old ones have lists whose files have gone: fetch them and try again.
    const update = await aptGet(['update'], byHand)
    result = await aptGet(['install', ...packages], byHand)
    output += update.output + result.output
  }
  writeFileSync(logFile, output)
  if (result.code === 0 && missing.every((program) => findCommand(program.commands))) return
  if (/sudo: .*(password|terminal)|not in the sudoers/.test(output)) {
    throw new Problem(
      `${names} has to be installed, and this user may not use sudo without a password.`,
      `Run in a terminal, where sudo can ask, or as root; or install by hand with \`${byHand}\`, then run again.`,
    )
  }
  throw new Problem(
    `${names} could not be installed.`,
    `Check the network and the package sources, or install by hand with \`${byHand}\`, then run again.`,
    output.trim().split('\n').slice(-8),
  )
}

async function aptGet(args: readonly string[], byHand: string): Promise<RunResult> {
  const settings = [
    '-y',
    '-q',
    '--no-install-recommends',
    '-o',
    'DPkg::Lock::Timeout=180',
    '-o',
    'Acquire::Retries=3',
  ]
  const command = ['DEBIAN_FRONTEND=noninteractive', 'apt-get', ...settings, ...args]
  const isRoot = process.getuid?.() === 0
  if (isRoot) return runToEnd({ command: 'env', args: command })
  if (!findCommand(['sudo'])) {
    throw new Problem(
      'A package has to be installed, and this user is neither root nor has sudo.',
      `Ask for \`${byHand}\`, then run again.`,
    )
  }
  const canAsk = process.stdin.isTTY === true
  const withSudo = canAsk ? ['env', ...command] : ['-n', 'env', ...command]
  return runToEnd({ command: 'sudo', args: withSudo, lendTerminal: canAsk })
}
