import { classNames } from '@/components/ui/classNames'

/** The box of every one-line control: 40 px, 44 on phones, a heavier border when wrong. */
export function controlClasses(wrong: boolean, off: boolean): string {
  return classNames(
    'box-border min-h-10 w-full rounded border px-3 text-body text-ink max-sm:min-h-11',
    wrong
      ? 'border-2 border-not-feasible bg-surface'
      : off
        ? 'border-dashed border-edge bg-tint text-muted'
        : 'border-edge bg-surface',
  )
}
