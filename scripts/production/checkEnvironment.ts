import { forbidden, optional, required } from './requirements'

export interface EnvironmentReport {
  /** One sentence for each setting that stands in the way. */
  faults: string[]
  /** What may be meant, but should be known. */
  warnings: string[]
}

/** Judges the settings of a production start; `demoSecrets` are values no production may share. */
export function checkEnvironment(
  env: Record<string, string | undefined>,
  demoSecrets: ReadonlySet<string> = new Set(),
): EnvironmentReport {
  const faults: string[] = []
  const warnings: string[] = []
  const mode = env.NOCTUARY_MODE
  if (mode !== undefined && mode !== 'production') {
    faults.push(`NOCTUARY_MODE is "${mode}"; leave it out, or set it to "production".`)
  }
  for (const { name, purpose, check } of required) {
    const value = env[name]?.trim() ?? ''
    const fault =
      value === '' ? 'is missing' : demoSecrets.has(value) ? 'is a secret of the demo' : check(value)
    if (fault) faults.push(`${name} ${fault}. It is ${asNoun(purpose)}.`)
  }
  for (const { name, purpose, check } of optional) {
    const value = env[name]
    const fault = value === undefined || value === '' ? null : check(value)
    if (fault) faults.push(`${name} ${fault}. It is ${asNoun(purpose)}.`)
  }
  for (const { name, purpose } of forbidden) {
    if (env[name]) faults.push(`${name} is set, but it belongs to the demo: it ${purpose}. Unset it.`)
  }
  if (/^(sk|rk)_test_/.test(env.STRIPE_SECRET_KEY ?? '') && env.STRIPE_SECRET_KEY !== 'sk_test_demo') {
    warnings.push('STRIPE_SECRET_KEY is a test key: no money will move.')
  }
  return { faults, warnings }
}

/** "It is ..." wants a noun: what signs the sessions, the database. */
function asNoun(purpose: string): string {
  return /^(proves|keeps|signs)\b/.test(purpose) ? `what ${purpose}` : purpose
}
