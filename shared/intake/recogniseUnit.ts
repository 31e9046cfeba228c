import type { AccelerationUnit } from '../units/acceleration.ts';
import type { AngleUnit } from '../units/angle.ts';
import type { LengthUnit } from '../units/length.ts';

export type TemperatureUnit = '°C' | '°F' | 'K';

/** Spellings without blanks, in lower case, of the units a log may carry. */
const lengths = table<LengthUnit>({
  mm: ['mm', 'millimetre', 'millimetres', 'millimeter', 'millimeters'],
  cm: ['cm', 'centimetre', 'centimetres', 'centimeter', 'centimeters'],
  m: ['m', 'metre', 'metres', 'meter', 'meters'],
  in: ['in', 'inch', 'inches', '"'],
});

const accelerations = table<AccelerationUnit>({
  'rad/s²': [
    'rad/s²',
    'rad/s2',
    'rad/s^2',
    'rad/s/s',
    'rads2',
    'radpers2',
    'radpers²',
    'rad·s⁻²',
    'rads-2',
    'rad/sec²',
    'rad/sec2',
    'rad/sec^2',
    '1/s²',
    '1/s2',
  ],
  'deg/s²': [
    'deg/s²',
    'deg/s2',
    'deg/s^2',
    'deg/s/s',
    'degs2',
    'degpers2',
    'degpers²',
    '°/s²',
    '°/s2',
    '°/s^2',
    'deg/sec²',
    'deg/sec2',
    'degrees/s²',
    'degrees/s2',
    'grad/s²',
  ],
  'rev/s²': [
    'rev/s²',
    'rev/s2',
    'rev/s^2',
    'rev/s/s',
    'revs2',
    'rev/sec²',
    'rps/s',
    'turns/s²',
    'u/s²',
  ],
  'rpm/s': ['rpm/s', 'rpms', 'rpm/sec', 'min⁻¹/s', 'u/min/s', 'rev/min/s'],
});

const angles = table<AngleUnit>({
  rad: ['rad', 'radian', 'radians'],
  '°': ['°', 'deg', 'degree', 'degrees', 'grad'],
});

const temperatures = table<TemperatureUnit>({
  '°C': ['°c', 'c', 'degc', 'celsius', 'deg c'],
  '°F': ['°f', 'f', 'degf', 'fahrenheit'],
  K: ['k', 'kelvin'],
});

/** A unit of length as written in a header; undefined when it is not one. */
export function lengthUnitOf(text: string): LengthUnit | undefined {
  return lengths.get(spelling(text));
}

export function accelerationUnitOf(text: string): AccelerationUnit | undefined {
  return accelerations.get(spelling(text));
}

export function angleUnitOf(text: string): AngleUnit | undefined {
  return angles.get(spelling(text));
}

export function temperatureUnitOf(text: string): TemperatureUnit | undefined {
  return temperatures.get(spelling(text));
}

/** Whether a text is any unit at all, so that `alpha_rad_s2` can be told from a plain name. */
export function isUnit(text: string): boolean {
  const key = spelling(text);
  return [lengths, accelerations, angles, temperatures].some((units) => units.has(key));
}

/** Blanks out; `º` (ordinal) and `˚` (ring) are what people type for a degree sign. */
function spelling(text: string): string {
  return text.replace(/\s+/g, '').replace(/[º˚]/g, '°').toLowerCase();
}

function table<Unit extends string>(spellings: Record<Unit, string[]>): Map<string, Unit> {
  const map = new Map<string, Unit>();
  for (const unit of Object.keys(spellings) as Unit[]) {
    for (const word of spellings[unit]) map.set(word.replace(/\s+/g, ''), unit);
  }
  return map;
}
