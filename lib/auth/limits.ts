import 'server-only'
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible'
import { env } from '@/lib/env'
import { refuse } from '@/lib/errors'

const minutes = 60

// Tests sign in hundreds of times from one address; the limits themselves are tested with their real figures.
const generous = () => (env().NOCTUARY_MODE === 'test' ? 1000 : 1)

const kept = new Map<string, RateLimiterMemory>()

/** Takes one from an allowance of `points` in `seconds`; refuses with the time to wait when it is used up. */
export async function spend(name: string, key: string, points: number, seconds: number): Promise<void> {
  let limiter = kept.get(name)
  if (!limiter) {
    limiter = new RateLimiterMemory({ keyPrefix: name, points: points * generous(), duration: seconds })
    kept.set(name, limiter)
  }
  try {
    await limiter.consume(key)
  } catch (error) {
    if (error instanceof RateLimiterRes) throw refuse.tooMany(Math.ceil(error.msBeforeNext / 1000))
    throw error
  }
}

/** Gives back what a try took that turned out well. */
async function giveBack(name: string, key: string): Promise<void> {
  await kept.get(name)?.reward(key, 1)
}

const accountKey = (email: string, address: string) => `${email.toLowerCase()}|${address}`

/**
 * Five failures a quarter of an hour for an account from one address, thirty for the address: the owner is never
 * locked out from elsewhere, and whoever knows the password may sign in as often as they like.
 */
export async function limitSignIn(email: string, address: string): Promise<void> {
  await spend('sign-in-account', accountKey(email, address), 5, 15 * minutes)
  await spend('sign-in-address', address, 30, 15 * minutes)
}

/** A sign-in went well: it counts against nobody, and earlier slips of this account are forgotten. */
export async function forgiveSignIn(email: string, address: string): Promise<void> {
  await kept.get('sign-in-account')?.delete(accountKey(email, address))
  await giveBack('sign-in-address', address)
}
