import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { projectRoot } from '../services/folders'

const folders = ['app', 'components', 'db', 'lib', 'pdf', 'scripts', 'tests', 'types']
const longest = 250
const median = 60
const isSource = /\.(ts|tsx|mjs|css)$/
// Tables of numbers, names and places are as long as they are; the row types are written by a program.
// Tests are tables and journeys read in order; they are split by noun, not by length.
const isData = /^tests\/|(^|\/)(data|fixtures)\/|[.]?[dD]ata\.ts$|^db\/tables\.ts$/

/** Files that have grown too long, and the median when it has, as sentences. */
export function overlongFiles(root = projectRoot): string[] {
  const lengths = folders
    .flatMap((folder) => sourcesBelow(root, folder))
    .filter((path) => !isData.test(path))
    .map((path) => ({ path, lines: readFileSync(join(root, path), 'utf8').trimEnd().split('\n').length }))
    .sort((a, b) => a.lines - b.lines)
  const middle = lengths[Math.floor(lengths.length / 2)]?.lines ?? 0
  const long = lengths
    .filter(({ lines }) => lines > longest)
    .map(({ path, lines }) => `${path} has ${lines} lines; ${longest} are allowed. Split it by ideas.`)
  return middle >= median
    ? [...long, `The median file has ${middle} lines; it is kept below ${median}.`]
    : long
}

function sourcesBelow(root: string, folder: string): string[] {
  try {
    return readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
      .filter((name) => isSource.test(name))
      .map((name) => join(folder, name))
  } catch {
    return []
  }
}
