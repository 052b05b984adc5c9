import type { KindKey } from '../../../kinds/index'

/** How hobbyists name each kind, common misspellings included. Separated by commas; plurals are understood. */
const names: Readonly<Record<KindKey, string>> = {
  tank: 'tank, aquarium, fish tank, aquaria, nano cube, display tank, fishtank, aquarim, acquarium, tanl',
  stand: 'stand, cabinet, tank stand, aquarium stand, aquarium cabinet, tank cabinet, stnad',
  light:
    'light, lite, lamp, led, led light, lighting, light fixture, fixture, reef light, light bar, led bar, leds, ligt, lihgt, ' +
    'reef lamp, tank light, aquarium light, par light, luminaire',
  'light-mount':
    'light mount, light arm, light bracket, mounting arm, mounting bracket, light hanger, hanging kit, light hanging kit, ' +
    'mount for light, mount for my light, bracket for my light, arm for my light, light holder, lamp holder, lamp arm, ' +
    'tank mount, rim mount, light legs, mounting legs, light mounting arm, light mounting kit, mount, goose neck, gooseneck',
  'light-controller':
    'light controller, lighting controller, led controller, light dimmer, light timer, led dimmer, lamp controller, dimmer, ' +
    'controller for my light, lights controller',
  heater:
    'heater, heeter, heatr, heatter, heter, haeter, heating rod, heater rod, titanium rod, heating element, aquarium heater, tank heater, ' +
    'titanium heater, glass heater, submersible heater, heating, something to heat, to heat, heat source, warm up',
  'temperature-controller':
    'temperature controller, controller, temp controller, heater controller, thermostat controller, external thermostat, thermostat, ' +
    'temperture controller, temprature controller, controller for my heater, temperature regulator, temp control, heating controller, ' +
    'controller for a heater, controller for the heater',
  'return-pump':
    'return pump, retun pump, return, main pump, sump pump, return pmp, dc pump, ac pump, circulation pump, water pump, pump',
  wavemaker:
    'wavemaker, wave maker, powerhead, power head, circulation powerhead, wave pump, flow pump, wavemakers, wave makr, ' +
    'wavemker, stream pump, propeller pump, nano powerhead',
  skimmer: 'skimmer, protein skimmer, skimer, foam fractionator, protien skimmer, protein skimer',
  'auto-top-off':
    'auto top off, auto top up, ato, auto topoff, top off system, automatic top off, automatic top up, top up system, auto fill, ' +
    'top off, autotopoff, auto top of, top off unit, ato unit, evaporation top off',
  rock: 'rock, live rock, dry rock, reef rock, base rock, rockwork, rocks, liverock, aquascape rock, dead rock, liv rock',
  sand: 'sand, live sand, dry sand, substrate, aragonite, gravel, aragonite sand, reef sand, livesand, substrat, oolite',
  'ro-unit':
    'ro / di, ro / di unit, ro unit, rodi, rodi unit, ro, ro di, ro di unit, reverse osmosis, reverse osmosis unit, ro / di system, rodi system, ' +
    'ro system, water filter, ro filter, rodi filter, ro / di filter, reverse osmosis system, ro water maker, reverse osmosis filter, osmosis unit',
  'booster-pump': 'booster pump, booster, ro booster, pressure pump, ro booster pump, pressure booster, rodi booster',
  'salinity-meter':
    'refractometer, salinity meter, hydrometer, salinity tester, salinity probe, salinity checker, refractomter, refractomoter, ' +
    'salinometer, conductivity meter, refracto meter, refractor meter, salinity pen, swing arm hydrometer, refractometre, salt meter',
  'test-kit':
    'test kit, testkit, ammonia test, nitrate test, nitrite test, water test, testing kit, alkalinity test, calcium test, ' +
    'magnesium test, phosphate test, ph test, ammonia test kit, nitrate test kit, nitrite test kit, alkalinity test kit, ' +
    'calcium test kit, magnesium test kit, phosphate test kit, ph test kit, test set, water tests, saltwater test kit, reef test kit',
  'salt-mix':
    'salt mix, salt, reef salt, marine salt, sea salt, salt bucket, bucket of salt, salts, saltmix, bag of salt, box of salt',
  scraper:
    'scraper, scrape, scraping, algae scraper, magnet cleaner, glass cleaner, algae magnet, cleaning magnet, magnetic scraper, magnetic cleaner, ' +
    'magnet scraper, glass scraper, magnetic glass cleaner, algae cleaner, window cleaner, algae blade, scrapper, algae scrapper, scraper blade, ' +
    'cleaner magnet, magnet float, float magnet, floating magnet, magnetic algae cleaner, algae pad, blade scraper, magnet glass cleaner, algae scrubber pad, glass magnet',
  siphon:
    'siphon, syphon, gravel vac, gravel vacuum, gravel cleaner, sand vacuum, sand vac, water changer, siphon tube, siphon hose, sifon, gravel siphon',
  net: 'net, fish net, dip net, catch net, fishnet, mesh net, transfer net',
  'power-strip':
    'power strip, power bar, surge protector, outlet strip, power board, extension lead, multi plug, power strips, strip plug, powerstrip, ' +
    'switched outlets strip, energy bar, extension strip, surge strip, power center, power centre, multiplug, socket strip, plug strip, outlet bar',
}

export const kindPhrases: readonly (readonly [string, KindKey])[] = Object.entries(names).flatMap(([kind, list]) =>
  list.split(', ').map((name) => [name, kind as KindKey] as const),
)

/** Right words one letter away from a kind's name. */
export const neverMisspelt: ReadonlySet<string> = new Set(
  'heated header heather theater theatre beater hearer shimmer skimmed swimmer slimmer scraped chamfer charmer leader reader'.split(
    ' ',
  ),
)
