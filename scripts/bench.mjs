import { spawnSync } from 'node:child_process'
import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

/** Runs every measurement of scripts/bench and prints what each took, and the ratio to an independent library. */
const folder = fileURLToPath(new URL('./bench/', import.meta.url))
const files = readdirSync(folder).filter((name) => name.endsWith('.bench.ts'))
const rows = []
spawnSync('npx', ['tsx', `${folder}ensureAstropy.ts`], { stdio: 'inherit' })
let failed = false

for (const file of files.sort()) {
  const run = spawnSync('npx', ['tsx', folder + file], { encoding: 'utf8' })
  if (run.status !== 0) {
    failed = true
    process.stderr.write(`${file} did not finish:\n${run.stderr}\n`)
    continue
  }
  for (const line of run.stdout.trim().split('\n')) rows.push(JSON.parse(line))
}

const head = { name: 'measured', ours: 'here', theirs: 'independent', ratio: 'times as fast' }
const cells = [head, ...rows].map((row) => [row.name, row.ours, row.theirs, row.ratio])
const widths = [0, 1, 2, 3].map((i) => Math.max(...cells.map((row) => row[i].length)))
for (const row of cells) {
  const [name, ...numbers] = row
  const padded = numbers.map((cell, i) => cell.padStart(widths[i + 1]))
  process.stdout.write(`${name.padEnd(widths[0])}  ${padded.join('  ')}\n`)
}
process.exitCode = failed ? 1 : 0
