export interface LiveStatusProps {
  /** Such as "3 heaters fit, 8 with changes". Read out when it changes. */
  readonly message: string
}

/** Must be on the page before the message changes, or nothing is announced. */
export function LiveStatus({ message }: LiveStatusProps) {
  return (
    <p role="status" className="sr-only">
      {message}
    </p>
  )
}
