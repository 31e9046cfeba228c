import { describe, expect, it } from 'vitest';
import { type LogMapping } from '../../../shared/schemas/trialLog.ts';
import {
  assignColumn,
  meaningOf,
  unknownOutcomeWords,
} from '../../../src/features/trials/columnMapping.ts';
import { refusedRowsCsv } from '../../../src/features/trials/refusedRowsCsv.ts';
import {
  changeTrialSearch,
  readTrialSearch,
  trialQueryString,
} from '../../../src/features/trials/trialSearch.ts';

describe('the meaning of a column', () => {
  const columns = { acceleration: 'alpha', outcome: 'result' };

  it('moves from one column to another', () => {
    const next = assignColumn(columns, 'alpha meas', 'acceleration');
    expect(next).toEqual({ acceleration: 'alpha meas', outcome: 'result' });
    expect(meaningOf(next, 'alpha')).toBeNull();
  });

  it('replaces the one the column had', () => {
    expect(assignColumn(columns, 'result', 'remark')).toEqual({
      acceleration: 'alpha',
      remark: 'result',
    });
  });

  it('can be taken away', () => {
    expect(assignColumn(columns, 'result', null)).toEqual({ acceleration: 'alpha' });
  });
});

describe('unknown outcome words', () => {
  const mapping = {
    columns: { outcome: 'result' },
    outcomes: { ok: 'held' },
  } as unknown as LogMapping;
  const problem = (value: string | null, column = 'result') => ({
    row: 2,
    column,
    value,
    reason: '',
  });

  it('are offered once each, in lower case, without the known and the empty ones', () => {
    const problems = [
      problem('Moved'),
      problem('moved '),
      problem('ok'),
      problem(''),
      problem('x', 'alpha'),
    ];
    expect(unknownOutcomeWords(mapping, problems)).toEqual(['moved']);
  });
});

describe('refused rows as CSV', () => {
  it('quotes by RFC 4180 and keeps a spreadsheet from reading a formula', () => {
    const csv = refusedRowsCsv([{ row: 7, column: 'a,b', value: '=1+1', reason: 'says "no"' }]);
    expect(csv).toBe(`\uFEFFrow,column,value,reason\r\n7,"a,b",'=1+1,"says ""no"""\r\n`);
  });
});

describe('the trial table in the URL', () => {
  it('leaves out what makes no sense', () => {
    const search = readTrialSearch(new URLSearchParams('page=-1&sort=drop&outcome=fell&log=1e3'));
    expect(search).toEqual({
      configuration: null,
      outcome: null,
      excluded: null,
      log: null,
      sort: 'id',
      page: 1,
    });
  });

  it('starts again at page 1 when a filter changes, and not when the page does', () => {
    const params = new URLSearchParams('page=3&outcome=held');
    expect(changeTrialSearch(params, { outcome: 'lost' }).toString()).toBe('outcome=lost');
    expect(changeTrialSearch(params, { page: '4' }).toString()).toBe('page=4&outcome=held');
  });

  it('asks the server for what it shows', () => {
    const search = readTrialSearch(
      new URLSearchParams('configuration=70+mm&sort=-acceleration&page=2'),
    );
    expect(trialQueryString(search)).toBe(
      'configuration=70+mm&sort=-acceleration&page=2&pageSize=50',
    );
  });
});
