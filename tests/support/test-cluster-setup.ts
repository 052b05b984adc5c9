import { startTestCluster } from '../../scripts/lib/test-cluster.mjs'

/** Vitest's global setup for the API tests; what it returns runs at the end. */
export default async function setUpTestCluster(): Promise<() => Promise<void>> {
  const undos: (() => unknown)[] = []
  const tearDown = async () => {
    for (const undo of undos.reverse()) await undo()
  }
  try {
    await startTestCluster((undo) => undos.push(undo))
  } catch (error) {
    await tearDown()
    throw error
  }
  return tearDown
}
