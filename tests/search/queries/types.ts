export const queryClasses = [
  'exact',
  'one typo',
  'two typos',
  'swapped letters',
  'missing letters',
  'word order',
  'glued words',
  'split words',
  'model number',
  'synonym',
  'unit variant',
  'no answer',
] as const

export type QueryClass = (typeof queryClasses)[number]

export type Grade = 1 | 2 | 3

/**
 * What answers a query, by grade: 3 is what was meant, 2 would please whoever asked, 1 is of the same family. Each text
 * holds patterns parted by spaces: a slug in which `*` stands for anything, or `kind:heater[powerW=100,form=glass-rod]`
 * with values or ranges (`lengthMm=240..260`). What no pattern names has grade 0.
 */
export type Judgements = Partial<Record<Grade, string>>

export type QueryTable = Readonly<Record<QueryClass, Readonly<Record<string, Judgements>>>>
