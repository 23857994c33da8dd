import { z } from 'zod'

/** An object that holds these members and no others: a misspelt optional one would otherwise pass unseen. */
export function exactly<S extends z.core.$ZodLooseShape>(shape: S) {
  return z.strictObject(shape, {
    error: (issue) =>
      issue.code === 'unrecognized_keys'
        ? `Nothing here is called “${(issue.keys[0] ?? '').slice(0, 40)}”.`
        : 'Give an object of JSON.',
  })
}
