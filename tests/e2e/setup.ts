/** What most journeys start from: a 20 gal tank with a small rear chamber and a cool room. */
export const question = 'heater for a 20 gallon with a 4 x 5 x 12 inch rear chamber, room gets down to 60 F'

export const describedSetup = new URLSearchParams({
  kind: 'heater',
  'tank.volumeL': '20 gal',
  'tank.chambers.0.id': 'rear-1',
  'tank.chambers.0.lengthMm': '4 in',
  'tank.chambers.0.widthMm': '5 in',
  'tank.chambers.0.waterDepthMm': '12 in',
  'room.coldestC': '60 °F',
}).toString()

export const describedFinder = `/find?${describedSetup}`
