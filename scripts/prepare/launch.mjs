// Plain Node, no packages: this runs before anything is installed.
import { stripVTControlCharacters } from 'node:util'
import { checkNode } from './node.mjs'
import { installPackages } from './packages.mjs'

/**
 * Makes sure Node and the npm packages fit, then hands over to a TypeScript program.
 * @param {() => Promise<{ main: (args: string[]) => Promise<number> }>} load imports the program, once tsx can read it
 * @param {() => void} [afterFailure] the last word when the program could not run to its end
 */
export async function launch(load, afterFailure = () => undefined) {
  try {
    checkNode()
    await installPackages()
    const { register } = await import('tsx/esm/api')
    register()
    const { main } = await load()
    process.exitCode = await main(process.argv.slice(2))
  } catch (error) {
    report(error)
    afterFailure()
    process.exitCode = 1
  }
}

/** Cause and remedy when we know them; the whole trace only when we do not. */
function report(error) {
  const remedy = error?.remedy
  if (!remedy) {
    console.error(error)
    return
  }
  console.error(`\n  ${error.message}`)
  for (const line of error.details ?? []) console.error(`    | ${stripVTControlCharacters(line)}`)
  console.error(`  ${remedy}\n`)
}
