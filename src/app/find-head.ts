import type { RouteObject } from 'react-router-dom'
import type { App } from '../lib/app-context'
import type { Head } from '../lib/head'
import { describeFailureHead } from './describe-failure'
import type { PageHandle } from './page-route'

interface Shown {
  readonly matches: readonly {
    readonly params: Readonly<Record<string, string | undefined>>
    readonly route: Pick<RouteObject, 'handle'>
  }[]
  readonly errors: Readonly<Record<string, unknown>> | null
}

const fallback: Head = { title: 'Stillfits', description: 'What fits a reef tank, measured.' }

/** The head of whatever the router shows: the deepest page's, or that of its failure. */
export function findHead(app: App, { matches, errors }: Shown, url: URL): Head {
  const error = errors && Object.values(errors)[0]
  if (errors && error !== undefined) return describeFailureHead(error)
  const match = matches.at(-1)
  const handle = match?.route.handle as PageHandle | undefined
  return match && handle ? handle.head({ app, url, params: match.params }) : fallback
}
