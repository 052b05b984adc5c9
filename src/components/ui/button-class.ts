import clsx from 'clsx'

export interface ButtonLook {
  readonly variant?: 'primary' | 'plain' | 'quiet'
  readonly size?: 'md' | 'sm'
}

/** The look of a button, for links that act as one as well. */
export function buttonClass({ variant = 'plain', size = 'md' }: ButtonLook = {}): string {
  return clsx(
    'inline-flex items-center justify-center gap-2 rounded-ui border-[1.5px] font-semibold whitespace-nowrap',
    'disabled:opacity-55 aria-disabled:opacity-55',
    size === 'md' ? 'min-h-11 px-4 text-base' : 'min-h-8 px-3 text-sm',
    variant === 'primary' && 'border-action bg-action text-on-action hover:border-ink hover:bg-ink hover:text-paper',
    variant === 'plain' && 'border-ink-soft bg-sheet text-ink hover:border-action hover:text-action',
    variant === 'quiet' && 'border-transparent text-action underline underline-offset-4 hover:decoration-2',
  )
}
