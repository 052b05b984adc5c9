import { Link } from 'react-router-dom'
import { Facts } from '../../components/ui/facts'
import { paths } from '../../config/paths'
import type { Page } from '../page-route'

const parts = [
  {
    term: 'The database',
    facts: (
      <>
        The collection of pieces, numbers, sources and revisions is under the{' '}
        <a href="https://opendatacommons.org/licenses/odbl/1-0/" className="link">
          Open Database Licence 1.0
        </a>
        : use it for anything, say where it comes from, and share what you make of the collection alike.
      </>
    ),
  },
  {
    term: 'Each fact in it',
    facts: (
      <>
        Single contents are under the{' '}
        <a href="https://opendatacommons.org/licenses/dbcl/1-0/" className="link">
          Database Contents Licence 1.0
        </a>
        : a length is a length, and nobody owns it.
      </>
    ),
  },
  {
    term: 'Photos',
    facts: (
      <>
        Photos that back a value are under{' '}
        <a href="https://creativecommons.org/licenses/by-sa/4.0/" className="link">
          Creative Commons BY-SA 4.0
        </a>
        : name who took them, and share changes alike.
      </>
    ),
  },
  {
    term: 'Documents',
    facts: 'A maker’s sheet stays the maker’s. It is kept as evidence for the numbers taken from it, as a download.',
  },
]

function LicencePage() {
  return (
    <>
      <h1>Licence of the data</h1>
      <p className="mt-3 max-w-prose">
        The record belongs to everybody. These are the terms under which you may use it, and under which you contribute
        to it.
      </p>
      <section className="mt-8">
        <h2>When you use it</h2>
        <Facts rows={parts} />
        <p className="mt-3 max-w-prose">Name the source as “Stillfits contributors”, with a link to this page.</p>
      </section>
      <section className="mt-10 max-w-prose">
        <h2>When you contribute</h2>
        <p className="mt-2">
          By sending a proposal you put its numbers and words under the Open Database Licence and the Database Contents
          Licence, and your photos under Creative Commons BY-SA 4.0, with your public name beside them. Send only photos
          that you took or may pass on, and no copied text. This cannot be taken back: what was approved stays in the
          record, also after you{' '}
          <Link to={paths.privacy} className="link">
            delete your account
          </Link>
          ; your name is then taken off.
        </p>
      </section>
    </>
  )
}

export const page: Page = {
  Component: LicencePage,
  head: () => ({
    title: 'Licence of the data',
    description: 'The numbers are open data: Open Database Licence, Database Contents Licence, photos CC BY-SA 4.0.',
    canonical: paths.licence,
  }),
}
