/** Links in text: accent, underlined, thicker under the pointer. */
export const linkClasses =
  'text-accent underline decoration-1 underline-offset-4 [text-decoration-skip-ink:none] hover:decoration-2'
