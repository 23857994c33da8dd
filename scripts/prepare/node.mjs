/** The range package.json asks for; Node 22 works in part, but is not what the tests run on. */
export function checkNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number)
  if (major === 20 && minor >= 11) return
  const problem = new Error(`Noctuary runs on Node 20 (20.11 or later); this is Node ${version}.`)
  problem.remedy = 'Install Node 20, check it with `node --version`, and run the command again.'
  throw problem
}
