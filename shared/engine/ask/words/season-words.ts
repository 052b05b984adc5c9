/** Which of a room's temperatures is meant. */
export type Season = 'coldest' | 'warmest' | 'usual'

const names: Readonly<Record<Season, string>> = {
  coldest:
    'coldest, cold, down to, drop to, drops to, dropping to, drop, drops, dip to, dips to, dips, fall to, falls to, low of, lows, low, lowest, winter, winters, in winter, ' +
    'at night, overnight, night, nights, min, minimum, as low as, gets down, down in, cool, cools to, coldest night, colder, bottoms out, chilly, freezing, never below, never under, goes down to, coolest, coldes, cools down to, sinks to, not below, no lower than, never drops below, never gets below',
  warmest:
    'warmest, hottest, hot, up to, rise to, rises to, high of, highs, high, highest, summer, summers, in summer, heat wave, heatwave, heat waves, max, maximum, ' +
    'as high as, warm, warms to, peaks at, peak, climbs to, hits, reaches, reach, hit, goes up to, gets up to, daytime, by day, in the day, during the day, afternoon, hottest day, never above, never over, never exceeds, tops out, tops out at, hotest, no higher than',
  usual:
    'normally, normal, usually, usual, stays, always, average, typical, typically, most days, mostly, year round, all year, constant, steady, ordinarily, generally, stable, averages, day to day, kept',
}

export const seasonPhrases: readonly (readonly [string, Season])[] = Object.entries(names).flatMap(([season, list]) =>
  list.split(', ').map((name) => [name, season as Season] as const),
)
