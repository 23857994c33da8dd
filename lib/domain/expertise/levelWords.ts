/** Levels of knowing a category, by number; 0 is not kept. */
export const levelWords = ['Not my field', 'I know it', 'I work in it', 'My main field'] as const

/** A category as the name of a field in a form. */
export const categoryKey = (category: string) =>
  category
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '')
