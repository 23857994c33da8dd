import type { Written } from '@/lib/writing/tree'

/** A letter before it is set: plain data, so that text, HTML and previews agree. */
export interface Letter {
  template: string
  subject: string
  greeting: string
  paragraphs: readonly string[]
  /** A text the office wrote, after the paragraphs. */
  blocks?: Written
  facts?: readonly (readonly [label: string, value: string])[]
  action?: { label: string; url: string }
  closing?: string
  /** Number of the invoice or credit note that goes with it as PDF. */
  attachment?: string
}
