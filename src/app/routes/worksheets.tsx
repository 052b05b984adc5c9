import { WorksheetList } from '../../features/worksheets/components/worksheet-list'
import { paths } from '../../config/paths'
import type { Page } from '../page-route'

function WorksheetsPage() {
  return (
    <>
      <h1>Worksheets</h1>
      <p className="mt-3 max-w-prose">
        The calculations behind the answers, each by itself: type your numbers, see the formula with them put in, and
        where it is from. They are the very formulas that the checks use.
      </p>
      <WorksheetList />
    </>
  )
}

export const page: Page = {
  Component: WorksheetsPage,
  head: () => ({
    title: 'Worksheets',
    description:
      'Heat balance, light map, pump point, filled weight, salt, sand and more for a reef tank: each calculation with its formula, the numbers put in, and its source.',
    canonical: paths.worksheets,
  }),
}
