import {
  flowSpeedMS,
  frictionFactor,
  pipeLossM,
  plasticRoughnessMm,
  plumbingViscosityM2S,
  reynoldsNumber,
  systemHeadM,
  type Pipe,
} from '../physics/flow'
import { standardGravityMS2 } from '../physics/weight'
import { put } from './quantities'
import type { Step } from './types'

/** How the head at a flow comes about, in the order in which one would compute it. */
export function listLossSteps(flowLph: number, staticHeadM: number, pipe: Pipe): readonly Step[] {
  const { boreMm, lengthMm } = pipe
  const speed = flowSpeedMS(flowLph, boreMm)
  const reynolds = reynoldsNumber(speed, boreMm)
  const friction = frictionFactor(reynolds, plasticRoughnessMm / boreMm)
  const twoG = `(2 × ${put(standardGravityMS2)} m/s²)`
  return [
    {
      title: 'Speed in the pipe',
      formula: 'v = Q ÷ (π/4 × D²)',
      text: `${put(flowLph / 3.6e6, 3)} m³/s ÷ (π/4 × (${put(boreMm / 1000)} m)²)`,
      value: speed,
      unit: 'm/s',
    },
    {
      title: 'Friction factor',
      formula: reynolds < 2300 ? 'f = 64 ÷ Re' : 'f = 0.25 ÷ log₁₀(ε ÷ 3.7 D + 5.74 ÷ Re^0.9)²',
      text: `Re = v D ÷ ν = ${put(speed)} m/s × ${put(boreMm / 1000)} m ÷ ${put(plumbingViscosityM2S * 1e6)} mm²/s = ${put(reynolds, 3)}`,
      value: friction,
      unit: 'number',
      source: 'Swamee & Jain 1976; smooth plastic, ε = 0.0015 mm',
    },
    {
      title: 'Pipe and fittings',
      formula: '(f L ÷ D + ΣK) v² ÷ 2g',
      text: `(${put(friction)} × ${put(lengthMm / 1000)} m ÷ ${put(boreMm / 1000)} m + ${put(pipe.fittingsK)}) × (${put(speed)} m/s)² ÷ ${twoG}`,
      value: pipeLossM(flowLph, pipe),
      unit: 'm',
      source: 'K: entry 0.5, exit 1.0, elbows 30 f_T (90°) and 16 f_T (45°), Flow of Fluids, TP-410M',
    },
    {
      title: 'Head',
      formula: 'lift + pipe and fittings',
      text: `${put(staticHeadM)} m + ${put(pipeLossM(flowLph, pipe))} m`,
      value: systemHeadM(flowLph, staticHeadM, pipe),
      unit: 'm',
    },
  ]
}
