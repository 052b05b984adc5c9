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
    text: 'Say what the gone piece was and what it stood in. Everything that could take its place comes ranked, with what else would have to change.',
    href: `${paths.find}?${new URLSearchParams({ q: 'replacement heater for a 20 gallon tank' }).toString()}`,
    action: 'Try it with a heater',
  },
  {
    title: 'What is missing?',
    text: 'A report on a whole setup is on the way. Until it is here, ask for one kind at a time: a heater without a thermostat already says what it still needs.',
    href: `${paths.find}?kind=temperature-controller`,
    action: 'Start with a controller',
  },
] as const

/** The three questions, each a dimension line leading to where it is answered today. */
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
