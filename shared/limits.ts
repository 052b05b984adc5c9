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
  /** Of a person: public, and part of an address. */
  personName: 40,
  email: 254,
  passwordMin: 15,
  password: 256,
  summary: 300,
  evidence: 500,
  /** A value as it was typed. */
  raw: 120,
  /** Photos and documents behind one value. */
  filesPerValue: 8,
  /** What one person writes to another. */
  words: 2000,
  reason: 300,
  setupName: 120,
  searchText: 200,
  sort: 60,
  question: 2000,
  itemId: 64,
  items: 200,
  quantity: 99,
  page: 24,
  pageMax: 100,
  answers: 10,
  answersMax: 50,
  cursor: 400,
} as const
