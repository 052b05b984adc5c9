import { usePreferences } from '../../../lib/app-context'

const words = {
  us: { depth: '12 in', rod: '10.6 in', spare: '1.4 in to spare', across: '4 in' },
  metric: { depth: '305 mm', rod: '269 mm', spare: '36 mm to spare', across: '102 mm' },
} as const

/** What an answer looks like: a rod in its chamber, measured. Of an invented tank. */
export function HeroDrawing() {
  const { system } = usePreferences()
  const { depth, rod, spare, across } = words[system]
  return (
    <svg
      viewBox="0 0 380 260"
      role="img"
      aria-label={`A heater ${rod} long stands in a rear chamber with ${depth} of water: ${spare}.`}
      strokeWidth="1.5"
      className="w-full border border-rule bg-sheet"
    >
      <rect x="120" y="62" width="240" height="168" className="fill-water stroke-transparent" />
      <path d="M116 44v190h248V44" fill="none" strokeDasharray="5 4" className="stroke-ink" />
      <path d="M120 62h240" className="stroke-action" />
      <rect x="120" y="62" width="62" height="168" strokeWidth="2" className="fill-action-soft stroke-action" />
      <rect x="144" y="82" width="14" height="148" rx="7" strokeWidth="2" className="fill-sheet stroke-fits" />
      <path d="M120 28h62m-66 4 8-8m54 8 8-8" className="stroke-action" />
      <path d="M84 62v60m0 26v82m-4-164 8-8m-8 176 8-8" className="stroke-action" />
      <path d="M214 82v60m0 26v62m-4-144 8-8m-8 156 8-8M214 62v20m-4-16 8-8" className="stroke-ink" />
      <g fontSize="13" fontWeight="600" textAnchor="middle">
        <text x="151" y="18" className="fill-action">
          {across}
        </text>
        <text x="84" y="140" className="fill-action">
          {depth}
        </text>
        <text x="214" y="160" className="fill-ink">
          {rod}
        </text>
        <text x="228" y="78" textAnchor="start" className="fill-fits">
          {spare}
        </text>
      </g>
    </svg>
  )
}
