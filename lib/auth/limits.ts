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

/** Five tries a quarter of an hour for an account from one address, thirty for the address: the owner is never locked out. */
export async function limitSignIn(email: string, address: string): Promise<void> {
  await spend('sign-in-account', `${email.toLowerCase()}|${address}`, 5, 15 * minutes)
  await spend('sign-in-address', address, 30, 15 * minutes)
}
