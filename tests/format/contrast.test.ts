import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

// Broken on purpose once: --ink-muted of the day theme set to #8a90a0 fails five pairs.

const css = readFileSync(new URL('../../app/styles/tokens.css', import.meta.url), 'utf8')

function tokensOf(selector: string): Map<string, string> {
  const block = css.split(selector)[1]?.split('}')[0] ?? ''
  return new Map(
    [...block.matchAll(/--([\w-]+):\s*(#[0-9a-f]{6})/g)].map((match) => [match[1] ?? '', match[2] ?? '']),
  )
}

const themes = {
  day: tokensOf(':root {'),
  dome: tokensOf("[data-theme='dome'] {"),
  red: tokensOf("[data-theme='red'] {"),
}

/** Relative luminance and contrast ratio: WCAG 2.2, definitions of "relative luminance" and "contrast ratio". */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

function contrast(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x)
  return (high + 0.05) / (low + 0.05)
}

const grounds = ['ground', 'surface', 'tint', 'wash', 'lamp-wash']
const texts = ['ink', 'ink-muted', 'accent', 'lamp', 'feasible', 'marginal', 'not-feasible']
const filled: [string, string][] = [
  ['on-accent', 'accent'],
  ['on-accent', 'accent-hover'],
  ['on-accent', 'accent-pressed'],
  ['on-lamp', 'lamp'],
  ['ground', 'ink'],
  ['toast-ink', 'toast-ground'],
  ['night-text', 'sky-6'],
  ['night-text', 'sky-7'],
  ['s1', 'ground'],
  ['s2', 'ground'],
  ['s3', 'ground'],
  ['s4', 'ground'],
  ['s5', 'ground'],
  ['s6', 'ground'],
]

describe.each(Object.entries(themes))('theme %s', (name, tokens) => {
  const colour = (token: string) => {
    const value = tokens.get(token)
    if (!value) throw new Error(`--${token} is missing in ${name}`)
    return value
  }

  it('gives every colour that day gives', () => {
    expect([...themes.day.keys()].filter((token) => !tokens.has(token))).toEqual([])
  })

  it.each(texts.flatMap((text) => grounds.map((ground) => [text, ground] as const)))(
    'text %s on %s reaches 4.5:1',
    (text, ground) => {
      expect(contrast(colour(text), colour(ground))).toBeGreaterThanOrEqual(4.5)
    },
  )

  it.each(filled)('%s on %s reaches 4.5:1', (text, ground) => {
    expect(contrast(colour(text), colour(ground))).toBeGreaterThanOrEqual(4.5)
  })

  it.each(['ground', 'surface'])('the edge of controls reaches 3:1 on %s', (ground) => {
    expect(contrast(colour('edge'), colour(ground))).toBeGreaterThanOrEqual(3)
  })

  it.each(['ground', 'surface'])('the focus ring reaches 3:1 on %s', (ground) => {
    expect(contrast(colour('lamp'), colour(ground))).toBeGreaterThanOrEqual(3)
  })
})
