import type { Measure } from './measures'
import { findNearest, type Near } from './nearest'
import type { Reading } from './reading'
import type { Subject } from './words/subject-words'

const nearEnough = 6

/** The nearest of some subjects, if it stands beside the measure. */
export const findBeside = (reading: Reading, measure: Measure, ...subjects: readonly Subject[]): Near | undefined => {
  const near = findNearest(reading, measure, ({ subject }) => subject !== undefined && subjects.includes(subject))
  return near !== undefined && near.cost <= nearEnough ? near : undefined
}
