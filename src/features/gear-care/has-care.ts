import type { GearCare } from '#shared/schemas/review'

/** Whether the reader may do anything with the entry as a whole. */
export const hasCare = ({ can }: Pick<GearCare, 'can'>): boolean =>
  can.merge || can.unmerge || can.retire || can.unretire
