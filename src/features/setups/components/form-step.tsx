import type { ReactNode } from 'react'

export interface FormStepProps {
  readonly number: number
  readonly id: string
  readonly title: string
  readonly children: ReactNode
}

/** One of the steps that the form takes, all on one page. */
export function FormStep({ number, id, title, children }: FormStepProps) {
  return (
    <section aria-labelledby={`${id}-title`} className="border-t-[1.5px] border-ink pt-4">
      <h2 id={id} tabIndex={-1} className="scroll-mt-4 text-xl outline-offset-4">
        <span id={`${id}-title`}>
          <span className="mr-2 font-mono text-base font-normal text-ink-soft">{number}</span>
          {title}
        </span>
      </h2>
      <div className="mt-4 space-y-7">{children}</div>
    </section>
  )
}
