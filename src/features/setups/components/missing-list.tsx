import { Link } from 'react-router-dom'
import { getKind } from '#shared/kinds/index'
import { writeSetupLink } from '#shared/schemas/setup-link'
import { paths } from '../../../config/paths'
import type { SetupReport } from '../hooks/use-setup-report'
import { needKinds } from '../model/need-kinds'

/** What a marine setup cannot do without and this one lacks, each leading to what would meet it here. */
export function MissingList({ shown }: { readonly shown: SetupReport }) {
  const { report, visit, printer } = shown
  const { missing } = report
  if (missing.length === 0)
    return <p className="max-w-prose">Nothing essential: heat, water, salt, tests, flow and light are all seen to.</p>
  const setup = writeSetupLink(Object.entries(visit.raw), printer.system)
  return (
    <ul className="border-t border-rule">
      {missing.map(({ need, message }) => {
        const kind = needKinds[need]
        return (
          <li
            key={need}
            className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 border-b border-rule py-2.5"
          >
            <span className="min-w-0 max-w-prose">{message}</span>
            {kind && (
              <Link to={`${paths.find}?kind=${kind}&${setup}`} className="link text-sm print:hidden">
                See which {getKind(kind).plural} fit
              </Link>
            )}
          </li>
        )
      })}
    </ul>
  )
}
