import type { RodDrawing } from './tank-drawing'

export interface Box {
  readonly lengthMm: number
  readonly widthMm: number
}

export interface PlacedRod {
  /** Direction in plan, from the box's length towards its width. */
  readonly planAngleDeg: number
  /** Length and thickness of its outline in plan; upright both are the diameter. */
  readonly planLengthMm: number
  /** As seen square to the box's length: apparent length, and angle above the floor. */
  readonly seenLengthMm: number
  readonly seenAngleDeg: number
  /** From the floor to its lowest and highest point. */
  readonly heightMm: number
}

const radians = (deg: number) => (deg * Math.PI) / 180
const degrees = (rad: number) => (rad * 180) / Math.PI

/** The direction nearest to the longer side in which a footprint fits the box; none: along the diagonal. */
function findPlanAngle(lengthMm: number, diameterMm: number, box: Box): number {
  const alongLength = box.lengthMm >= box.widthMm
  for (let deg = 0; deg <= 90; deg += 1) {
    const turn = radians(alongLength ? deg : 90 - deg)
    const across = lengthMm * Math.cos(turn) + diameterMm * Math.sin(turn)
    const deep = lengthMm * Math.sin(turn) + diameterMm * Math.cos(turn)
    if (across <= box.lengthMm + 0.05 && deep <= box.widthMm + 0.05) return degrees(turn)
  }
  return degrees(Math.atan2(box.widthMm, box.lengthMm))
}

/** Where a rod of the given position is drawn in a box: a cylinder `angleDeg` above the floor, projected. */
export function placeRod(rod: RodDrawing, box: Box): PlacedRod {
  const { lengthMm, diameterMm } = rod
  const angleDeg = rod.position === 'upright' ? 90 : rod.position === 'flat' ? 0 : rod.angleDeg
  const rise = Math.sin(radians(angleDeg))
  const run = Math.cos(radians(angleDeg))
  const planLengthMm = lengthMm * run + diameterMm * rise
  const planAngleDeg = rod.position === 'upright' ? 0 : findPlanAngle(planLengthMm, diameterMm, box)
  const across = lengthMm * run * Math.cos(radians(planAngleDeg))
  const up = lengthMm * rise
  return {
    planAngleDeg,
    planLengthMm,
    // Seen end-on a flat rod still shows its thickness.
    seenLengthMm: Math.max(Math.hypot(across, up), diameterMm),
    seenAngleDeg: degrees(Math.atan2(up, across)),
    heightMm: lengthMm * rise + diameterMm * run,
  }
}
