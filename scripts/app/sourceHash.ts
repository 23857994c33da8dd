import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs'
import { join } from 'node:path'
import { projectRoot } from '../services/folders'

const folders = ['app', 'components', 'db', 'lib', 'pdf', 'public', 'types']
const files = [
  'instrumentation.ts',
  'next.config.mjs',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tailwind.config.ts',
  'tsconfig.json',
]

/** One number for everything the built application is made of; `salt` stands for what is compiled in besides. */
export function sourceHash(salt: string): string {
  const hash = createHash('sha256').update(salt)
  const paths = [
    ...folders.flatMap(filesBelow),
    ...files.filter((file) => existsSync(join(projectRoot, file))),
  ]
  for (const path of paths) hash.update(`\n${path}\n`).update(readFileSync(join(projectRoot, path)))
  return hash.digest('hex')
}

function filesBelow(folder: string): string[] {
  const full = join(projectRoot, folder)
  if (!existsSync(full)) return []
  return readdirSync(full, { recursive: true, encoding: 'utf8' })
    .map((name) => join(folder, name))
    .filter((path) => statSync(join(projectRoot, path)).isFile())
    .sort()
}
