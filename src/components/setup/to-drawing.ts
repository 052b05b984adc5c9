import type { Plan } from '#shared/engine/setup/plan'
import type { Answer } from '#shared/engine/types'
import type { RodDrawing, TankDrawing } from '../drawings/tank-drawing'

/** A rod is drawn where its answer says it goes; one that fits nowhere stands in the first chamber, too long or not. */
export function toRod(answer: Answer, plan: Plan): RodDrawing | undefined {
  const lengthMm = answer.specs.lengthMm?.value
  const diameterMm = answer.specs.diameterMm?.value
  if (answer.kind !== 'heater' || answer.specs.form?.value === 'inline') return undefined
  if (typeof lengthMm !== 'number' || typeof diameterMm !== 'number') return undefined
  const place = answer.place ?? {
    chamber: plan.tank.chambers[0]?.id ?? 'display',
    position: 'upright' as const,
    angleDeg: 90,
  }
  return { ...place, lengthMm, diameterMm, verdict: answer.verdict }
}

export function toDrawing(plan: Plan, given: ReadonlySet<string>, rod: RodDrawing | undefined): TankDrawing {
  const { tank } = plan
  return {
    outerLengthMm: tank.outerLengthMm,
    outerWidthMm: tank.outerWidthMm,
    outerHeightMm: tank.outerHeightMm,
    wallMm: tank.wallMm,
    bottomMm: tank.bottomMm,
    waterLineMm: tank.waterLineMm,
    chambers: tank.chambers.map(({ id, name, lengthMm, widthMm, waterDepthMm }) => ({
      id,
      name,
      lengthMm,
      widthMm,
      waterDepthMm,
    })),
    given,
    ...(rod && { rod }),
  }
}
