import { Link } from 'react-router-dom'
import { paths } from '../../config/paths'
import type { Page } from '../page-route'

function AboutPage() {
  return (
    <div className="max-w-prose space-y-8">
      <h1>About Stillfits</h1>
      <p>
        Something in a reef-tank equipment list is out of stock. Stillfits says what can take its place in your setup,
        shows the measurements behind the answer, and lists what else would have to change. It is an open record: people
        measure gear, others review what they measured, and everybody may read, use and correct it.
      </p>
      <section>
        <h2>Who pays</h2>
        <p className="mt-2">
          Nobody pays for a place in the answers, and there is no way to. There are no advertisements, no commissions
          and no sponsored pieces. The order of answers comes from the measurements alone, by the rules on the{' '}
          <Link to={paths.method} className="link">
            method page
          </Link>
          .
        </p>
      </section>
      <section>
        <h2>Who decides what is right</h2>
        <p className="mt-2">
          Every number says where it comes from: measured, told by the maker, or estimated; by whom, when, and who
          reviewed it. Nobody reviews their own proposals. Nothing is overwritten: each change is a revision of its own,
          and any earlier one can be brought back. Where sources disagree, all of them are kept and shown.
        </p>
      </section>
      <section>
        <h2>Who runs it</h2>
        <p className="mt-2">
          The people who contribute, the moderators who review, and the admins of the site that you are looking at. The
          program knows no owner of the numbers: they are{' '}
          <Link to={paths.licence} className="link">
            open data
          </Link>
          , so that anybody can carry the record on.
        </p>
      </section>
      <section>
        <h2>What it is not</h2>
        <p className="mt-2">
          It is no substitute for a licensed electrician, a structural engineer or your own eyes. Estimates are
          estimates: measure before trusting livestock to them.
        </p>
      </section>
    </div>
  )
}

export const page: Page = {
  Component: AboutPage,
  head: () => ({
    title: 'About Stillfits',
    description: 'An open record of reef aquarium gear: who runs it, who pays, and who decides what is right.',
    canonical: paths.about,
  }),
}
