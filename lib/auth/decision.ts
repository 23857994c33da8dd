/** What a policy says: yes, or a named no. Policies are pure; `authorize` turns a no into an error. */
export type Decision =
  { allowed: true } | { allowed: false; because: 'unseen' | 'role' | 'conflict' | 'window'; sentence: string }

export const yes: Decision = { allowed: true }

/** The thing's very existence is not theirs to know. */
export const unseen = (what: string): Decision => ({ allowed: false, because: 'unseen', sentence: what })

export const no = (because: 'role' | 'conflict' | 'window', sentence: string): Decision => ({
  allowed: false,
  because,
  sentence,
})
