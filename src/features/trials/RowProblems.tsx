import { type LogProblem } from '../../../shared/schemas/trialLog.ts';

/** Rows with what was found in them and what to do about it. */
export function RowProblems({
  problems,
  title,
}: {
  problems: readonly LogProblem[];
  title: string;
}) {
  return (
    <div
      className="max-h-96 overflow-auto"
      tabIndex={0}
      role="region"
      aria-label={`${title}, as a table`}
    >
      <table className="w-full text-sm">
        <caption className="sr-only">{title}</caption>
        <thead>
          <tr className="text-left">
            <th scope="col" className="py-1 pr-3 text-right font-bold">
              Row
            </th>
            <th scope="col" className="py-1 pr-3 font-bold">
              Column
            </th>
            <th scope="col" className="py-1 pr-3 font-bold">
              Value
            </th>
            <th scope="col" className="py-1 font-bold">
              Why, and what to do
            </th>
          </tr>
        </thead>
        <tbody>
          {problems.map((problem, i) => (
            <tr key={i} className="border-t border-line align-top">
              <td className="py-1 pr-3 text-right tabular-nums">
                {problem.row === 0 ? 'all' : problem.row}
              </td>
              <td className="py-1 pr-3 break-words">{problem.column ?? '–'}</td>
              <td className="max-w-40 py-1 pr-3 break-words">{problem.value ?? '–'}</td>
              <td className="py-1">{problem.reason}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
