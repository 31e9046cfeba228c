import type { LogField, LogMapping, LogMappingInput, LogProblem } from '../schemas/trialLog.ts';
import type { ColumnTrouble, Columns } from './recogniseColumns.ts';
import { spoken } from './recogniseColumns.ts';
import {
  accelerationUnitOf,
  angleUnitOf,
  lengthUnitOf,
  temperatureUnitOf,
  type TemperatureUnit,
} from './recogniseUnit.ts';

export type ResolvedUnits = {
  units: LogMapping['units'];
  temperatureUnit: TemperatureUnit;
  troubles: ColumnTrouble[];
  oddities: LogProblem[];
};

/**
 * Units of a log's columns: from the mapping, else from the header. A unit that is not known is
 * asked about; a header without one is read in the usual unit, and that is said.
 */
export function resolveUnits(columns: Columns, given: LogMappingInput['units']): ResolvedUnits {
  const troubles: ColumnTrouble[] = [];
  const oddities: LogProblem[] = [];

  const resolve = <Unit extends string>(
    field: LogField,
    chosen: Unit | undefined,
    recognise: (text: string) => Unit | undefined,
    usual: Unit,
  ): Unit => {
    const column = columns.get(field);
    if (chosen !== undefined) return chosen;
    if (!column) return usual;
    const { header, unit } = column;
    const found = unit === null ? undefined : recognise(unit);
    if (found !== undefined) return found;
    if (unit === null) {
      oddities.push({
        row: 0,
        column: header,
        value: null,
        reason: `“${header}” names no unit: its numbers were read as ${usual}. Choose another unit if that is wrong.`,
      });
    } else {
      troubles.push({
        column: header,
        reason: `The unit “${unit}” of the ${spoken(field)} is not known here: choose one of those offered.`,
      });
    }
    return usual;
  };

  const units = {
    position: resolve('position', given?.position, lengthUnitOf, 'mm'),
    acceleration: resolve('acceleration', given?.acceleration, accelerationUnitOf, 'rad/s²'),
    slipAngle: resolve('slipAngle', given?.slipAngle, angleUnitOf, '°'),
  };
  const temperature = columns.get('temperature');
  const written = temperature?.unit ?? '°C';
  const temperatureUnit = temperatureUnitOf(written);
  if (temperature && !temperatureUnit) {
    troubles.push({
      column: temperature.header,
      reason: `The unit “${written}” of the temperature is not known here: leave the column out, or write °C, °F or K in its header.`,
    });
  }
  return {
    units,
    temperatureUnit: temperatureUnit ?? '°C',
    troubles,
    oddities,
  };
}
