import { formatList } from '@/lib/format'
import { roleInWords } from './roleInWords'

interface HeldRole {
  role: string
  call: number | null
  instrument: string | null
}

/** Roles with the calls they are held for, each role once: `reviewer, calls 12 and 13; chair, call 13`. */
export function rolesInWords(roles: readonly HeldRole[]): string {
  const calls = new Map<string, number[]>()
  const others: string[] = []
  for (const role of roles) {
    if (role.call === null || role.instrument !== null) others.push(roleInWords(role))
    else calls.set(role.role, [...(calls.get(role.role) ?? []), role.call])
  }
  const ofCalls = [...calls].map(([role, numbers]) => {
    const once = [...new Set(numbers)].sort((a, b) => a - b)
    const [only] = once
    return once.length === 1 && only !== undefined
      ? roleInWords({ role, call: only, instrument: null })
      : `${roleInWords({ role, call: null, instrument: null })}, calls ${formatList(once.map(String))}`
  })
  return [...new Set([...ofCalls, ...others])].join('; ')
}
