import { spawn } from 'node:child_process'

const patience = [
  '--fetch-timeout=120000',
  '--fetch-retries=3',
  '--fetch-retry-factor=3',
  '--fetch-retry-mintimeout=2000',
]

/** Runs `npm ci` in the folder; resolves with its exit code and all it said, and never rejects. */
export function npmCi(folder) {
  const args = [
    'ci',
    '--include=dev',
    '--prefer-offline',
    '--no-audit',
    '--no-fund',
    '--loglevel=http',
    ...patience,
  ]
  return new Promise((resolve) => {
    const child = spawn('npm', args, { cwd: folder, stdio: ['ignore', 'pipe', 'pipe'] })
    let output = ''
    let answered = 0
    let unanswered = 0
    const collect = (chunk) => {
      const text = String(chunk)
      output += text
      answered += text.match(/fetch GET 200/g)?.length ?? 0
      unanswered += text.match(/attempt \d+ failed with/g)?.length ?? 0
      // Without a network npm would try each of a thousand packages for half a minute.
      if (unanswered > 40 && unanswered > answered) child.kill('SIGTERM')
    }
    child.stdout.on('data', collect)
    child.stderr.on('data', collect)
    child.on('error', (error) => resolve({ code: 1, output: `${output}${error.message}` }))
    child.on('close', (code) => resolve({ code: code ?? 1, output }))
  })
}
