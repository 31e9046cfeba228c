import { analyse as analyseTrials } from '../../shared/analyse.ts';
import {
  readLog as readTrialLog,
  type LogContext,
  type LogReading,
} from '../../shared/intake/readLog.ts';
import type { AnalysisRequest, AnalysisResult } from '../../shared/schemas/analysis.ts';
import type { LogMappingInput } from '../../shared/schemas/trialLog.ts';

export type AnalyseAnswer = { result: AnalysisResult } | { refused: string };

/** A contradiction in the request comes back as words: an error would lose its kind on the way. */
export function analyse(request: AnalysisRequest): AnalyseAnswer {
  try {
    return { result: analyseTrials(request) };
  } catch (error) {
    if (error instanceof RangeError) return { refused: error.message };
    throw error;
  }
}

export function readLog(input: {
  bytes: Uint8Array;
  mapping: LogMappingInput;
  context: LogContext;
}): LogReading {
  return readTrialLog(input.bytes, input.mapping, input.context);
}
