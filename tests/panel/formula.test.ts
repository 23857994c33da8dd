import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readFormula } from '@/lib/panel/formula/readFormula'

const names = ['mean', 'merit', 'spread', 'reviews', 'hours']
const given = { mean: 7.5, merit: 7, spread: 0.5, reviews: 4, hours: 20 }
const value = (text: string, quantities: Record<string, number | null> = given) => {
  const formula = readFormula(text, names)
  if ('why' in formula) throw new Error(formula.why)
  return formula.valueOf(quantities)
}
const why = (text: string) => {
  const formula = readFormula(text, names)
  return 'why' in formula ? formula.why : null
}

describe('readFormula', () => {
  it.each([
    ['mean', 7.5],
    ['0.5 * mean + 0.5 * merit', 7.25],
    ['mean - 2 * spread / sqrt(reviews)', 7],
    ['-mean + 2^3^2', 504.5],
    ['max(mean, merit, 8) - min(spread, 1)', 7.5],
    ['(merit + 1) * 1e1 / hours', 4],
    ['log(exp(merit))', 7],
    ['mean %', 0.075],
  ])('%s is %s', (text, expected) => {
    expect(value(text)).toBeCloseTo(expected, 12)
  })

  it('has no value where it divides by zero, has no root, or a quantity is missing', () => {
    expect(value('mean / (reviews - 4)')).toBeNull()
    expect(value('sqrt(0 - mean)')).toBeNull()
    expect(value('exp(1000 * mean)')).toBeNull()
    expect(value('mean + spread', { ...given, spread: null })).toBeNull()
    expect(value('mean', { ...given, spread: null })).toBe(7.5)
  })

  it.each([
    'process.exit()',
    'import("fs")',
    'eval("1")',
    'mean.constructor',
    'mean["constructor"]',
    'constructor',
    '__proto__',
    'toString',
    'toString()',
    'hasOwnProperty(mean)',
    'cos(mean)',
    'sum([mean, merit])',
    'random()',
    'parse("1")',
    'f(x) = x',
    'mean = 3',
    'mean; merit',
    'mean\nmerit',
    '[mean, merit]',
    '{a: mean}',
    '"mean"',
    'mean > 3 ? 1 : 2',
    'mean > 3',
    'mean!',
    'mean % 3',
    'mean mod 3',
    'mean and merit',
    '5 cm',
    '2 mean',
    'mean(3)',
    'mean to merit',
    'mean[1]',
    '1:3',
    'true',
    'null',
    'NaN',
    'Infinity',
    'i',
    'pi',
    'sqrt()',
    'sqrt(mean, merit)',
    '1e999 * mean',
    '(mean',
    'mean +',
    '',
    '   ',
    '#',
    'min',
    '(() => 1)()',
  ])('refuses %j in a sentence', (text) => {
    expect(why(text)).toMatch(/^\S.*[.:]$/s)
  })

  it('refuses what is too long, too deep or too large', () => {
    expect(why('1+'.repeat(200))).toMatch(/characters/)
    expect(why(`${'('.repeat(140)}mean${')'.repeat(140)}`)).toMatch(/parts/)
    expect(why(Array.from({ length: 60 }, () => 'mean').join('+'))).toMatch(/parts/)
  })

  it('names what it uses, each once', () => {
    expect(readFormula('mean + merit * mean', names)).toMatchObject({ names: ['mean', 'merit'] })
  })

  it('computes as arithmetic does, whatever the tree', () => {
    const leaf = fc.oneof(
      fc
        .constantFrom(...names)
        .map((name) => ({ text: name, run: (q: typeof given) => q[name as keyof typeof given] })),
      fc.integer({ min: 0, max: 99 }).map((n) => ({ text: String(n), run: () => n })),
    )
    const { tree } = fc.letrec<{ tree: { text: string; run: (q: typeof given) => number } }>((tie) => ({
      tree: fc.oneof(
        { maxDepth: 3, depthSize: 'small' },
        leaf,
        fc.tuple(tie('tree'), fc.constantFrom('+', '-', '*', '/'), tie('tree')).map(([a, sign, b]) => ({
          text: `(${a.text} ${sign} ${b.text})`,
          run: (q: typeof given) => {
            const [x, y] = [a.run(q), b.run(q)]
            return sign === '+' ? x + y : sign === '-' ? x - y : sign === '*' ? x * y : x / y
          },
        })),
      ),
    }))
    fc.assert(
      fc.property(tree, ({ text, run }) => {
        fc.pre(text.length <= 300)
        const expected = run(given)
        expect(value(text)).toBe(Number.isFinite(expected) ? expected : null)
      }),
      { seed: 14, numRuns: 300 },
    )
  })
})
