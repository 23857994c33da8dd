import { z } from 'zod'
import { unknownMember } from './unknownMember'

/** An object that holds these members and no others: a misspelt optional one would otherwise pass unseen. */
export function exactly<S extends z.core.$ZodLooseShape>(shape: S) {
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === 'unrecognized_keys' ? unknownMember(issue.keys) : 'Give an object of JSON.',
  })
}
