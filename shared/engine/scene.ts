import type { Item, Setup } from './types'
import type { Plan } from './setup/plan'
import { giveValue } from './setup/give'
import { resolve } from './setup/resolve'

/**
 * What a check sees besides the piece it judges: the setup with its defaults, and the other pieces that count. What
 * several checks compute from those is kept, so that judging ten thousand pieces computes it once.
 */
export interface Scene {
  readonly plan: Plan
  readonly others: readonly Item[]
  readonly kept: Map<unknown, unknown>
}

export const createScene = (plan: Plan, others: readonly Item[]): Scene => ({ plan, others, kept: new Map() })

/** Computes `derive(scene)` once per scene. `derive` is its own key, so it must be a named function, not a fresh closure. */
export function once<T>(scene: Scene, derive: (scene: Scene) => T): T {
  const known = scene.kept.get(derive)
  if (known !== undefined || scene.kept.has(derive)) return known as T
  const derived = derive(scene)
  scene.kept.set(derive, derived)
  return derived
}

/** Computes `derive(scene, of)` once per scene and number. */
export function onceFor<T>(scene: Scene, derive: (scene: Scene, of: number) => T, of: number): T {
  let known = scene.kept.get(derive) as Map<number, T> | undefined
  if (!known) scene.kept.set(derive, (known = new Map()))
  const before = known.get(of)
  if (before !== undefined || known.has(of)) return before as T
  const derived = derive(scene, of)
  known.set(of, derived)
  return derived
}

/** The same scene had the setup's owner said a value that was assumed; kept per path and value. */
export function vary(scene: Scene, path: string, value: number | string | boolean): Scene {
  const key = `${path}=${value}`
  const known = scene.kept.get(key) as Scene | undefined
  if (known) return known
  const varied = createScene(resolve(giveValue(scene.plan.setup, path, value)), scene.others)
  scene.kept.set(key, varied)
  return varied
}

/** The setup with other items, and with its tank replaced where asked. */
export const withItems = (setup: Setup, items: readonly Item[], tank = setup.tank): Setup => ({ ...setup, items, tank })

const tradingSizes = ['tank.outerLengthMm', 'tank.outerWidthMm', 'tank.outerHeightMm', 'tank.waterLineMm']
const followingSizes = ['tank.displayLengthMm', 'tank.displayWidthMm']

/** Of a tank that is known by its volume, the sizes that were assumed: one is larger where another is smaller. */
export const listTrading = ({ plan: { assumed } }: Scene): readonly string[] => {
  const open = tradingSizes.filter((path) => assumed.has(path))
  return open.length > 1 ? open : []
}

/** Setup paths with their defaults in use that match a rule's `uses`, the most telling first. */
export function listAssumed(scene: Scene, uses: readonly string[]): readonly string[] {
  const { assumed } = scene.plan
  const found = uses.flatMap((path) => {
    if (!path.includes('*')) return assumed.has(path) ? [path] : []
    const [head, tail] = path.split('*') as [string, string]
    return [...assumed.keys()].filter((key) => key.startsWith(head) && key.endsWith(tail))
  })
  const trading = listTrading(scene)
  const isTraded = found.some((path) => trading.includes(path) || followingSizes.includes(path))
  return isTraded ? [...new Set([...found, ...trading])] : found
}
