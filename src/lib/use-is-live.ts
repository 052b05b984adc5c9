import { useSyncExternalStore } from 'react'

const subscribe = () => () => undefined

/** False until the page's scripts listen: what only they can do is not offered before. */
export const useIsLive = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => true,
    () => false,
  )
