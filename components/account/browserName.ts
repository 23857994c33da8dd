const browsers: readonly (readonly [RegExp, string])[] = [
  [/Firefox\//, 'Firefox'],
  [/Edg\//, 'Edge'],
  [/Chrom(e|ium)\//, 'Chromium'],
  [/Safari\//, 'Safari'],
]
const systems: readonly (readonly [RegExp, string])[] = [
  [/Android/, 'Android'],
  [/iPhone|iPad/, 'iOS'],
  [/Windows/, 'Windows'],
  [/Mac OS X/, 'macOS'],
  [/Linux/, 'Linux'],
]

const first = (list: typeof browsers, text: string) => list.find(([shape]) => shape.test(text))?.[1]

/** A browser in two words, from what it calls itself. */
export function browserName(userAgent: string): string {
  const browser = first(browsers, userAgent) ?? 'A browser'
  const system = first(systems, userAgent)
  return system ? `${browser} on ${system}` : browser
}
