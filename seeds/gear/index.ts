import { filtration } from './filtration'
import { heaters } from './heaters'
import { lightControllers, lightMounts } from './light-parts'
import { lights } from './lights'
import { powerStrips } from './power-strips'
import { pumps } from './pumps'
import { rockAndSand } from './rock-and-sand'
import { stands } from './stands'
import { openTanks } from './open-tanks'
import { rearTanks } from './rear-tanks'
import { temperatureControllers } from './temperature-controllers'
import { testingAndCare } from './testing-and-care'
import { water } from './water'
import type { SeedPiece } from '../types'

/** The demo catalogue. Every brand, model and number in it is invented. */
export const seedPieces: readonly SeedPiece[] = [
  ...rearTanks,
  ...openTanks,
  ...stands,
  ...lights,
  ...lightMounts,
  ...lightControllers,
  ...heaters,
  ...temperatureControllers,
  ...pumps,
  ...filtration,
  ...rockAndSand,
  ...water,
  ...testingAndCare,
  ...powerStrips,
]
