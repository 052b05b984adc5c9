import type { ComponentProps } from 'react'
import clsx from 'clsx'
import { buttonClass, type ButtonLook } from './button-class'

export interface ButtonProps extends ComponentProps<'button'>, ButtonLook {
  /** Work is under way: the button stays focusable, says so, and ignores presses. */
  readonly isBusy?: boolean
}

export function Button({ variant, size, isBusy = false, className, onClick, type = 'button', ...rest }: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      aria-disabled={isBusy || undefined}
      aria-busy={isBusy || undefined}
      onClick={isBusy ? (event) => event.preventDefault() : onClick}
      className={clsx(buttonClass({ ...(variant && { variant }), ...(size && { size }) }), className)}
    />
  )
}
