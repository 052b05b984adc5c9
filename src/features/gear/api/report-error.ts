import { useMutation } from '@tanstack/react-query'
import { createKey } from '../../../lib/create-key'
import { useApp } from '../../../lib/app-context'

export interface ErrorReport {
  /** Absent: about the piece as a whole. */
  readonly key?: string
  readonly words: string
}

/** "Something wrong here?", from anybody. */
export function useReportError(slug: string) {
  const { api } = useApp()
  return useMutation({
    mutationFn: (report: ErrorReport) =>
      api.send('POST', `/gear/${encodeURIComponent(slug)}/reports`, report, { idempotencyKey: createKey() }),
  })
}
