import { expect } from 'vitest'
import { Refusal } from '@/lib/errors'

/** The refusal a piece of work ends in; anything else fails the test. */
export async function refused(work: Promise<unknown>): Promise<Refusal> {
  try {
    await work
  } catch (error) {
    if (error instanceof Refusal) return error
    throw error
  }
  return expect.fail('it was not refused')
}
