const longest = 24

/** A label from the name of a file, which no figure has yet: `field-map`, `field-map-2`. */
export function figureLabel(fileName: string, taken: readonly string[]): string {
  const plain = fileName
    .replace(/\.[^.]*$/, '')
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, longest)
    .replace(/-+$/, '')
  const label = plain || 'figure'
  if (!taken.includes(label)) return label
  let number = 2
  while (taken.includes(`${label}-${number}`)) number += 1
  return `${label}-${number}`
}
