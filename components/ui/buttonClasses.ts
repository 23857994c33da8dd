import { classNames } from './classNames'

export type ButtonLook = 'primary' | 'secondary'
export type ButtonSize = 'regular' | 'small'

const looks: Record<ButtonLook, string> = {
  primary:
    'border-accent bg-accent text-on-accent hover:border-accent-hover hover:bg-accent-hover active:border-accent-pressed active:bg-accent-pressed',
  secondary: 'border-accent bg-transparent text-accent hover:bg-wash active:bg-wash',
}

const sizes: Record<ButtonSize, string> = {
  regular: 'min-h-11 px-5 text-body',
  small: 'min-h-8 px-3 text-table max-sm:min-h-11',
}

/** The look shared by buttons and by links that act like one. */
export function buttonClasses(look: ButtonLook, size: ButtonSize, off: boolean, full: boolean): string {
  return classNames(
    'relative inline-flex items-center justify-center gap-2 rounded border-[1.5px] text-center font-semibold no-underline transition-colors',
    sizes[size],
    off ? 'border-edge bg-tint text-muted' : looks[look],
    full && 'w-full',
  )
}
