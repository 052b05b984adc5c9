import { useId, useState, type KeyboardEvent, type MouseEvent } from 'react'
import type { Mark, Scale } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { verdictWords } from '../../lib/verdicts'
import { assignLanes } from './assign-lanes'
import { MarkPin } from './mark-pin'
import { ZoneBand, ZonePatterns } from './patterns'
import { pickMark } from './pick-mark'
import { ScaleAxis } from './scale-axis'
import { fitDomain, percent, placePercent, placeZone } from './scale-domain'
import { findScaleUnit } from './scale-unit'
import { useContainerWidth } from './use-container-width'

export interface SharedScaleProps {
  readonly scale: Scale
  readonly marks: readonly Mark[]
  readonly printer: Printer
  /** Brand and model of a slug. */
  readonly nameOf: (slug: string) => string
  readonly selected?: string | null
  /** Called by arrow keys and presses. Without it the scale is a picture. */
  readonly onPick?: (slug: string) => void
  /** Called while the pointer rests on a mark, with null when it leaves. */
  readonly onPoint?: (slug: string | null) => void
  /** Lit beside the selected one, such as an answer under the pointer. */
  readonly pointed?: string | null
}

const axisY = 70
const lanes = 5
const lanePx = 9
const pinPx = (lane: number) => 12 + lane * lanePx

/** One deciding check as a ruler with every candidate standing on it. */
export function SharedScale(props: SharedScaleProps) {
  const { scale, marks, printer, nameOf, selected = null, pointed = null, onPick, onPoint } = props
  const id = useId()
  const [box, widthPx] = useContainerWidth<HTMLDivElement>(720)
  const [hovered, setHovered] = useState<string | null>(null)
  const unit = findScaleUnit(scale.unit)

  const known = marks
    .flatMap((mark) => {
      const value = mark.values[scale.key]
      return typeof value === 'number' ? [{ ...mark, value }] : []
    })
    .sort((a, b) => a.value - b.value)
  const domain = fitDomain([...known.map((mark) => mark.value), ...scale.limits])
  const xOf = (value: number) => (placePercent(value, domain) / 100) * widthPx
  const laneOf = assignLanes(
    known.map((mark) => xOf(mark.value)),
    lanePx,
    lanes,
  )
  const placed = known.map((mark, at) => ({ ...mark, xPx: xOf(mark.value), yPx: axisY - pinPx(laneOf[at] ?? 0) }))

  const lit = hovered ?? pointed ?? selected
  const optionId = (slug: string) => `${id}-${slug}`
  const describe = (mark: (typeof placed)[number]) => `${nameOf(mark.slug)}, ${printer.measure(mark.value, unit)}`

  const findAt = (event: MouseEvent, from: string | null) => {
    const frame = event.currentTarget.getBoundingClientRect()
    return pickMark(placed, event.clientX - frame.left, event.clientY - frame.top, from)
  }
  const point = (slug: string | null) => {
    if (slug === hovered) return
    setHovered(slug)
    onPoint?.(slug)
  }
  const pickByKey = (event: KeyboardEvent) => {
    const at = placed.findIndex((mark) => mark.slug === selected)
    const last = placed.length - 1
    const targets: Record<string, number> = {
      ArrowRight: Math.min(last, at + 1),
      ArrowLeft: at < 0 ? last : Math.max(0, at - 1),
      ArrowDown: Math.min(last, at + 1),
      ArrowUp: at < 0 ? last : Math.max(0, at - 1),
      Home: 0,
      End: last,
    }
    const target = placed[targets[event.key] ?? -1]
    if (!target) return
    event.preventDefault()
    onPick?.(target.slug)
  }

  const unplaced = marks.length - known.length
  const summary = `${scale.label}, ${scale.limitText}: ${known.length} on the scale${unplaced > 0 ? `, ${unplaced} without a value` : ''}`
  const shown = placed.find((mark) => mark.slug === lit)
  const list = onPick
    ? ({
        role: 'listbox',
        tabIndex: 0,
        'aria-label': summary,
        'aria-activedescendant': placed.some((mark) => mark.slug === selected) ? optionId(selected ?? '') : undefined,
        onKeyDown: pickByKey,
      } as const)
    : ({ role: 'img', 'aria-label': summary } as const)

  return (
    <section className="grid gap-x-6 md:grid-cols-[11rem_minmax(0,1fr)]">
      <div className="text-sm">
        <h3 className="text-base font-semibold">{scale.label}</h3>
        <p className="text-ink-soft">{scale.limitText}</p>
        {unplaced > 0 && <p className="text-ink-soft">{unplaced} without a value</p>}
      </div>
      <div className="px-5">
        <div ref={box}>
          <svg
            width="100%"
            height={axisY + 24}
            overflow="visible"
            className={onPick ? 'block cursor-pointer touch-manipulation' : 'block'}
            onPointerMove={(event) => event.pointerType === 'mouse' && point(findAt(event, null) ?? null)}
            onPointerLeave={() => point(null)}
            onClick={(event) => {
              const slug = findAt(event, selected)
              if (slug) onPick?.(slug)
            }}
          >
            <ZonePatterns id={id} />
            <rect width="100%" height={axisY + 24} fill="transparent" />
            {scale.zones.map((zone) => {
              const band = placeZone(zone, domain)
              return (
                band && <ZoneBand key={zone.from} id={id} outcome={zone.outcome} {...band} y={axisY - 26} height={26} />
              )
            })}
            <ScaleAxis domain={domain} unit={unit} printer={printer} widthPx={widthPx} y={axisY} />
            {scale.limits.map((limit) => (
              <line
                key={limit}
                x1={percent(placePercent(limit, domain))}
                x2={percent(placePercent(limit, domain))}
                y1={axisY - 34}
                y2={axisY + 7}
                strokeWidth="2.5"
                className="stroke-action"
              />
            ))}
            <g {...list}>
              {placed.map((mark, at) => (
                <svg key={mark.slug} x={percent(placePercent(mark.value, domain))} y={axisY} overflow="visible">
                  <g
                    id={optionId(mark.slug)}
                    {...(onPick && {
                      role: 'option',
                      'aria-selected': mark.slug === selected,
                      'aria-label': `${describe(mark)}, ${verdictWords[mark.verdict].toLowerCase()}`,
                    })}
                  >
                    <MarkPin verdict={mark.verdict} heightPx={pinPx(laneOf[at] ?? 0)} isLit={mark.slug === lit} />
                  </g>
                </svg>
              ))}
            </g>
            {shown && <LitLabel text={describe(shown)} share={placePercent(shown.value, domain)} />}
          </svg>
        </div>
      </div>
    </section>
  )
}

function LitLabel({ text, share }: { readonly text: string; readonly share: number }) {
  return (
    <text
      x={percent(share)}
      y="11"
      textAnchor={share < 33 ? 'start' : share > 67 ? 'end' : 'middle'}
      fontSize="12"
      fontWeight="700"
      strokeWidth="5"
      paintOrder="stroke"
      aria-hidden="true"
      className="pointer-events-none fill-ink stroke-paper"
    >
      {text}
    </text>
  )
}
