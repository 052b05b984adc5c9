import { Facts } from '../../components/ui/facts'
import { paths } from '../../config/paths'
import type { Page } from '../page-route'

const withoutAccount = [
  {
    term: 'Your setup',
    facts: 'It lives in the address of the page. The server answers and forgets it: nothing of it is stored or logged.',
  },
  {
    term: 'Cookies',
    facts:
      'Two of your choice, for units and for light or dark, once you press those switches. Nothing follows you around.',
  },
  {
    term: 'Your address',
    facts:
      'The network address that a request comes from is counted for some minutes, up to an hour, so that nobody takes all of the room. It stands in no log.',
  },
  {
    term: '“Something wrong here?”',
    facts: 'Your words, the piece and the moment. Moderators read them.',
  },
]

const withAccount = [
  {
    term: 'You',
    facts:
      'Name (public), e-mail address, a hash of your password (never the password), your role, when you signed up, whether you want notices, and if it comes to that, why you were suspended.',
  },
  {
    term: 'Where you are signed in',
    facts:
      'A cookie with the session’s id in your browser; here only a hash of it, when it began and was last used, and what your browser calls itself. You see the list and can end each of them.',
  },
  {
    term: 'Links by e-mail',
    facts: 'Hashes of the links to confirm, reset and unsubscribe, with the address that they went to.',
  },
  {
    term: 'What you contribute',
    facts:
      'Proposals with their numbers, words and sources; what was said about them; confirmations; photos and documents. Photos are drawn anew: place, camera and owner that the camera wrote into them are gone before anything is stored. What was approved is public under your name.',
  },
  {
    term: 'Letters to you',
    facts:
      'Each e-mail until 30 days after it was sent; 90 days if it could not be. Admins see subject and address, not the words.',
  },
  {
    term: 'The audit trail',
    facts:
      'Who did what, when: signing up, proposing, deciding, changes of role. Admins read it. It is kept for good and can be changed by nobody.',
  },
  {
    term: 'Repeated requests',
    facts: 'The answer to something that you sent, for a while, so that sending it again by mishap does nothing twice.',
  },
]

function PrivacyPage() {
  return (
    <>
      <h1>What is kept about you</h1>
      <p className="mt-3 max-w-prose">
        This is the whole list. Nothing is sold or passed on, there is no advertising, and pages load nothing from other
        sites.
      </p>
      <section className="mt-8">
        <h2>Without an account</h2>
        <Facts rows={withoutAccount} />
      </section>
      <section className="mt-10">
        <h2>With an account</h2>
        <Facts rows={withAccount} />
      </section>
      <section className="mt-10 max-w-prose">
        <h2>When you leave</h2>
        <p className="mt-2">
          You can delete your account on your account page. Your name, e-mail address and password hash are removed at
          once, your sessions end, and letters to you are deleted. What you contributed stays, under “a former member”,
          because others built on it. A file of yours that was not approved is removed with its proposal when you
          withdraw it.
        </p>
      </section>
      <section className="mt-10 max-w-prose">
        <h2>In a demo</h2>
        <p className="mt-2">
          Where this site says that it holds demo data, no e-mail leaves the machine: letters can be read by everybody
          in the mailroom. Do not use a password there that you use elsewhere.
        </p>
      </section>
    </>
  )
}

export const page: Page = {
  Component: PrivacyPage,
  head: () => ({
    title: 'What is kept about you',
    description:
      'The whole list of what Stillfits keeps about visitors and contributors, for how long, and who sees it.',
    canonical: paths.privacy,
  }),
}
