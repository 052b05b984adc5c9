import { Link } from 'react-router-dom'
import { paths } from '../../config/paths'

export interface SiteFooterProps {
  /** True where the catalogue holds demo data. */
  readonly isDemo: boolean
}

export function SiteFooter({ isDemo }: SiteFooterProps) {
  return (
    <footer className="mt-16 border-t-[1.5px] border-ink print:mt-6">
      <div className="page-width grid gap-x-10 gap-y-4 py-8 text-sm text-ink-soft md:grid-cols-[2fr_1fr]">
        <div className="max-w-prose space-y-2">
          <p>
            <strong className="text-ink">Cautions.</strong> Mains electricity beside salt water: use residual-current
            (ground-fault) protection and drip loops, and let local codes and a licensed electrician decide. A filled
            tank is heavy: for anything large or upstairs, ask a structural engineer. Heaters fail: a second,
            independent cut-off protects what lives here.
          </p>
          <p>Light and heat figures are estimates from stated models. Measure before trusting livestock to them.</p>
        </div>
        <div className="space-y-2">
          {isDemo && <p className="text-ink">Demo data: every brand and product here is invented.</p>}
          <p>
            Nobody pays for a place in the answers:{' '}
            <Link to={paths.about} className="link inline-block min-h-6">
              about Stillfits
            </Link>
            .
          </p>
          <p className="print:hidden">
            <Link to={paths.worksheets} className="link inline-block min-h-6">
              Worksheets
            </Link>
            : every calculation by itself.
          </p>
          <p className="print:hidden">
            <Link to={paths.method} className="link inline-block min-h-6">
              Method
            </Link>
            : every check, threshold and source.
          </p>
          <p className="print:hidden">
            <Link to={paths.privacy} className="link inline-block min-h-6">
              Privacy
            </Link>
            : what is kept.{' '}
            <Link to={paths.licence} className="link inline-block min-h-6">
              Licence
            </Link>
            : open data.
          </p>
        </div>
      </div>
    </footer>
  )
}
