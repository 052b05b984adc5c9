/** What a measure can be of, besides the piece that is asked about. */
export type Subject =
  | 'chamber'
  | 'tank'
  | 'room'
  | 'water'
  | 'sump'
  | 'support'
  | 'wall'
  | 'sand'
  | 'rock'
  | 'feed'
  | 'mains'
  | 'ceiling'
  | 'reservoir'
  | 'water-change'
  | 'salinity'
  | 'humidity'
  | 'cord'
  | 'water-line'
  | 'stand-height'
  | 'mount-height'
  | 'posture'
  | 'outdoors'
  | 'opening'

const names: Readonly<Record<Subject, string>> = {
  chamber:
    'chamber, rear chamber, back chamber, heater chamber, pump chamber, return chamber, skimmer chamber, compartment, rear compartment, ' +
    'back compartment, rear section, back section, middle chamber, media chamber, aio chamber, rear sump, chambr, rear chambr, chamer, camber, ' +
    'heater compartment, return section, return compartment, side chamber, overflow chamber, rear filtration, back filtration, heater slot, filtration chamber, filter chamber',
  tank:
    'tank, aquarium, cube, display, system, nano, reef tank, fish tank, display tank, fishtank, setup, reef, frag tank, pico, ' +
    'footprint, tank size, tank dimensions, aquarim, glass box, build',
  room:
    'room, house, flat, apartment, home, basement, garage, office, condo, bedroom, living room, lounge, kitchen, ambient, room temp, ' +
    'room temperature, classroom, dorm, dorm room, studio, cellar, attic, conservatory, ambient temp, ambient temperature, air temp, ' +
    'air temperature, my place, the place, indoors, inside temp, thermostat is, thermostat at, thermostat set, heating goes, ac, air con, aircon, hallway, den, loft, shed, fish room, cabin, household, appartment, apartement, trailer, rv, camper, hall',
  water:
    'water, water temp, water temperature, tank temp, tank temperature, keep it at, keep it, kept at, keep the tank at, keep at, keep tank at, hold it at, hold, maintain, ' +
    'run it at, run at, running at, target, target temp, set to, set at, set point, setpoint, heat it to, heat to, heated to, keep the water at, keep my tank at, ' +
    'keep my water at, run the tank at, run my tank at, want it at, like it at, reef at, tank at, display at, temp of the tank, to keep, keeping it at, aim for, aiming for, hold at, holding',
  sump: 'sump, refugium',
  support:
    'dresser, desk, table, counter, countertop, shelf, furniture, sideboard, counter top, cupboard, kitchen counter',
  wall: 'glass thickness, wall thickness, thick glass, thick acrylic, glass wall, pane, panes, glass panes, walls, acrylic walls, glass walls, tank wall, wall, glass, acrylic',
  sand: 'sand, sand bed, sandbed, substrate, live sand, bed, aragonite, sand depth, bed depth',
  rock: 'rock, live rock, dry rock, rockwork',
  feed: 'tap, tap water, house pressure, water pressure, line pressure, mains pressure, feed, feed water, source water, tds, tap tds, tap pressure, supply, pressure',
  mains: 'outlet, wall outlet, mains, socket, wall socket, circuit, breaker, power point, wall plug',
  ceiling: 'ceiling, ceilings, ceiling height',
  reservoir: 'reservoir, top off container, ato container, top up container, ato reservoir',
  'water-change': 'water change, water changes, wc, weekly water change, change weekly, make weekly, changes',
  salinity: 'salinity, sg, specific gravity',
  humidity: 'humidity, relative humidity, rh',
  cord: 'cord, cable, power cord, power cable, lead',
  'water-line': 'water line, waterline, water level, water column',
  'stand-height': 'top of the tank, tank top, top of tank, rim height',
  opening: 'opening, hole, access hole, chamber opening, lid opening, access',
  outdoors:
    'outdoors, outdoor, outside temp, outdoor temp, outside temperature, outdoor temperature, garden, outside it',
  posture: 'stand up, stand upright, stand vertically, stand on end, stand vertical',
  'mount-height': 'above the water, above water, over the water, above the surface, above the tank, off the water',
}

export const subjectPhrases: readonly (readonly [string, Subject])[] = Object.entries(names).flatMap(
  ([subject, list]) => list.split(', ').map((name) => [name, subject as Subject] as const),
)
