const day = 24 * 60 * 60 * 1000

/** A session ends after so long without use, and after so long in any case. */
export const sessionLimits = {
  idleMs: 14 * day,
  absoluteMs: 90 * day,
  /** Use is written down no more often than this: most requests only read. */
  touchMs: 60 * 60 * 1000,
} as const
