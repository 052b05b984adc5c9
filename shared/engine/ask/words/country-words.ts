/** ISO 3166-1 alpha-2 codes by what people write; they decide the mains. */
const names: Readonly<Record<string, string>> = {
  US: 'usa, america, united states, u . s, u . s . a, u . s ., the us, north america, stateside',
  CA: 'canada, canadian',
  MX: 'mexico',
  GB: 'uk, u . k, u . k ., united kingdom, england, scotland, wales, britain, great britain, northern ireland, london',
  IE: 'ireland',
  FR: 'france',
  DE: 'germany, berlin',
  NL: 'netherlands, holland',
  BE: 'belgium',
  ES: 'spain',
  PT: 'portugal',
  IT: 'italy',
  AT: 'austria',
  CH: 'switzerland',
  SE: 'sweden',
  NO: 'norway',
  DK: 'denmark',
  FI: 'finland',
  PL: 'poland',
  CZ: 'czechia, czech republic',
  GR: 'greece',
  AU: 'australia, aus, aussie',
  NZ: 'new zealand, nz',
  JP: 'japan',
  SG: 'singapore',
  MY: 'malaysia',
  HK: 'hong kong',
}

export const countryPhrases: readonly (readonly [string, string])[] = Object.entries(names).flatMap(([code, list]) =>
  list.split(', ').map((name) => [name, code] as const),
)
