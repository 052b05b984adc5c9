/** Sizes that the forms, the schemas and the database agree on. */
export const limits = {
  bodyBytes: 256 * 1024,
  /** A whole setup in a link, as the canonical query string. */
  linkBytes: 6 * 1024,
  brand: 60,
  model: 100,
  slug: 120,
  notes: 4000,
  author: 60,
  summary: 300,
  evidence: 500,
  setupName: 120,
  searchText: 200,
  itemId: 64,
  items: 200,
  quantity: 99,
  page: 24,
  pageMax: 100,
  answers: 10,
  answersMax: 50,
  cursor: 400,
} as const
