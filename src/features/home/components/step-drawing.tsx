import type { ReactNode } from 'react'

const drawings: Readonly<Record<'describe' | 'measure' | 'answer', ReactNode>> = {
  describe: (
    <>
      <rect x="30" y="26" width="180" height="84" fill="none" strokeDasharray="5 4" className="stroke-ink" />
      <rect x="31" y="40" width="178" height="69" className="fill-water stroke-transparent" />
      <rect x="160" y="46" width="40" height="64" strokeWidth="2" className="fill-action-soft stroke-action" />
      <path d="M160 16h40m-44 4 8-8m32 8 8-8" className="stroke-action" />
      <path d="M30 122h180m-184 4 8-8m172 8 8-8" strokeDasharray="4 3" className="stroke-ink-soft" />
    </>
  ),
  measure: (
    <>
      <path d="M20 92h200" className="stroke-ink" />
      <path d="M20 92v9M60 92v9M100 92v9M140 92v9M180 92v9M220 92v9" className="stroke-ink" />
      <path d="M40 92v5M80 92v5M120 92v5M160 92v5M200 92v5" strokeWidth="1" className="stroke-ink-soft" />
      <path d="M150 62l10-10m-2 22 24-24m-16 32 34-34m-14 34 24-24m-4 24 4-4" strokeWidth="1" className="stroke-no" />
      <path d="M150 44v58" strokeWidth="2.5" className="stroke-action" />
      <path d="M52 92v-26m22 26v-36m18 36v-26m30 26v-44" className="stroke-fits" />
      <path d="M176 92v-26m26 26v-36" className="stroke-no" />
      <circle cx="52" cy="64" r="4" className="fill-fits stroke-fits" />
      <circle cx="74" cy="54" r="4" className="fill-fits stroke-fits" />
      <circle cx="92" cy="64" r="4" className="fill-fits stroke-fits" />
      <circle cx="122" cy="46" r="4" className="fill-fits stroke-fits" />
    </>
  ),
  answer: (
    <>
      <circle cx="40" cy="36" r="11" className="fill-fits stroke-fits" />
      <path d="m35 36 4 4 7-8" strokeWidth="2.4" fill="none" className="stroke-paper" />
      <path d="M64 32h130M64 42h84" className="stroke-ink" />
      <circle cx="40" cy="74" r="10" fill="none" strokeWidth="2" className="stroke-changes" />
      <path d="M40 64a10 10 0 0 1 0 20Z" className="fill-changes stroke-transparent" />
      <path d="M64 70h104M64 80h64" className="stroke-ink" />
      <circle cx="40" cy="112" r="10" fill="none" strokeWidth="2" className="stroke-no" />
      <path d="m35.5 107.5 9 9m0-9-9 9" strokeWidth="2.2" className="stroke-no" />
      <path d="M64 108h118M64 118h50" className="stroke-ink" />
    </>
  ),
}

/** One step, drawn in the language of the finder. The words beside it say the same. */
export function StepDrawing({ step }: { readonly step: keyof typeof drawings }) {
  return (
    <svg
      viewBox="0 0 240 136"
      aria-hidden="true"
      strokeWidth="1.5"
      className="w-full max-w-80 border border-rule bg-sheet"
    >
      {drawings[step]}
    </svg>
  )
}
