import { brokenLinks } from './markdownLinks'
import { overlongFiles } from './fileLengths'
import { bad, good, type Step } from './outcome'
import { checkWith, runTool } from './tool'

const sources = [
  'app',
  'components',
  'lib',
  'db',
  'pdf',
  'scripts',
  'tests',
  'proxy.ts',
  'instrumentation.ts',
]

/** What can be said without running the code. `quick` keeps caches between runs, for developers. */
export function staticSteps(quick = false): Step[] {
  const cache = (name: string) =>
    quick ? ['--cache', '--cache-location', `node_modules/.cache/${name}`] : []
  const check = (name: string, tool: string, args: readonly string[]): Step => ({
    name,
    group: 'static',
    run: (signal) => checkWith(tool, args, signal),
  })
  return [
    check('format', 'prettier', ['--check', '.', '--log-level', 'warn', ...cache('prettier')]),
    check('lint', 'eslint', ['.', '--max-warnings', '0', ...cache('eslint/')]),
    check('who may import whom', 'depcruise', [...sources, '--config', '.dependency-cruiser.cjs']),
    check('dead code', 'knip', ['--no-progress']),
    sentences('links in README and DEVELOPERS', brokenLinks),
    sentences('length of files', overlongFiles),
  ]
}

function sentences(name: string, find: () => string[]): Step {
  return {
    name,
    group: 'static',
    run: async () => {
      const found = find()
      return found.length === 0 ? good : bad(found.join('\n'))
    },
  }
}

export const typeStep: Step = {
  name: 'types',
  group: 'types',
  run: async (signal) => {
    const routes = await runTool('next', ['typegen'], signal)
    if (routes.code !== 0) return bad(routes.output)
    return checkWith('tsc', ['--noEmit', '--incremental', 'false', '--pretty', 'false'], signal)
  },
}
