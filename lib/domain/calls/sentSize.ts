import { countInWords, formatHoursFromSeconds, formatNumber } from '@/lib/format'
import type { CallKind } from './types'

/** How long and how large one proposal is that was sent. */
export interface SentSize {
  kindId: number
  /** Panel it went to. */
  panelId: number | null
  /** Of a justification sent as a document; else 0. */
  pages: number
  /** Of one written here, and its figures; else 0. */
  words: number
  figures: number
  targets: number
  /** Characters. */
  abstractLength: number
  askedSeconds: number
}

/** Limits are typed in tenths of an hour: the least that is not below. */
const tenthUp = (seconds: number) => Math.ceil(seconds / 360) * 360

type Limits = Pick<
  CallKind,
  'pageLimit' | 'wordLimit' | 'figureLimit' | 'targetLimit' | 'abstractLimit' | 'maxSeconds'
>

const measures: readonly [
  field: 'pageLimit' | 'wordLimit' | 'figureLimit' | 'targetLimit' | 'abstractLimit' | 'maxHours',
  limit: (limits: Limits) => number | null,
  size: (sent: SentSize) => number,
  words: (size: number) => string,
][] = [
  ['pageLimit', (k) => k.pageLimit, (s) => s.pages, (n) => countInWords(n, 'page')],
  ['wordLimit', (k) => k.wordLimit, (s) => s.words, (n) => `${formatNumber(n, 0)} words`],
  ['figureLimit', (k) => k.figureLimit, (s) => s.figures, (n) => countInWords(n, 'figure')],
  ['targetLimit', (k) => k.targetLimit, (s) => s.targets, (n) => countInWords(n, 'target')],
  [
    'abstractLimit',
    (k) => k.abstractLimit,
    (s) => s.abstractLength,
    (n) => `${formatNumber(n, 0)} characters of abstract`,
  ],
  ['maxHours', (k) => k.maxSeconds, (s) => s.askedSeconds, (n) => formatHoursFromSeconds(tenthUp(n))],
]

/** Limits that proposals already sent go beyond, each with how many and how far; by the field of the limit. */
export function brokenLimits(limits: Limits, sent: readonly SentSize[]): Record<string, string> {
  const broken: Record<string, string> = {}
  for (const [field, limitOf, sizeOf, words] of measures) {
    const limit = limitOf(limits)
    if (limit === null) continue
    const over = sent.map(sizeOf).filter((size) => size > limit)
    if (over.length === 0) continue
    const has = over.length === 1 ? 'has' : 'have'
    const largest = words(Math.max(...over))
    broken[field] =
      `${countInWords(over.length, 'proposal', 'proposals', true)} sent ${has} more: the limit cannot fall below ${largest}.`
  }
  return broken
}
