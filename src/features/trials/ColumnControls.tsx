import {
  accelerationUnits,
  angleUnits,
  lengthUnits,
  logFields,
  type LogAnswer,
  type LogField,
  type LogMappingInput,
} from '../../../shared/schemas/trialLog.ts';
import { assignColumn, explicitColumns, fieldTitles, meaningOf } from './columnMapping.ts';

interface ColumnControlsProps {
  answer: LogAnswer;
  given: LogMappingInput;
  change: (next: LogMappingInput) => void;
}

const unitChoices = {
  position: lengthUnits,
  acceleration: accelerationUnits,
  slipAngle: angleUnits,
} as const;

type FieldWithUnit = keyof typeof unitChoices;

/** The file's first rows; above each column what it means and in which unit, to be mended there. */
export function ColumnControls({ answer, given, change }: ColumnControlsProps) {
  const { columns, units } = answer.mapping;
  const setMeaning = (header: string, meaning: LogField | null) => {
    change({ ...given, columns: explicitColumns(assignColumn(columns, header, meaning)) });
  };
  const setUnit = (field: FieldWithUnit, unit: string) => {
    change({ ...given, units: { ...given.units, [field]: unit } });
  };
  return (
    <div
      className="overflow-x-auto"
      tabIndex={0}
      role="region"
      aria-label="First rows of the file, with the meaning of each column"
    >
      <table className="text-sm">
        <thead>
          <tr>
            {answer.headers.map((header, i) => {
              const meaning = meaningOf(columns, header);
              return (
                <th
                  key={i}
                  scope="col"
                  className="min-w-36 border-b border-line p-2 text-left align-top"
                >
                  <span className="block max-w-48 break-words">{header || `column ${i + 1}`}</span>
                  <select
                    aria-label={`Meaning of column ${header || i + 1}`}
                    value={meaning ?? ''}
                    onChange={(event) => {
                      setMeaning(header, (event.target.value || null) as LogField | null);
                    }}
                    className={selectClass}
                  >
                    <option value="">not used</option>
                    {logFields.map((field) => (
                      <option key={field} value={field}>
                        {fieldTitles[field]}
                      </option>
                    ))}
                  </select>
                  {meaning !== null && hasUnit(meaning) && (
                    <select
                      aria-label={`Unit of column ${header || i + 1}`}
                      value={units[meaning]}
                      onChange={(event) => {
                        setUnit(meaning, event.target.value);
                      }}
                      className={selectClass}
                    >
                      {unitChoices[meaning].map((unit) => (
                        <option key={unit}>{unit}</option>
                      ))}
                    </select>
                  )}
                </th>
              );
            })}
          </tr>
        </thead>
        <tbody>
          {answer.sample.map((cells, row) => (
            <tr key={row} className="border-b border-line">
              {answer.headers.map((_, i) => (
                <td key={i} className="max-w-48 truncate px-2 py-1 tabular-nums">
                  {cells[i] ?? ''}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const selectClass =
  'mt-1 block w-full rounded border border-control bg-raised px-2 py-1 text-sm font-normal text-ink';

function hasUnit(field: LogField): field is FieldWithUnit {
  return field in unitChoices;
}
