/** One and several of the units that have an everyday English name. */
const NAMES: Readonly<Record<string, readonly [string, string]>> = {
  t: ['tonne', 'tonnes'],
  kg: ['kilogram', 'kilograms'],
  g: ['gram', 'grams'],
  L: ['litre', 'litres'],
  l: ['litre', 'litres'],
  m: ['metre', 'metres'],
  km: ['kilometre', 'kilometres'],
  mm: ['millimetre', 'millimetres'],
  'm²': ['square metre', 'square metres'],
  'm³': ['cubic metre', 'cubic metres'],
  s: ['second', 'seconds'],
  min: ['minute', 'minutes'],
  h: ['hour', 'hours'],
  d: ['day', 'days'],
  kn: ['knot', 'knots'],
  'm/s': ['metre per second', 'metres per second'],
  'km/h': ['kilometre per hour', 'kilometres per hour'],
  kW: ['kilowatt', 'kilowatts'],
  kWh: ['kilowatt-hour', 'kilowatt-hours'],
  MWh: ['megawatt-hour', 'megawatt-hours'],
  '°C': ['degree Celsius', 'degrees Celsius'],
  '%': ['percentage point', 'percentage points'],
};

function named(unit: string): readonly [string, string] | undefined {
  return Object.hasOwn(NAMES, unit) ? NAMES[unit] : undefined;
}

/**
 * The subject of a sentence about one step of a variable: "one more tonne of cargo", "one more day since
 * hull cleaning" (where the label begins with the unit), "a rise of 1 in crew" where there is no unit.
 */
export function oneMore(label: string, unit: string | null): string {
  if (unit === null || unit === '') return `a rise of 1 in ${label}`;
  const name = named(unit);
  if (name === undefined) return `one more ${unit} of ${label}`;
  const [one, many] = name;
  if (label === one || label === many) return `one more ${one}`;
  return label.startsWith(`${many} `)
    ? `one more ${one} ${label.slice(many.length + 1)}`
    : `one more ${one} of ${label}`;
}

/** "each tonne", "each °C": a unit inside a sentence. */
export function eachUnit(unit: string | null): string {
  return unit === null || unit === '' ? 'each 1' : `each ${named(unit)?.[0] ?? unit}`;
}
