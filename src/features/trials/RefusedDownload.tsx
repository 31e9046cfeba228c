import type { LogProblem } from '../../../shared/schemas/trialLog.ts';
import { Button } from '../../ui/Button.tsx';
import { refusedRowsCsv } from './refusedRowsCsv.ts';

/** The refused rows as a file, to be mended beside the log. */
export function RefusedDownload({
  problems,
  fileName,
}: {
  problems: readonly LogProblem[];
  fileName: string;
}) {
  return (
    <Button
      onClick={() => {
        const url = URL.createObjectURL(
          new Blob([refusedRowsCsv(problems)], { type: 'text/csv;charset=utf-8' }),
        );
        const link = document.createElement('a');
        link.href = url;
        link.download = `${fileName.replace(/\.[a-z]+$/i, '')}-refused.csv`;
        link.click();
        setTimeout(() => {
          URL.revokeObjectURL(url);
        }, 1000);
      }}
    >
      Download the refused rows
    </Button>
  );
}
