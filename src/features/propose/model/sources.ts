import type { Source } from './typed-form'

/** Where a value can be from, the best first. */
export const sourceOptions: readonly { readonly value: Source; readonly label: string }[] = [
  { value: 'measured', label: 'I measured it' },
  { value: 'maker', label: 'its maker’s figure' },
  { value: 'estimate', label: 'an estimate' },
]
