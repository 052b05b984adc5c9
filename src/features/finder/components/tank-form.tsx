import { TankPlan } from '../../../components/drawings/tank-plan'
import { TankSection } from '../../../components/drawings/tank-section'
import type { RodDrawing } from '../../../components/drawings/tank-drawing'
import { buttonClass } from '../../../components/ui/button-class'
import type { Finder } from '../hooks/use-finder'
import { EditLink } from '../../../components/setup/edit-link'
import { fieldId } from '../../../components/setup/field-groups'
import { toDrawing } from '../../../components/setup/to-drawing'
import { RoomStrip } from './room-strip'

export interface TankFormProps {
  readonly finder: Finder
  readonly rod: RodDrawing | undefined
  readonly onEdit: (path: string, target: Element) => void
}

/** Plan and section of the tank: every measure in them opens to be typed. */
export function TankForm({ finder, rod, onEdit }: TankFormProps) {
  const { plan, given, printer, isExample } = finder
  const drawing = toDrawing(plan, given, rod)
  const editHref = (path: string) =>
    `#${fieldId(path === 'tank.chambers' ? `tank.chambers.${plan.tank.chambers.length}.lengthMm` : path)}`
  const shared = { drawing, printer, onEdit, editHref }
  const actions = [
    { path: 'tank.volumeL', label: given.has('tank.volumeL') ? 'Change the volume' : 'Give its volume' },
    { path: 'tank.size', label: 'Give its outside size', field: 'tank.outerLengthMm' },
    { path: 'tank.chambers', label: plan.tank.chambers.length > 0 ? 'Add another chamber' : 'Add a rear chamber' },
    { path: 'room', label: 'Describe the room', field: 'room.coldestC' },
  ]
  return (
    <section aria-label="Your tank, drawn to scale">
      {isExample && (
        <p className="mb-3 max-w-prose">
          Drawn as a {printer.volume(plan.tank.ratedL)} tank until you say.{' '}
          <strong>Give its volume or its outside size</strong>, or press any measure in the drawing.
        </p>
      )}
      <div className="grid gap-3 sm:grid-cols-2">
        <TankPlan {...shared} />
        <TankSection {...shared} />
      </div>
      <RoomStrip finder={finder} onEdit={onEdit} editHref={editHref} />
      <div className="mt-3 flex flex-wrap gap-2 print:hidden">
        {actions.map(({ path, label, field }) => (
          <EditLink
            key={path}
            href={field === undefined ? editHref(path) : `#${fieldId(field)}`}
            onEdit={(anchor) => onEdit(path, anchor)}
            className={buttonClass({ size: 'sm', variant: isExample && path === 'tank.volumeL' ? 'primary' : 'plain' })}
          >
            {label}
          </EditLink>
        ))}
      </div>
      <p className="mt-2 text-sm text-ink-soft">
        Solid blue is yours. Dashed is assumed: press it to say otherwise. The plan is seen from above, back wall at the
        top.
      </p>
    </section>
  )
}
