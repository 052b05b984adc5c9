/** Whether this process still wants visitors: shared by the listener, which drains, and by `/ready`, which tells. */
export interface Lifecycle {
  isDraining: boolean
}

export function createLifecycle(): Lifecycle {
  return { isDraining: false }
}
