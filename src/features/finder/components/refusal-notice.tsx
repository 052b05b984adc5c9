import { labelSetupPath } from '#shared/engine/assumptions'
import { ErrorSummary } from '../../../components/ui/error-summary'
import type { Refused } from '../../../lib/problem'
import type { Finder } from '../hooks/use-finder'
import { fieldId } from '../../../components/setup/field-groups'

const toPath = (pointer: string): string => pointer.replace(/^#\/(setup\/)?/, '').replaceAll('/', '.')

/** The setup contradicts itself: which measures, and what about them. */
export function RefusalNotice({ refusal, finder }: { readonly refusal: Refused; readonly finder: Finder }) {
  return (
    <ErrorSummary
      title="These measures cannot all be true, so nothing was judged"
      errors={refusal.refused.map(({ pointer, detail }) => {
        const path = toPath(pointer)
        const label = labelSetupPath(path, finder.plan)
        return { fieldId: fieldId(path), message: `${label[0]?.toUpperCase() ?? ''}${label.slice(1)}: ${detail}` }
      })}
    />
  )
}
