import { hash, verify } from '@node-rs/argon2'

// argon2id (the library's default), 19 MiB and two passes: OWASP's figures for interactive sign-in.
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

let dummyHash: Promise<string> | undefined
let queue: Promise<unknown> = Promise.resolve()

// Each check takes 19 MiB and a core: one after the other, so that a flood of sign-ins cannot take the machine.
function inTurn<T>(work: () => Promise<T>): Promise<T> {
  const result = queue.then(work, work)
  queue = result.catch(() => undefined)
  return result
}

export function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password, cost))
}

/** Checks a password; an unknown account costs the same time as a wrong password. */
export async function passwordMatches(stored: string | null, password: string): Promise<boolean> {
  dummyHash ??= hashPassword('an account that does not exist')
  const against = stored ?? (await dummyHash)
  const matches = await inTurn(() => verify(against, password))
  return matches && stored !== null
}
