import type { ReactNode } from 'react'

export function AccountPart({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <section className="max-w-md border-t-[1.5px] border-ink pt-4">
      <h2>{title}</h2>
      <div className="mt-4">{children}</div>
    </section>
  )
}
