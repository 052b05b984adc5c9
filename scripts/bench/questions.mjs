/** Another setup for every number: nothing that one request computed serves the next. */
function describeSetup(/** @type {number} */ index) {
  const step = (/** @type {number} */ low, /** @type {number} */ high, /** @type {number} */ period) =>
    Number((low + ((high - low) * ((index * 7919) % period)) / period).toFixed(3))
  return {
    units: index % 2 === 0 ? 'us' : 'metric',
    country: index % 2 === 0 ? 'US' : 'DE',
    tank: {
      volumeL: step(70, 110, 1009),
      chambers: [
        { id: 'rear', lengthMm: step(95, 140, 997), widthMm: step(90, 130, 991), waterDepthMm: step(260, 340, 983) },
      ],
    },
    room: { coldestC: step(15, 20, 977), temperatureC: step(20.5, 23, 971) },
  }
}

/** What people come with: a volume, one chamber and a cold room. */
export const askForHeater = (/** @type {number} */ index) => ({
  method: 'POST',
  path: '/api/v1/fit',
  body: JSON.stringify({ setup: describeSetup(index), kind: 'heater' }),
})

const furniture = [
  { id: 'strip', kind: 'power-strip', specs: { outlets: 6, ratedA: 15 } },
  { id: 'lamp', kind: 'light', specs: { powerW: 60, plugs: 1 } },
  { id: 'pump', kind: 'return-pump', specs: { powerW: 20, plugs: 1 } },
]

/** The same where the tank is furnished, so that every candidate is weighed against what is there. */
export const askForHeaterAmongItems = (/** @type {number} */ index) => ({
  method: 'POST',
  path: '/api/v1/fit',
  body: JSON.stringify({ setup: { ...describeSetup(index), items: furniture }, kind: 'heater' }),
})

const goneHeater = {
  id: 'heater',
  kind: 'heater',
  specs: {
    form: 'titanium-rod',
    powerW: 100,
    lengthMm: 220,
    diameterMm: 20,
    thermostat: 'external-included',
    plugs: 1,
  },
  state: 'gone',
}

/** What can take the place of a heater that is gone from that tank. */
export const askForReplacement = (/** @type {number} */ index) => ({
  method: 'POST',
  path: '/api/v1/replacements',
  body: JSON.stringify({ setup: { ...describeSetup(index), items: [...furniture, goneHeater] }, itemId: 'heater' }),
})

/** A name with two letters swapped, as fingers do. */
export function misspell(/** @type {string} */ name, /** @type {number} */ index) {
  const at = 1 + (index % Math.max(1, name.length - 3))
  return `${name.slice(0, at)}${name[at + 1] ?? ''}${name[at] ?? ''}${name.slice(at + 2)}`
}
