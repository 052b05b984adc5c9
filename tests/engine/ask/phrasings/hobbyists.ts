import {
  chamber,
  chamberIn,
  coldest,
  fahrenheit as f,
  gallons,
  inches,
  tank,
  tankIn,
  usual,
  volume,
  volumeGal,
  warmest,
  water,
  type Phrasing,
} from './types'

const uk = { country: 'GB', 'mains.volts': 230, 'mains.plugType': 'G' }
const pounds = (value: number): number => value * 0.45359237

/** Questions at length, as they come in posts and messages: invented, in the manner of the hobby. */
export const hobbyistPhrasings: readonly Phrasing[] = [
  [
    'Hi all! New to the hobby. Just got a 32 gallon all in one and the heater chamber is only 5" x 6" with 13" of water. House gets down to 61 at night. What heater?',
    'us',
    {
      kind: 'heater',
      fields: { ...volumeGal(32), 'tank.filtration': 'rear-chambers', ...chamberIn(5, 6, 13), ...coldest(f(61)) },
    },
  ],
  [
    'Which heater would you recommend for a 13.5 gallon? My apartment is usually 72 but gets to 65 in winter',
    'us',
    { kind: 'heater', fields: { ...volumeGal(13.5), ...usual(f(72)), ...coldest(f(65)) } },
  ],
  [
    'My heater died last night and the shop is sold out. 75 gallon, sump 20 x 10 x 9 in',
    'us',
    {
      intent: 'replace',
      kind: 'heater',
      fields: {
        ...volumeGal(75),
        'tank.sump.lengthMm': 508,
        'tank.sump.widthMm': 254,
        'tank.sump.waterDepthMm': inches(9),
        'tank.filtration': 'sump',
      },
    },
  ],
  [
    'Looking for a small titanium heater, max 9 inches, 20g AIO.',
    'us',
    {
      kind: 'heater',
      filters: { form: 'titanium-rod', lengthMm: [null, inches(9)] },
      fields: { ...volumeGal(20), 'tank.filtration': 'rear-chambers' },
    },
  ],
  [
    'heater max 22 cm, min 100 W, 230V',
    'metric',
    { kind: 'heater', filters: { lengthMm: [null, 220], powerW: [100, null] }, fields: { 'mains.volts': 230 } },
  ],
  [
    'Living in the UK, tank is 90 litres, flat goes down to 14C. Heater?',
    'metric',
    { kind: 'heater', fields: { ...uk, ...volume(90), ...coldest(14) } },
  ],
  ['150w or 200w?', 'us', { kind: null }],
  [
    'need something to scrape algae off 1/2" acrylic',
    'us',
    { kind: 'scraper', fields: { 'tank.wallMm': 12.7, 'tank.material': 'acrylic' } },
  ],
  [
    'algae magnet for 3/8" glass',
    'us',
    { kind: 'scraper', filters: { form: 'magnet' }, fields: { 'tank.wallMm': 9.525, 'tank.material': 'glass' } },
  ],
  [
    'mag float style cleaner for 6mm glass nano',
    'metric',
    { kind: 'scraper', filters: { form: 'magnet' }, fields: { 'tank.wallMm': 6, 'tank.material': 'glass' } },
  ],
  [
    'which lights cover 36 x 18 x 18 for acros',
    'us',
    { kind: 'light', fields: { ...tankIn(36, 18, 18), 'goals.coral': ['sps'] } },
  ],
  [
    'Light with app control for a 60 cm tank, mostly LPS and some zoas',
    'metric',
    { kind: 'light', fields: { 'goals.appControl': true, 'tank.outerLengthMm': 600, 'goals.coral': ['soft', 'lps'] } },
  ],
  [
    'what wavemaker for 75 liters, mixed reef with torches',
    'metric',
    { kind: 'wavemaker', fields: { ...volume(75), 'goals.coral': ['lps'] } },
  ],
  ['wavemaker between 1000 and 3000 l/h', 'metric', { kind: 'wavemaker', filters: { flowMaxLph: [1000, 3000] } }],
  ['gyre under 2000 gph', 'us', { kind: 'wavemaker', filters: { flowMaxLph: [null, gallons(2000)] } }],
  [
    'return pump 300 gph for 30 gallons',
    'us',
    {
      kind: 'return-pump',
      fields: { ...volumeGal(30), 'goals.turnoverPerHour.0': 8, 'goals.turnoverPerHour.1': 12.5 },
    },
  ],
  [
    'dc return pump for a 40 gallon with a sump',
    'us',
    { kind: 'return-pump', filters: { dcControl: true }, fields: { ...volumeGal(40), 'tank.filtration': 'sump' } },
  ],
  [
    'return pump with 10x turnover',
    'us',
    { kind: 'return-pump', fields: { 'goals.turnoverPerHour.0': 8, 'goals.turnoverPerHour.1': 12.5 } },
  ],
  [
    'turnover of 5-10 times per hour',
    'us',
    { kind: null, fields: { 'goals.turnoverPerHour.0': 5, 'goals.turnoverPerHour.1': 10 } },
  ],
  [
    'skimmer under 6 x 6 x 18 in for my sump',
    'us',
    {
      kind: 'skimmer',
      filters: { lengthMm: [null, inches(6)], widthMm: [null, inches(6)], heightMm: [null, inches(18)] },
      fields: { 'tank.filtration': 'sump' },
    },
  ],
  [
    'do I need a booster pump? 35 psi and 75 gpd',
    'us',
    { kind: 'booster-pump', fields: { 'water.feedKPa': 35 * 6.894757293168 } },
  ],
  [
    '4 stage ro/di 100gpd with booster, pressure is 45psi, tds 320',
    'us',
    {
      kind: 'ro-unit',
      filters: { membraneLpd: [gallons(100), gallons(100)], boosterIncluded: true },
      fields: { 'water.feedKPa': 45 * 6.894757293168, 'water.feedTdsPpm': 320 },
    },
  ],
  [
    'RO unit 300 l/day, tap water at 12 C',
    'metric',
    { kind: 'ro-unit', filters: { membraneLpd: [300, 300] }, fields: { 'water.feedTempC': 12 } },
  ],
  ['i need about 15 gallons per week', 'us', { kind: null, fields: { 'water.litresPerWeek': gallons(15) } }],
  [
    'need a refractomter for 35 ppt',
    'us',
    { kind: 'salinity-meter', filters: { method: 'refractometer' }, fields: { 'goals.salinityPpt': 35 } },
  ],
  ['salinity 1.025 in my 20 gal', 'us', { kind: null, fields: { ...volumeGal(20), 'goals.salinityPpt': 33.2 } }],
  ['keep salinity at 35', 'us', { kind: null, fields: { 'goals.salinityPpt': 35 } }],
  [
    'salt for 50 gallon tank, 20 kg bucket',
    'us',
    { kind: 'salt-mix', filters: { packKg: [20, 20] }, fields: volumeGal(50) },
  ],
  ['40 lbs of dry rock', 'us', { kind: 'rock', filters: { state: 'dry' }, fields: { 'goals.rockKg': pounds(40) } }],
  ['I want 2 inches of sand, which one?', 'us', { kind: 'sand', fields: { 'goals.sandDepthMm': 50.8 } }],
  [
    'aragonite sand 0.5-1.5mm 9kg bag',
    'metric',
    {
      kind: 'sand',
      filters: { mineral: 'aragonite', grainMinMm: [0.5, null], grainMaxMm: [null, 1.5], packKg: [9, 9] },
    },
  ],
  [
    'stand for 60x45x45cm tank, 180 kg when full',
    'metric',
    { kind: 'stand', filters: { loadRatingKg: [180, null] }, fields: tank(600, 450, 450) },
  ],
  [
    'aquarium stand for a 48 x 18 tank',
    'us',
    { kind: 'stand', fields: { 'tank.outerLengthMm': inches(48), 'tank.outerWidthMm': inches(18) } },
  ],
  ['power bar with 4 switched outlets', 'us', { kind: 'power-strip', filters: { switchedOutlets: [4, null] } }],
  [
    '8 outlet surge strip, 15 amp breaker, GFCI',
    'us',
    {
      kind: 'power-strip',
      filters: { outlets: [8, null], surgeProtected: true },
      fields: { 'mains.circuitA': 15, 'mains.residualCurrentProtected': true },
    },
  ],
  ['only 2 free wall outlets by the tank', 'us', { kind: null, fields: { 'mains.outlets': 2 } }],
  [
    'tank sits on a desk 40 x 24 inches',
    'us',
    {
      kind: null,
      fields: { 'support.lengthMm': inches(40), 'support.widthMm': inches(24), 'support.kind': 'furniture' },
    },
  ],
  [
    'light mount for 12 mm rimless glass',
    'metric',
    { kind: 'light-mount', fields: { 'tank.wallMm': 12, 'tank.rim': 'rimless', 'tank.material': 'glass' } },
  ],
  [
    'hanging kit for a 5 kg light',
    'metric',
    { kind: 'light-mount', filters: { type: 'hanging', maxLoadKg: [5, null] } },
  ],
  ['siphon hose, tank top is 4 ft off the floor', 'us', { kind: 'siphon', fields: { 'room.tankTopMm': inches(48) } }],
  [
    'ATO with a 5 gallon reservoir',
    'us',
    { kind: 'auto-top-off', filters: { reservoirL: [gallons(4.5), gallons(5.5)] } },
  ],
  [
    'temp controller for two 100w heaters',
    'us',
    { kind: 'temperature-controller', filters: { maxLoadW: [200, null] } },
  ],
  [
    'heater controller with 2 outlets, 500 W',
    'us',
    { kind: 'temperature-controller', filters: { outlets: [2, null], maxLoadW: [500, null] } },
  ],
  ['ammonia, nitrite and nitrate tests', 'us', { kind: 'test-kit', filters: { parameters: 'ammonia' } }],
  [
    'replacement for my discontinued 24 inch light',
    'us',
    { intent: 'replace', kind: 'light', filters: { lengthMm: [inches(18), inches(30)] } },
  ],
  ["can't get my salt anymore, 20 gal", 'us', { intent: 'replace', kind: 'salt-mix', fields: volumeGal(20) }],
  [
    'Is there a heater that fits a chamber 3 in by 3 in, water 10 in deep?',
    'us',
    { kind: 'heater', fields: chamberIn(3, 3, 10) },
  ],
  [
    'will a 10 inch heater stand up in 9 inches of water, chamber 4 x 4',
    'us',
    { intent: 'check', kind: 'heater', filters: { lengthMm: [inches(9), inches(11)] }, fields: chamberIn(4, 4, 9) },
  ],
  [
    'what heater for room 62F and tank 78F, 20 gal',
    'us',
    { kind: 'heater', fields: { ...usual(f(62)), ...water(f(78)), ...volumeGal(20) } },
  ],
  ['water at 25 °C, room never below 17 °C', 'metric', { kind: null, fields: { ...water(25), ...coldest(17) } }],
  [
    'winter 62, summer 84, thermostat set to 68 most of the year',
    'us',
    { kind: null, fields: { ...coldest(f(62)), ...warmest(f(84)), ...usual(f(68)) } },
  ],
  ['my place is 70 degrees year round', 'us', { kind: null, fields: usual(f(70)) }],
  [
    'the garage hits 95 in summer and 50 in winter, keep tank at 77',
    'us',
    { kind: null, fields: { ...warmest(f(95)), ...coldest(f(50)), ...water(f(77)) } },
  ],
  ['Zimmer 18 Grad', 'metric', { kind: null }],
  ['room temp between 64 and 78', 'us', { kind: null, fields: { ...coldest(f(64)), ...warmest(f(78)) } }],
  ['18°C–27°C room', 'metric', { kind: null, fields: { ...coldest(18), ...warmest(27) } }],
  ['1,200 mm long tank', 'metric', { kind: null }],
  [
    '120cm x 60cm x 60cm, 12mm glass, euro braced',
    'metric',
    {
      kind: null,
      fields: { ...tank(1200, 600, 600), 'tank.wallMm': 12, 'tank.material': 'glass', 'tank.rim': 'braced' },
    },
  ],
  ['36"x18"x16" with mesh lid', 'us', { kind: null, fields: { ...tankIn(36, 18, 16), 'tank.lid': 'mesh' } }],
  ['tank：60×45×40ｃｍ', 'metric', { kind: null, fields: tank(600, 450, 400) }],
  ['chamber 100 mm × 120 mm × 300 mm', 'us', { kind: null, fields: chamber(100, 120, 300) }],
  ['chamber 4in x 12cm x 300mm', 'us', { kind: null, fields: chamber(101.6, 120, 300) }],
  ['chamber W 5 in L 4 in D 12 in', 'us', { kind: null, fields: chamberIn(4, 5, 12) }],
  ['chamber: 4 long x 5 wide x 12 deep', 'us', { kind: null, fields: chamberIn(4, 5, 12) }],
  [
    'chambers are 4x5x12, 6x5x12 and 4x5x10 inches',
    'us',
    { kind: null, fields: { ...chamberIn(4, 5, 12), ...chamberIn(6, 5, 12, 1), ...chamberIn(4, 5, 10, 2) } },
  ],
  [
    'Skimmer broke; chamber 6 x 7 x 14 in; 40 gal',
    'us',
    { intent: 'replace', kind: 'skimmer', fields: { ...chamberIn(6, 7, 14), ...volumeGal(40) } },
  ],
  ['I have a 40 gallon breeder', 'us', { kind: null, fields: { ...volumeGal(40), ...tankIn(36, 18, 16) } }],
  ['two hundred litre tank', 'metric', { kind: null, fields: volume(200) }],
  ['four and a half inch net', 'us', { kind: 'net', filters: { openingMm: [inches(4.05), inches(4.95)] } }],
  ['about a hundred watts of heater', 'us', { kind: 'heater', filters: { powerW: [90, 110] } }],
  [
    'glass heater with built-in thermostat under 12in, 20gal, 65F room',
    'us',
    {
      kind: 'heater',
      filters: { form: 'glass-rod', thermostat: 'built-in', lengthMm: [null, inches(12)] },
      fields: { ...volumeGal(20), ...usual(f(65)) },
    },
  ],
  [
    'what else am I missing from my 20 gal setup? I have a light, a heater and a wavemaker',
    'us',
    { intent: 'missing', kind: null, fields: volumeGal(20) },
  ],
  [
    'Palelight Lumen 24 is out of stock, tank is 24 x 18 x 18',
    'us',
    { intent: 'replace', kind: 'light', fields: tankIn(24, 18, 18) },
  ],
  [
    'is the Kelpway Drift strong enough for 40 gallons',
    'us',
    { intent: 'check', kind: 'wavemaker', fields: volumeGal(40) },
  ],
  [
    'Tidewright Ember T-150 in a 4x5x12 chamber?',
    'us',
    { intent: 'check', kind: 'heater', fields: chamberIn(4, 5, 12) },
  ],
  [
    'which tank between 20 and 30 gallons has rear chambers',
    'us',
    {
      kind: 'tank',
      filters: { nominalVolumeL: [gallons(20), gallons(30)] },
      fields: { 'tank.filtration': 'rear-chambers' },
    },
  ],
  ['my tank cracked, it was 24 x 18 x 12 in', 'us', { intent: 'replace', kind: 'tank', fields: tankIn(24, 18, 12) }],
  ['the dead rock is fine, need live sand', 'us', { kind: 'sand', filters: { state: 'live' } }],
  [
    'A heater\nTank: 20 gal\nChamber: 4 x 5 x 12\nRoom: 60F',
    'us',
    { kind: 'heater', fields: { ...volumeGal(20), ...chamberIn(4, 5, 12), ...usual(f(60)) } },
  ],
  ['20gal/75L', 'us', { kind: null, fields: volumeGal(20) }],
  ['heater <= 30cm, >= 75W', 'metric', { kind: 'heater', filters: { lengthMm: [null, 300], powerW: [75, null] } }],
  ['heater less than 3 cm thick', 'metric', { kind: 'heater', filters: { diameterMm: [null, 30] } }],
  ['Heater for 20 gals. Ceiling fan in the room.', 'us', { kind: 'heater', fields: volumeGal(20) }],
  [
    'which powerhead for 3/4" acrylic and 180 gallons',
    'us',
    { kind: 'wavemaker', fields: { 'tank.wallMm': 19.05, 'tank.material': 'acrylic', ...volumeGal(180) } },
  ],
  ['50% water change every week', 'us', { kind: null }],
  ['no gfci in my house', 'us', { kind: null, fields: { 'mains.residualCurrentProtected': false } }],
  ['heater, cord at least 6 ft', 'us', { kind: 'heater', filters: { cordMm: [inches(72), null] } }],
]
