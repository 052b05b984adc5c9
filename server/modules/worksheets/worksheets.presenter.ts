import { z } from 'zod'
import { toUcum } from '#shared/engine/worksheets/quantities'
import type { Step, Worksheet, Working } from '#shared/engine/worksheets/types'
import { createWorksheetSchema, type WorkingAnswer, type WorksheetListAnswer } from '#shared/schemas/worksheets'

/** What a worksheet asks for, as JSON Schema, and what comes out of it. */
export function presentWorksheet(sheet: Worksheet): WorksheetListAnswer['items'][number] {
  const { name, title, intro, basis, results, example } = sheet
  const { $schema: _, ...inputs } = z.toJSONSchema(createWorksheetSchema(sheet), { io: 'input' })
  return {
    name,
    title,
    intro,
    basis,
    results: results.map(({ key, label, unit }) => ({ key, label, unit: unit === null ? null : toUcum(unit) })),
    inputs,
    example,
  }
}

const presentStep = ({ title, formula, text, value, unit, source }: Step): WorkingAnswer['steps'][number] => ({
  title,
  formula,
  text,
  value,
  unit: toUcum(unit),
  ...(source !== undefined && { source }),
})

export const presentWorking = ({ basis }: Worksheet, working: Working): WorkingAnswer => ({
  result: working.result,
  steps: working.steps.map(presentStep),
  basis,
  cautions: [...working.cautions],
  assumptions: working.assumptions.map(({ key, value, message }) => ({ key, value, message })),
})
