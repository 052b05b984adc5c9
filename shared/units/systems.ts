/** The two unit systems that everything can be typed and read in: inches, US gallons and °F, or millimetres, litres and °C. */
export type UnitSystem = 'us' | 'metric'

export const unitSystems: readonly UnitSystem[] = ['us', 'metric']
