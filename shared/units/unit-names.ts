import type { Quantity, UcumCode } from './units'

/** A unit that can be typed or shown: value in the quantity's base unit = (value + offset) × factor. */
export interface NamedUnit {
  readonly symbol: string
  readonly ucum: UcumCode
  readonly factor: number
  readonly offset?: number
  /** Ways of typing it besides the symbol, in lower case without spaces or full stops. */
  readonly spellings: readonly string[]
  /** Symbol of the smaller unit that may follow it, as inches follow feet. */
  readonly then?: string
}

const unit = (
  symbol: string,
  ucum: UcumCode,
  factor: number,
  spellings = '',
  more: { offset?: number; then?: string } = {},
): NamedUnit => ({ symbol, ucum, factor, spellings: spellings === '' ? [] : spellings.split(' '), ...more })

/**
 * Factors are exact by definition: inch, foot and pound from the 1959 agreement, US gallon 231 cubic inches, imperial
 * gallon 4.54609 L, psi as lbf/in² with standard gravity 9.80665 m/s², Btu(IT) 1055.05585262 J (NIST SP 811 app. B;
 * UCUM `ucum-essence.xml`).
 */
const litresPerUsGallon = 3.785411784
const litresPerImperialGallon = 4.54609
const kgPerPound = 0.45359237

const volumes: readonly NamedUnit[] = [
  unit('L', 'L', 1, 'l liter liters litre litres ltr ltrs'),
  unit('mL', 'mL', 0.001, 'ml milliliter milliliters millilitre millilitres cc cm3'),
  unit('m³', 'm3', 1000, 'm3 cubicmeter cubicmeters cubicmetre cubicmetres cbm'),
  unit(
    'gal',
    '[gal_us]',
    litresPerUsGallon,
    'g gals gallon gallons usgal usgals usgallon usgallons galus gallonus gallonsus',
  ),
  unit(
    'imp gal',
    '[gal_br]',
    litresPerImperialGallon,
    'impgal impgals impgallon impgallons imperialgal imperialgallon imperialgallons ukgal ukgals ukgallon ukgallons',
  ),
  unit('qt', '[qt_us]', litresPerUsGallon / 4, 'qts quart quarts usqt usquart usquarts'),
]

const periods = [
  { symbol: 'h', ucum: 'h', perWeek: 168, spellings: ['h', 'hr', 'hrs', 'hour', 'hours'], initial: 'h' },
  { symbol: 'min', ucum: 'min', perWeek: 10080, spellings: ['min', 'mins', 'minute', 'minutes'], initial: 'm' },
  { symbol: 'day', ucum: 'd', perWeek: 7, spellings: ['d', 'day', 'days'], initial: 'd' },
  { symbol: 'week', ucum: 'wk', perWeek: 1, spellings: ['wk', 'wks', 'week', 'weeks'], initial: '' },
]

/** The trade writes "gph" and "gpd", "lph" and "lpd". */
const initialOf: Readonly<Record<string, string>> = { L: 'l', gal: 'g' }

const flows = volumes.flatMap((volume) =>
  periods.map((period): NamedUnit => {
    const first = initialOf[volume.symbol]
    return {
      symbol: `${volume.symbol}/${period.symbol}`,
      ucum: `${volume.ucum}/${period.ucum}`,
      factor: volume.factor * period.perWeek,
      spellings: [
        ...[volume.symbol, ...volume.spellings].flatMap((name) => period.spellings.map((per) => `${name}/${per}`)),
        ...(first !== undefined && period.initial !== '' ? [`${first}p${period.initial}`] : []),
      ],
    }
  }),
)

/** What can be typed for each quantity. The unit with factor 1 is the quantity's base. */
export const namedUnits: Readonly<Record<Quantity, readonly NamedUnit[]>> = {
  length: [
    unit('mm', 'mm', 1, 'millimeter millimeters millimetre millimetres mms'),
    unit('cm', 'cm', 10, 'centimeter centimeters centimetre centimetres cms'),
    unit('m', 'm', 1000, 'meter meters metre metres', { then: 'cm' }),
    unit('in', '[in_i]', 25.4, '" inch inches ins'),
    unit('ft', '[ft_i]', 304.8, "' foot feet", { then: 'in' }),
    unit('yd', '[yd_i]', 914.4, 'yds yard yards'),
  ],
  volume: volumes,
  power: [
    unit('W', 'W', 1, 'w watt watts'),
    unit('kW', 'kW', 1000, 'kw kilowatt kilowatts'),
    unit('Btu/h', '[Btu_IT]/h', 1055.05585262 / 3600, 'btu/h btu/hr btu/hour btuh'),
  ],
  flow: flows,
  temperature: [
    unit('°C', 'Cel', 1, 'c degc celsius centigrade degcelsius degreesc degreescelsius'),
    unit('°F', '[degF]', 5 / 9, 'f degf fahrenheit degfahrenheit degreesf degreesfahrenheit', { offset: -32 }),
    unit('K', 'K', 1, 'k kelvin kelvins', { offset: -273.15 }),
  ],
  'temperature difference': [
    unit('K', 'K', 1, 'k kelvin kelvins'),
    unit('°C', 'K', 1, 'c degc celsius centigrade degcelsius degreesc degreescelsius'),
    unit('°F', '[degF]', 5 / 9, 'f degf fahrenheit degfahrenheit degreesf degreesfahrenheit'),
  ],
  mass: [
    unit('kg', 'kg', 1, 'kgs kilo kilos kilogram kilograms'),
    unit('g', 'g', 0.001, 'gram grams'),
    unit('lb', '[lb_av]', kgPerPound, 'lbs pound pounds', { then: 'oz' }),
    unit('oz', '[oz_av]', kgPerPound / 16, 'ozs ounce ounces'),
  ],
  density: [
    unit('kg/L', 'kg/L', 1, 'kg/litre kg/liter g/cm3 g/cc g/ml'),
    unit('kg/m³', 'kg/m3', 0.001, 'kg/m3'),
    unit('lb/gal', '[lb_av]/[gal_us]', kgPerPound / litresPerUsGallon, 'lbs/gal lb/gallon lbs/gallon pounds/gallon'),
  ],
  pressure: [
    unit('kPa', 'kPa', 1, 'kilopascal kilopascals'),
    unit('psi', '[psi]', 6.894757293168, 'lb/in2 lbf/in2'),
    unit('bar', 'bar', 100, 'bars'),
    unit('mbar', 'mbar', 0.1, 'millibar millibars'),
    unit('MPa', 'MPa', 1000, 'megapascal megapascals'),
  ],
  salinity: [unit('ppt', '[ppth]', 1, '‰ psu g/kg o/oo')],
  concentration: [unit('ppm', '[ppm]', 1, 'mg/l')],
  hardness: [unit('dKH', '{dKH}', 1, '°dkh °kh kh')],
  'photon flux density': [
    unit(
      'µmol/m²/s',
      'umol/(m2.s)',
      1,
      'umol/m2/s umol/(m2s) µmol/(m2s) µmol/(m2·s) umolm-2s-1 µmolm-2s-1 umol µmol par ppfd',
    ),
  ],
  'photon flux': [unit('µmol/s', 'umol/s', 1, 'umol/s umols-1 µmols-1 umol µmol')],
  voltage: [unit('V', 'V', 1, 'volt volts vac vdc')],
  current: [unit('A', 'A', 1, 'amp amps ampere amperes'), unit('mA', 'mA', 0.001, 'milliamp milliamps')],
  angle: [unit('°', 'deg', 1, 'deg degs degree degrees')],
  wavelength: [unit('nm', 'nm', 1, 'nanometer nanometers nanometre nanometres')],
  duration: [
    unit('h', 'h', 1, 'hr hrs hour hours', { then: 'min' }),
    unit('min', 'min', 1 / 60, 'mins minute minutes'),
    unit('d', 'd', 24, 'day days'),
  ],
  turnover: [unit('/h', '/h', 1, 'x × /hr /hour x/h ×/h x/hr ×/hr x/hour times/h times/hr times/hour times')],
  count: [
    unit('', '1', 1, 'x × pc pcs piece pieces outlet outlets socket sockets plug plugs test tests channel channels'),
  ],
  fraction: [unit('%', '%', 0.01, 'percent pct')],
  ratio: [unit(': 1', '1', 1, 'to1')],
}
