import { Link } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'

export interface SendBarProps {
  readonly label: string
  readonly isSending: boolean
  readonly isUploading: boolean
  /** Where what was typed is by now, in words. */
  readonly kept: string
}

/** The terms, before the button that accepts them. */
export function SendBar({ label, isSending, isUploading, kept }: SendBarProps) {
  return (
    <div className="mt-10 border-t-[1.5px] border-ink pt-5">
      <p className="max-w-prose text-sm">
        By sending it you give the values to the open record: facts under an open data licence, photos to be shown
        beside them with your name. The{' '}
        <Link to={paths.licence} className="link">
          terms of contributing
        </Link>{' '}
        say it in full.
      </p>
      <div className="mt-4 flex flex-wrap items-center gap-4">
        <Button type="submit" variant="primary" isBusy={isSending || isUploading}>
          {isSending ? 'Sending…' : isUploading ? 'Waiting for the files…' : label}
        </Button>
        <p className="text-sm text-ink-soft" role="status">
          {kept}
        </p>
      </div>
    </div>
  )
}
