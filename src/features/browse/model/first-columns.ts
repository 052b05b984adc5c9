import type { KindKey } from '#shared/kinds/index'

/** What a person asks first of each kind: the columns that its table is shown with until others are chosen. */
export const firstColumns: Readonly<Record<KindKey, readonly string[]>> = {
  tank: ['outerLengthMm', 'outerWidthMm', 'outerHeightMm', 'nominalVolumeL', 'material', 'filtration'],
  stand: ['topLengthMm', 'topWidthMm', 'heightMm', 'loadRatingKg', 'madeForVolumeL', 'massKg'],
  light: ['powerW', 'layout', 'lengthMm', 'widthMm', 'ppfdUmol', 'control'],
  'light-mount': ['type', 'maxLoadKg', 'rimMaxMm', 'spanMinMm', 'spanMaxMm'],
  'light-controller': ['controlGroup', 'channels', 'powerW', 'volts'],
  heater: ['powerW', 'form', 'lengthMm', 'diameterMm', 'thermostat', 'minImmersionMm'],
  'temperature-controller': ['maxLoadW', 'outlets', 'rangeMinC', 'rangeMaxC', 'highAlarm'],
  'return-pump': ['powerW', 'boreMm', 'lengthMm', 'widthMm', 'heightMm', 'dcControl'],
  wavemaker: ['flowMaxLph', 'powerW', 'wallMaxMm', 'lengthMm', 'diameterMm'],
  skimmer: ['ratedVolumeL', 'lengthMm', 'widthMm', 'heightMm', 'waterDepthMaxMm', 'powerW'],
  'auto-top-off': ['reservoirL', 'pumpHeadM', 'lengthMm', 'widthMm', 'powerW'],
  rock: ['state', 'form', 'packKg', 'bulkDensityKgL'],
  sand: ['mineral', 'grainMinMm', 'grainMaxMm', 'state', 'packKg'],
  'ro-unit': ['membraneLpd', 'stages', 'minFeedKPa', 'wasteRatio', 'boosterIncluded'],
  'booster-pump': ['outletKPa', 'maxLpd', 'inletMinKPa', 'powerW', 'volts'],
  'salinity-meter': ['method', 'scales', 'minPpt', 'maxPpt', 'resolutionPpt'],
  'test-kit': ['parameters', 'testsEach', 'madeFor'],
  'salt-mix': ['packKg', 'makesL', 'alkalinityDkh', 'calciumPpm', 'magnesiumPpm'],
  scraper: ['form', 'wallMinMm', 'wallMaxMm', 'blades', 'acrylicSafe'],
  siphon: ['tubeLengthMm', 'hoseLengthMm', 'tubeDiameterMm'],
  net: ['openingMm', 'meshMm', 'handleMm'],
  'power-strip': ['outlets', 'switchedOutlets', 'ratedA', 'surgeProtected', 'cordMm'],
}
