import type { Question, QuestionSource } from './questions'

/** Invented setups of the usual sizes, so that the effect of a number can be seen while nobody has saved one of their own. */
const setups: readonly Omit<Question, 'origin'>[] = [
  {
    title: 'Small tank with a rear chamber, about 75 L, 120 V',
    setup: {
      units: 'us',
      country: 'US',
      tank: {
        outerLengthMm: 609.6,
        outerWidthMm: 406.4,
        outerHeightMm: 355.6,
        chambers: [{ id: 'rear', lengthMm: 101.6, widthMm: 127, waterDepthMm: 304.8 }],
      },
      room: { coldestC: 18 },
      goals: { temperatureC: 25.5 },
    },
  },
  {
    title: 'Tank of 120 × 50 × 50 cm in a cool room, 230 V',
    setup: {
      units: 'metric',
      country: 'DE',
      tank: { outerLengthMm: 1200, outerWidthMm: 500, outerHeightMm: 500 },
      room: { coldestC: 17 },
      goals: { temperatureC: 25 },
    },
  },
  {
    title: 'Cube of 40 cm in a warm room, 230 V',
    setup: {
      units: 'metric',
      country: 'GB',
      tank: { outerLengthMm: 400, outerWidthMm: 400, outerHeightMm: 400 },
      room: { coldestC: 20 },
      goals: { temperatureC: 25 },
    },
  },
]

export const askDemoQuestions: QuestionSource = () =>
  Promise.resolve(setups.map((question) => ({ ...question, origin: 'demo' })))
