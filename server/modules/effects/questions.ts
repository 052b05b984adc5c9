import type { KindKey } from '#shared/kinds/index'
import type { SetupRequest } from '#shared/schemas/setup'

/** Somebody's standing question: whether pieces of a kind fit their setup. */
export interface Question {
  /** Where it comes from: `demo`, later lists, saved setups and shelves. */
  readonly origin: string
  readonly title: string
  readonly setup: SetupRequest
}

/** Answers the questions that a change of this piece may touch. */
export type QuestionSource = (kind: KindKey, slug: string | null) => Promise<readonly Question[]>

export interface QuestionBook {
  readonly register: (source: QuestionSource) => void
  readonly list: QuestionSource
}

/** Collects everybody's standing questions, without knowing who asks. */
export function createQuestionBook(): QuestionBook {
  const sources: QuestionSource[] = []
  return {
    register: (source) => void sources.push(source),
    list: async (kind, slug) => (await Promise.all(sources.map((source) => source(kind, slug)))).flat(),
  }
}
