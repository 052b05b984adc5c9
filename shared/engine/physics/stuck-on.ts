import { findLast } from './bisect'
import { requireFinite } from './finite'

/** A tank that something heats: C dT/dt = input − loss(T). `lossW` must rise with the water's temperature. */
export interface HeatedTank {
  readonly heatCapacityJK: number
  /** Heater at full power plus the heat of the gear in the water. */
  readonly inputW: number
  readonly lossW: (waterC: number) => number
}

export interface WarmingPoint {
  readonly hours: number
  readonly waterC: number
}

export interface StuckOn {
  /** Where the water would settle; at most 100 °C, where it boils. */
  readonly equilibriumC: number
  /** Null: never reached. */
  readonly hoursTo30C: number | null
  readonly hoursTo34C: number | null
  /** From the start to within a hundredth of the way to equilibrium. */
  readonly series: readonly WarmingPoint[]
}

const freezingC = 0
const boilingC = 100
const panels = 64
const seriesSpan = Math.log(100)

/** The temperature at which loss equals input, °C, held between freezing and boiling. RangeError for NaN. */
export function findEquilibriumC({ inputW, lossW }: Pick<HeatedTank, 'inputW' | 'lossW'>): number {
  requireFinite({ inputW, lossAtRoomW: lossW(20) })
  return findLast((waterC) => lossW(waterC) <= inputW, freezingC, boilingC) ?? freezingC
}

/**
 * Time in hours from `startC` to each of `steps` temperatures between it and equilibrium. With u = Teq − T = u0 e^(−s) the
 * time is ∫ C u / (input − loss(Teq − u)) ds, whose integrand stays smooth where dT/(input − loss) runs off to infinity;
 * Simpson's rule then needs few steps. The sign of u takes care of cooling.
 */
function integrate(
  tank: HeatedTank,
  startC: number,
  equilibriumC: number,
  span: number,
  steps: number,
): WarmingPoint[] {
  const u0 = equilibriumC - startC
  const slope = (s: number) => {
    const u = u0 * Math.exp(-s)
    return (tank.heatCapacityJK * u) / (tank.inputW - tank.lossW(equilibriumC - u)) / 3600
  }
  const points: WarmingPoint[] = [{ hours: 0, waterC: startC }]
  const ds = span / steps
  let hours = 0
  let before = slope(0)
  for (let step = 1; step <= steps; step += 1) {
    const after = slope(step * ds)
    hours += (ds / 6) * (before + 4 * slope((step - 0.5) * ds) + after)
    before = after
    points.push({ hours, waterC: equilibriumC - u0 * Math.exp(-step * ds) })
  }
  return points
}

/**
 * Hours from `startC` until the water reaches `targetC`, warming or cooling; 0 if it is there, null if it never gets there.
 * RangeError for NaN.
 */
export function timeToTemperatureH(tank: HeatedTank, startC: number, targetC: number): number | null {
  requireFinite({ startC, targetC, heatCapacityJK: tank.heatCapacityJK })
  return targetC === startC ? 0 : timeOnTheWayH(tank, startC, targetC, findEquilibriumC(tank))
}

function timeOnTheWayH(tank: HeatedTank, startC: number, targetC: number, equilibriumC: number): number | null {
  const left = (equilibriumC - targetC) / (equilibriumC - startC)
  // Within a millionth of the way the time depends on how finely equilibrium itself is known.
  if (!(left > 1e-6 && left < 1)) return null
  return integrate(tank, startC, equilibriumC, -Math.log(left), panels).at(-1)?.hours ?? null
}

/** A heater that never switches off again: from `startC`, where the water goes and how fast. RangeError for NaN. */
export function stuckOn(tank: HeatedTank, startC: number): StuckOn {
  requireFinite({ startC, heatCapacityJK: tank.heatCapacityJK })
  const equilibriumC = findEquilibriumC(tank)
  const settled = Math.abs(equilibriumC - startC) < 1e-6
  const hoursTo = (limitC: number) => (startC >= limitC ? 0 : timeOnTheWayH(tank, startC, limitC, equilibriumC))
  return {
    equilibriumC,
    hoursTo30C: hoursTo(30),
    hoursTo34C: hoursTo(34),
    // Only drawings ask for it.
    get series() {
      return settled ? [{ hours: 0, waterC: startC }] : integrate(tank, startC, equilibriumC, seriesSpan, panels)
    },
  }
}

/** Closed form of the same without evaporation: T = room + (P/UA)(1 − e^(−t UA/C)), from room temperature. RangeError for NaN. */
export function warmWithoutEvaporationC(
  inputW: number,
  lossWK: number,
  heatCapacityJK: number,
  roomC: number,
  hours: number,
): number {
  requireFinite({ inputW, lossWK, heatCapacityJK, roomC, hours })
  return roomC + (inputW / lossWK) * (1 - Math.exp((-hours * 3600 * lossWK) / heatCapacityJK))
}
