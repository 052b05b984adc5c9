import { filledWeight } from './filled-weight'
import { heatBalance } from './heat-balance'
import { lightMap } from './light-map'
import { membrane } from './membrane'
import { powerLoad } from './power-load'
import { pumpPoint } from './pump-point'
import { rodInChamber } from './rod-in-chamber'
import { saltMixSheet } from './salt-mix'
import { sandBed } from './sand-bed'
import { seawater } from './seawater'
import type { Worksheet } from './types'

/** Every worksheet, in the order in which they are listed. */
export const worksheets: readonly Worksheet[] = [
  heatBalance,
  rodInChamber,
  lightMap,
  pumpPoint,
  filledWeight,
  powerLoad,
  membrane,
  sandBed,
  saltMixSheet,
  seawater,
]

export const findWorksheet = (name: string): Worksheet | undefined => worksheets.find((sheet) => sheet.name === name)
