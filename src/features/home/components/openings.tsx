import { Link } from 'react-router-dom'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'

const openings = [
  {
    title: 'Will it fit?',
    text: 'Draw your tank, press its measures, and see every heater stand on the same scales: length against your chamber, watts against your coldest night.',
    href: `${paths.find}?kind=heater`,
    action: 'Draw my tank',
  },
  {
    title: 'What replaces it?',
    text: 'Describe the setup and mark the piece as gone. Everything that could take its place comes ranked, with what else would have to change.',
    href: `${paths.setupNew}#gear`,
    action: 'Name what is gone',
  },
  {
    title: 'What is missing?',
    text: 'List what you have. The report on the whole setup names the essentials it lacks, adds up plugs, watts, heat and weight, and is a link to share.',
    href: paths.setupNew,
    action: 'Describe my setup',
  },
] as const

/** The three questions, each a dimension line leading to where it is answered. */
export function Openings() {
  return (
    <ul className="mt-12 grid gap-x-8 gap-y-10 md:grid-cols-3">
      {openings.map(({ title, text, href, action }) => (
        <li key={title} className="flex flex-col items-start">
          <svg height="14" width="100%" aria-hidden="true" className="stroke-ink">
            <line x1="0" x2="100%" y1="7" y2="7" strokeWidth="1.5" />
            <line x1="1" x2="1" y1="0" y2="14" strokeWidth="2" />
            <svg x="100%" overflow="visible">
              <line x1="-1" x2="-1" y1="0" y2="14" strokeWidth="2" />
            </svg>
          </svg>
          <h2 className="mt-3 text-xl">{title}</h2>
          <p className="mt-2 mb-4 max-w-prose grow">{text}</p>
          <Link to={href} className={buttonClass()}>
            {action}
          </Link>
        </li>
      ))}
    </ul>
  )
}
