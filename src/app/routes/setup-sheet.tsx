import { getKind } from '#shared/kinds/index'
import { paths } from '../../config/paths'
import { MeasuringSheet, readSheetKind } from '../../features/setups/components/measuring-sheet'
import type { Page } from '../page-route'

export const page: Page = {
  Component: MeasuringSheet,
  head: ({ url }) => {
    const kind = readSheetKind(url.searchParams)
    return {
      title: `Measuring sheet: ${getKind(kind).label}`,
      description: `What to measure of a ${getKind(kind).label} and where, on one sheet to print and write on.`,
      canonical: `${paths.measuringSheet}?kind=${kind}`,
    }
  },
}
