import clsx from 'clsx'

export interface SkeletonProps {
  /** Sizes it as what will stand there, such as `h-6 w-40`. */
  readonly className?: string
}

/** A still placeholder. The list around it says in words that it is loading. */
export function Skeleton({ className = 'h-5 w-full' }: SkeletonProps) {
  return <span aria-hidden="true" className={clsx('block rounded-ui bg-grid', className)} />
}
