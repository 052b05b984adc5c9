/** A tank of about 75 L with one rear chamber of 4 × 5 × 12 in, in canonical units. */
const setup = {
  name: 'Small tank with a rear chamber',
  units: 'us',
  country: 'US',
  tank: {
    outerLengthMm: 609.6,
    outerWidthMm: 406.4,
    outerHeightMm: 355.6,
    chambers: [{ id: 'rear', lengthMm: 101.6, widthMm: 127, waterDepthMm: 304.8 }],
  },
  room: { coldestC: 18 },
  goals: { temperatureC: 25.5, coral: ['soft', 'lps'] },
}

/** Requests that work as they stand; the tests send each of them. */
export const examples = {
  ask: { text: 'heater for a 20 gallon with a 4 x 5 x 12 inch rear chamber, flat gets down to 60 °F', units: 'us' },
  fit: { setup, kind: 'heater', limit: 5 },
  fitCheck: {
    setup,
    piece: {
      kind: 'heater',
      specs: { powerW: 100, lengthMm: { value: 240, source: 'measured', plusMinus: 1 }, diameterMm: 24 },
    },
  },
  replacements: {
    setup: {
      ...setup,
      items: [
        {
          id: 'heater',
          kind: 'heater',
          specs: { form: 'titanium-rod', powerW: 100, lengthMm: 210, diameterMm: 19, thermostat: 'external-included' },
          state: 'gone',
        },
      ],
    },
    itemId: 'heater',
    limit: 5,
  },
  report: { setup },
} as const
