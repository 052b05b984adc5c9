import { data, type RouteObject } from 'react-router-dom'
import { paths } from '../config/paths'
import type { App } from '../lib/app-context'
import { sessionQuery } from '../lib/session'
import { Layout } from './layout'
import { createLazy } from './page-route'
import { ErrorPage } from './routes/error'

function throwNotFound(): never {
  // A Response of the router's own kind: it keeps its status through server rendering.
  // eslint-disable-next-line @typescript-eslint/only-throw-error
  throw data(null, { status: 404 })
}

/** Who is signed in stands over every page that the server renders; the browser asks by itself. */
async function loadSession(app: App): Promise<null> {
  if (app.isServer) await app.queryClient.prefetchQuery(sessionQuery(app.api))
  return null
}

/** Every page, each in a file of its own that is fetched when it is first visited. */
export function createRoutes(app: App): RouteObject[] {
  return [
    {
      id: 'root',
      Component: Layout,
      loader: () => loadSession(app),
      HydrateFallback: () => null,
      children: [
        {
          id: 'pages',
          ErrorBoundary: ErrorPage,
          HydrateFallback: () => null,
          children: [
            { id: 'home', path: paths.home, lazy: createLazy(app, () => import('./routes/home')) },
            { id: 'find', path: paths.find, lazy: createLazy(app, () => import('./routes/find')) },
            { id: 'gear-list', path: paths.gearList, lazy: createLazy(app, () => import('./routes/gear-list')) },
            {
              id: 'gear-history',
              path: '/gear/:slug/history',
              lazy: createLazy(app, () => import('./routes/gear-history')),
            },
            { id: 'gear-new', path: paths.gearNew, lazy: createLazy(app, () => import('./routes/gear-new')) },
            { id: 'gear-edit', path: '/gear/:slug/edit', lazy: createLazy(app, () => import('./routes/gear-edit')) },
            { id: 'gear', path: '/gear/:slug', lazy: createLazy(app, () => import('./routes/gear')) },
            { id: 'proposals', path: paths.proposals, lazy: createLazy(app, () => import('./routes/proposals')) },
            { id: 'proposal', path: '/proposals/:id', lazy: createLazy(app, () => import('./routes/proposal')) },
            { id: 'setup-new', path: paths.setupNew, lazy: createLazy(app, () => import('./routes/setup-new')) },
            { id: 'setup', path: paths.setup, lazy: createLazy(app, () => import('./routes/setup-link')) },
            { id: 'swap', path: '/setups/link/swap/:itemId', lazy: createLazy(app, () => import('./routes/swap')) },
            {
              id: 'setup-sheet',
              path: paths.measuringSheet,
              lazy: createLazy(app, () => import('./routes/setup-sheet')),
            },
            { id: 'worksheets', path: paths.worksheets, lazy: createLazy(app, () => import('./routes/worksheets')) },
            {
              id: 'worksheet',
              path: '/worksheets/:name',
              lazy: createLazy(app, () => import('./routes/worksheets-sheet')),
            },
            { id: 'method', path: paths.method, lazy: createLazy(app, () => import('./routes/method')) },
            { id: 'review', path: paths.review, lazy: createLazy(app, () => import('./routes/review')) },
            {
              id: 'admin-revert',
              path: '/admin/people/:name/revert',
              lazy: createLazy(app, () => import('./routes/admin-revert')),
            },
            {
              id: 'gear-care',
              path: '/review/gear/:slug',
              lazy: createLazy(app, () => import('./routes/gear-care')),
            },
            {
              id: 'review-disputes',
              path: paths.disputes,
              lazy: createLazy(app, () => import('./routes/review-disputes')),
            },
            {
              id: 'review-reports',
              path: paths.reports,
              lazy: createLazy(app, () => import('./routes/review-reports')),
            },
            {
              id: 'review-proposal',
              path: '/review/:proposalId',
              lazy: createLazy(app, () => import('./routes/review-proposal')),
            },
            { id: 'sign-in', path: '/sign-in', lazy: createLazy(app, () => import('./routes/sign-in')) },
            { id: 'sign-up', path: paths.signUp, lazy: createLazy(app, () => import('./routes/sign-up')) },
            { id: 'forgot', path: paths.forgot, lazy: createLazy(app, () => import('./routes/forgot')) },
            { id: 'reset', path: paths.reset, lazy: createLazy(app, () => import('./routes/reset')) },
            { id: 'confirm', path: paths.confirm, lazy: createLazy(app, () => import('./routes/confirm')) },
            { id: 'account', path: paths.account, lazy: createLazy(app, () => import('./routes/account')) },
            { id: 'person', path: '/people/:name', lazy: createLazy(app, () => import('./routes/person')) },
            { id: 'admin-people', path: paths.admin, lazy: createLazy(app, () => import('./routes/admin-people')) },
            { id: 'admin-audit', path: paths.adminAudit, lazy: createLazy(app, () => import('./routes/admin-audit')) },
            {
              id: 'admin-letters',
              path: paths.adminLetters,
              lazy: createLazy(app, () => import('./routes/admin-letters')),
            },
            { id: 'mailroom', path: paths.mailroom, lazy: createLazy(app, () => import('./routes/mailroom')) },
            { id: 'unsubscribe', path: paths.unsubscribe, lazy: createLazy(app, () => import('./routes/unsubscribe')) },
            { id: 'about', path: paths.about, lazy: createLazy(app, () => import('./routes/about')) },
            { id: 'privacy', path: paths.privacy, lazy: createLazy(app, () => import('./routes/privacy')) },
            { id: 'licence', path: paths.licence, lazy: createLazy(app, () => import('./routes/licence')) },
            { id: 'unknown', path: '*', loader: throwNotFound, Component: () => null },
          ],
        },
      ],
    },
  ]
}
