import type { KindKey } from '../../../kinds/index'

/** Words that pick one of an attribute's options, where that kind is asked about. */
export interface FilterChoice {
  readonly kind: KindKey
  readonly key: string
  readonly value: string | boolean
  readonly meaning: string
}

const choice = (kind: KindKey, key: string, value: string | boolean, meaning: string, phrases: string) =>
  phrases.split(', ').map((phrase) => [phrase, { kind, key, value, meaning }] as const)

export const filterChoices: readonly (readonly [string, FilterChoice])[] = [
  ...choice('heater', 'form', 'titanium-rod', 'titanium rod', 'titanium, titanium rod, titanum, titaniam, ti'),
  ...choice('heater', 'form', 'glass-rod', 'glass rod', 'glass, glass rod, quartz, glass tube'),
  ...choice('heater', 'form', 'polymer-rod', 'polymer rod', 'plastic, polymer, polymer rod, shatterproof, unbreakable'),
  ...choice('heater', 'form', 'inline', 'inline', 'inline, in line, canister heater'),
  ...choice(
    'heater',
    'thermostat',
    'built-in',
    'thermostat built in',
    'built in thermostat, internal thermostat, thermostat built in, integrated thermostat, own thermostat, with thermostat, with a thermostat',
  ),
  ...choice(
    'heater',
    'thermostat',
    'external-included',
    'external thermostat, included',
    'controller included, with controller, with a controller, w / controller, w / a controller, includes controller, comes with a controller, external controller included',
  ),
  ...choice(
    'light',
    'layout',
    'strip',
    'strip',
    'strip, strips, bar, led strip, light strip, light bar, led bar, strip light',
  ),
  ...choice('light', 'layout', 'panel', 'panel', 'panel, flat panel'),
  ...choice('light', 'layout', 'point', 'one cluster', 'puck, spot, pendant, point source, spotlight'),
  ...choice('light', 'dimmable', true, 'dimmable', 'dimmable, dimming, can be dimmed'),
  ...choice('light', 'control', 'on-unit', 'buttons on the unit', 'manual control, buttons, knobs'),
  ...choice(
    'light-mount',
    'type',
    'arm',
    'arm on the rim',
    'arm, mounting arm, light arm, gooseneck, goose neck, lamp arm',
  ),
  ...choice(
    'light-mount',
    'type',
    'hanging',
    'hanging kit',
    'hanging, hanging kit, hang, light hanging kit, hanger, light hanger, suspended',
  ),
  ...choice('light-mount', 'type', 'rim-legs', 'legs on the rim', 'legs, light legs, mounting legs, rim legs'),
  ...choice('light-mount', 'type', 'ceiling', 'ceiling mount', 'ceiling mount, from the ceiling'),
  ...choice('light-mount', 'type', 'canopy', 'canopy', 'canopy, hood'),
  ...choice(
    'return-pump',
    'dcControl',
    true,
    'speed control',
    'dc, dc pump, controllable, variable speed, adjustable speed, speed control, variable',
  ),
  ...choice('return-pump', 'submersible', true, 'submersible', 'submersible, internal'),
  ...choice('rock', 'state', 'dry', 'dry', 'dry, dry rock, dead rock'),
  ...choice('rock', 'state', 'live', 'live', 'live, live rock, liverock, liv rock'),
  ...choice('rock', 'state', 'artificial', 'artificial', 'artificial, man made, ceramic, fake'),
  ...choice('rock', 'form', 'base', 'base', 'base, base rock'),
  ...choice('rock', 'form', 'ledge', 'ledge', 'shelf, shelves, ledge, shelf rock, plates'),
  ...choice('rock', 'form', 'arch', 'arch', 'arch, arches'),
  ...choice('rock', 'form', 'branch', 'branch', 'branch, branching'),
  ...choice('rock', 'form', 'rubble', 'rubble', 'rubble, rubble rock'),
  ...choice('sand', 'state', 'dry', 'dry', 'dry, dry sand'),
  ...choice('sand', 'state', 'live', 'live', 'live, live sand, livesand'),
  ...choice('sand', 'mineral', 'aragonite', 'aragonite', 'aragonite, aragonite sand, oolite, oolitic'),
  ...choice('sand', 'mineral', 'silica', 'silica', 'silica, quartz, pool filter'),
  ...choice('sand', 'mineral', 'calcite', 'calcite', 'calcite'),
  ...choice('sand', 'mineral', 'volcanic', 'volcanic', 'volcanic, black sand, lava'),
  ...choice(
    'ro-unit',
    'boosterIncluded',
    true,
    'booster included',
    'with booster, with a booster, booster included, built in booster, with booster pump, with a booster pump',
  ),
  ...choice('ro-unit', 'tdsMeterIncluded', true, 'TDS meter included', 'tds meter, with tds meter, inline tds'),
  ...choice(
    'salinity-meter',
    'method',
    'refractometer',
    'refractometer',
    'refractometer, refractomter, refractomoter, refracto meter, refractor meter, refractometre',
  ),
  ...choice('salinity-meter', 'method', 'hydrometer', 'hydrometer', 'hydrometer, swing arm hydrometer'),
  ...choice(
    'salinity-meter',
    'method',
    'conductivity',
    'conductivity',
    'conductivity, conductivity meter, salinity probe, salinity pen, digital',
  ),
  ...choice('test-kit', 'parameters', 'ammonia', 'tests ammonia', 'ammonia, ammonia test, ammonia test kit, nh3'),
  ...choice('test-kit', 'parameters', 'nitrite', 'tests nitrite', 'nitrite, nitrite test, nitrite test kit, no2'),
  ...choice('test-kit', 'parameters', 'nitrate', 'tests nitrate', 'nitrate, nitrate test, nitrate test kit, no3'),
  ...choice('test-kit', 'parameters', 'ph', 'tests pH', 'ph, ph test, ph test kit'),
  ...choice(
    'test-kit',
    'parameters',
    'alkalinity',
    'tests alkalinity',
    'alkalinity, alk, kh, dkh, alkalinity test, alkalinity test kit',
  ),
  ...choice('test-kit', 'parameters', 'calcium', 'tests calcium', 'calcium, calcium test, calcium test kit'),
  ...choice('test-kit', 'parameters', 'magnesium', 'tests magnesium', 'magnesium, magnesium test, magnesium test kit'),
  ...choice(
    'test-kit',
    'parameters',
    'phosphate',
    'tests phosphate',
    'phosphate, phosphate test, phosphate test kit, po4',
  ),
  ...choice(
    'scraper',
    'form',
    'magnet',
    'magnet',
    'magnet, magnetic, magnet cleaner, algae magnet, cleaning magnet, magnetic scraper, magnetic cleaner, magnet scraper, magnetic glass cleaner, magnet float, float magnet, floating magnet, magnetic algae cleaner, glass magnet, magnet glass cleaner, cleaner magnet',
  ),
  ...choice(
    'scraper',
    'form',
    'handheld',
    'handheld',
    'handheld, hand held, long handle, on a stick, with handle, with a handle, blade scraper, scraper blade, handle',
  ),
  ...choice(
    'scraper',
    'acrylicSafe',
    true,
    'safe on acrylic',
    "acrylic safe, safe for acrylic, safe on acrylic, won't scratch acrylic",
  ),
  ...choice(
    'power-strip',
    'surgeProtected',
    true,
    'surge protected',
    'surge, surge protector, surge protected, surge protection, surge strip',
  ),
  ...choice('stand', 'backOpen', true, 'open back', 'open back, backless, no back'),
]

/** Words that say something of the setup, whatever is asked about. */
export interface FieldChoice {
  readonly path: string
  readonly value: string | boolean | number
  readonly meaning: string
}

const said = (path: string, value: FieldChoice['value'], meaning: string, phrases: string) =>
  phrases.split(', ').map((phrase) => [phrase, { path, value, meaning }] as const)

export const fieldChoices: readonly (readonly [string, FieldChoice])[] = [
  ...said('tank.material', 'acrylic', 'acrylic tank', 'acrylic, acrilic, acryllic'),
  ...said(
    'tank.material',
    'glass',
    'glass tank',
    'glass tank, glass aquarium, glass cube, low iron, low iron glass, glass',
  ),
  ...said('tank.rim', 'rimless', 'rimless tank', 'rimless, rim less, no rim, without a rim, rimles, frameless'),
  ...said('tank.rim', 'rimmed', 'rimmed tank', 'rimmed, plastic rim, with a rim, with rim, framed, black rim'),
  ...said(
    'tank.rim',
    'braced',
    'braced tank',
    'braced, euro braced, eurobraced, euro brace, eurobrace, center brace, centre brace',
  ),
  ...said(
    'tank.lid',
    'none',
    'no lid',
    'no lid, w / o lid, w / o a lid, open top, without a lid, open topped, lidless, topless, without lid',
  ),
  ...said(
    'tank.lid',
    'mesh',
    'mesh lid',
    'mesh lid, mesh top, screen top, screen lid, mesh screen, netting top, mesh cover',
  ),
  ...said(
    'tank.lid',
    'solid',
    'solid lid',
    'glass lid, glass top, solid lid, acrylic lid, hood, with a lid, with lid, covered, polycarbonate lid, glass cover',
  ),
  ...said(
    'support.kind',
    'furniture',
    'stands on furniture',
    'desk, dresser, table, counter, countertop, counter top, kitchen counter, sideboard, cupboard, shelf, furniture',
  ),
  ...said('goals.sandDepthMm', 0, 'no sand', 'no sand, bare bottom, barebottom, without sand, w / o sand'),
  ...said('tank.shape', 'cube', 'cube', 'cube'),
  ...said('tank.shape', 'bow-front', 'bow front', 'bow front, bowfront, bowed front'),
  ...said('tank.shape', 'cylinder', 'cylinder', 'cylinder, cylindrical, round tank'),
  ...said('tank.shape', 'corner', 'corner tank', 'corner tank, pentagon'),
  ...said(
    'tank.filtration',
    'rear-chambers',
    'rear chambers',
    'all in 1, aio, rear chambers, back chambers, all in 1 tank, aio tank, allinone',
  ),
  ...said('tank.filtration', 'sump', 'a sump', 'sump, refugium, with sump, with a sump'),
  ...said(
    'tank.filtration',
    'hang-on',
    'hang-on filtration',
    'hang on back, hob, hang on filter, hob filter, hang on the back',
  ),
  ...said('tank.filtration', 'none', 'no sump or chambers', 'no sump, sumpless, no filter, without a sump'),
  ...said(
    'goals.appControl',
    true,
    'set by app',
    'app, app control, app controlled, wifi, wi fi, bluetooth, controlled by phone, from my phone, phone app, smart',
  ),
  ...said(
    'mains.residualCurrentProtected',
    true,
    'ground-fault protected outlet',
    'gfci, gfi, rcd, rcbo, gfci outlet, gfci protected, ground fault, rcd protected',
  ),
  ...said(
    'mains.residualCurrentProtected',
    false,
    'no ground-fault protection',
    'no gfci, no gfi, no rcd, without gfci, not gfci',
  ),
]
