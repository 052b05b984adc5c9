import { renderToString } from 'react-dom/server'
import { StaticRouter } from 'react-router-dom'
import { Specimen } from './specimen'

export function renderSpecimen(): string {
  return renderToString(
    <StaticRouter location="/find">
      <Specimen />
    </StaticRouter>,
  )
}
