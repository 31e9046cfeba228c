import { describe, expect, it } from 'vitest';
import { readLog, type LogContext } from '../../../shared/intake/readLog.ts';
import type { LogMappingInput } from '../../../shared/schemas/trialLog.ts';

const context: LogContext = {
  configurations: [
    { id: 1, label: '20 mm', positionMm: 20 },
    { id: 2, label: '70 mm', positionMm: 70 },
  ],
  slide: { minMm: 10, maxMm: 130 },
  maxAcceleration: 90,
};

const utf8 = new TextEncoder();

function read(text: string | Uint8Array, mapping: LogMappingInput = {}, given = context) {
  return readLog(typeof text === 'string' ? utf8.encode(text) : text, mapping, given);
}

function utf16(text: string, littleEndian: boolean): Uint8Array {
  const view = new DataView(new ArrayBuffer(2 + 2 * text.length));
  view.setUint16(0, 0xfeff, littleEndian);
  for (let at = 0; at < text.length; at++) {
    view.setUint16(2 + 2 * at, text.charCodeAt(at), littleEndian);
  }
  return new Uint8Array(view.buffer);
}

const plain = 'position_mm,acceleration_rad_s2,outcome\n20,12.5,held\n70,9.1,slipped\n';

describe('reading a plain log', () => {
  it('takes every row, in SI, with its line in the file', () => {
    const { rows, problems, refusal, refused, oddities } = read(plain);
    expect(refusal).toBeNull();
    expect(problems).toEqual([]);
    expect(oddities).toEqual([]);
    expect(refused).toBe(0);
    expect(rows).toMatchObject([
      { row: 2, configuration: '20 mm', configurationId: 1, acceleration: 12.5, outcome: 'held' },
      { row: 3, configuration: '70 mm', positionMm: 70, acceleration: 9.1, outcome: 'slipped' },
    ]);
  });

  it('answers with the whole mapping it used', () => {
    expect(read(plain).mapping).toEqual({
      encoding: 'utf-8',
      delimiter: ',',
      decimal: '.',
      headerLine: 1,
      columns: {
        position: 'position_mm',
        acceleration: 'acceleration_rad_s2',
        outcome: 'outcome',
      },
      units: { position: 'mm', acceleration: 'rad/s²', slipAngle: '°' },
      outcomes: { held: 'held', slipped: 'slipped' },
      judgedBy: null,
      addConfigurations: false,
    });
  });

  it('reads every encoding and line end alike', () => {
    const rows = read(plain).rows;
    const variants = [
      utf8.encode(`\uFEFF${plain}`),
      utf16(plain, true),
      utf16(plain, false),
      utf8.encode(plain.replaceAll('\n', '\r\n')),
      utf8.encode(plain.replaceAll('\n', '\r')),
    ];
    for (const bytes of variants) expect(read(bytes).rows).toEqual(rows);
  });

  it('reads Windows-1252 and says so', () => {
    // "remark" holds an accented letter and a dash outside UTF-8; ² in the header is byte B2
    const bytes = Uint8Array.from(
      [...'position [mm];alpha [deg/s\xB2];outcome;remark\n70;900;held;Pr\xFCfling \x96 neu\n'].map(
        (character) => character.charCodeAt(0),
      ),
    );
    const { mapping, rows, oddities } = read(bytes);
    expect(mapping.encoding).toBe('windows-1252');
    expect(rows[0]?.acceleration).toBeCloseTo(5 * Math.PI, 12);
    expect(rows[0]?.remark).toBe('Prüfling – neu');
    expect(oddities[0]?.reason).toMatch(/not UTF-8.*Windows-1252/);
  });

  it('reads units from headers and converts', () => {
    const { rows } = read(
      'Slide pos. (cm);Peak accel. (rpm/s);Slip angle (°);Temp °F;Result\n7;60;1,8;212;lost\n',
    );
    expect(rows[0]).toMatchObject({ positionMm: 70, outcome: 'lost' });
    expect(rows[0]?.acceleration).toBeCloseTo(2 * Math.PI, 12);
    expect(rows[0]?.slipAngle).toBeCloseTo(Math.PI / 100, 12);
    expect(rows[0]?.temperature).toBeCloseTo(100, 10);
  });

  it('takes a slip in degrees for its size, not for the outcome', () => {
    const { rows } = read('position mm,alpha_rad_per_s2,slip (deg),result\n70,5,90,slip\n');
    expect(rows[0]).toMatchObject({ slipAngle: Math.PI / 2, outcome: 'slipped', acceleration: 5 });
  });

  it('asks about a temperature in a unit that is none', () => {
    const { problems } = read('position mm,alpha rad/s²,outcome,temp (bar)\n70,5,held,3\n');
    expect(problems[0]?.reason).toMatch(/The unit “bar” of the temperature is not known/);
  });

  it('reads everything a row can say', () => {
    const { rows, oddities } = read(
      [
        'Run,Date,Config,Position (mm),Acceleration (rad/s²),Outcome,Peak lag (deg),Direction,Part,Seating,Series,Pad batch,Temp (°C),Judged by,Remarks',
        '3,2026-03-14T10:22:05+01:00,70mm,70.04,9.5,Slipped,2.25,CW,P-17,4,S2,B1,21.5,encoder,"two, ""quick"" checks"',
      ].join('\n'),
    );
    expect(oddities).toEqual([]);
    expect(rows).toEqual([
      {
        row: 2,
        configuration: '70 mm',
        configurationId: 2,
        positionMm: 70,
        acceleration: 9.5,
        outcome: 'slipped',
        judgedBy: 'peak lag',
        slipAngle: (2.25 * Math.PI) / 180,
        order: 3,
        at: '2026-03-14T09:22:05.000Z',
        direction: 'CW',
        part: 'P-17',
        seating: '4',
        series: 'S2',
        batch: 'B1',
        temperature: 21.5,
        remark: 'two, "quick" checks',
      },
    ]);
  });

  it('skips a title block above the header and blank lines below it', () => {
    const { rows, mapping } = read(
      'Slip trials, turnover table\nDate:;14.03.2026\n\nPosition [mm];Accel [rad/s^2];Outcome\n20;12,5;held\n;;\n\n70;9,1;slipped\n',
    );
    expect(mapping).toMatchObject({ headerLine: 4, delimiter: ';', decimal: ',' });
    expect(rows.map(({ row, acceleration }) => [row, acceleration])).toEqual([
      [5, 12.5],
      [8, 9.1],
    ]);
  });

  it('counts lines through a quoted line break', () => {
    const { rows } = read(
      'position mm,remark,acceleration rad/s²,outcome\n20,"first\nsecond",5,held\n70,,6,held\n',
    );
    expect(rows.map(({ row, remark }) => [row, remark])).toEqual([
      [2, 'first second'],
      [4, null],
    ]);
  });
});

describe('numbers', () => {
  it.each([
    ['', /is empty: enter a number/],
    ['0x10', /is not a number/],
    ['1e400', /is too large/],
    ['NaN', /is not a number/],
    ['Infinity', /is not a number/],
    ['1_000', /is not a number/],
    ['"1,5"', /decimal point: choose the decimal sign/],
    ['"1,234"', /is ambiguous/],
    ['12 rad/s²', /the unit in the header/],
    ['0', /must be above 0/],
    ['-5', /must be above 0/],
  ])('refuses %s with row, column, value and remedy', (written, reason) => {
    const { rows, problems, refused } = read(
      `position mm,alpha rad/s²,outcome\n20,${written},held\n`,
    );
    expect(rows).toEqual([]);
    expect(refused).toBe(1);
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatchObject({
      row: 2,
      column: 'alpha rad/s²',
      value: written.replaceAll('"', ''),
    });
    expect(problems[0]?.reason).toMatch(reason);
  });

  it('reads a decimal comma when it is declared, or plain from the whole log', () => {
    const log = (values: string[]) =>
      `position mm;alpha rad/s²;outcome\n${values.map((v) => `20;${v};held`).join('\n')}\n`;
    expect(read(log(['1,5', '1,234'])).rows.map((row) => row.acceleration)).toEqual([1.5, 1.234]);
    expect(read(log(['1,234']), { decimal: ',' }).rows[0]?.acceleration).toBe(1.234);
    // alone it may part thousands; and a log that mixes both signs is asked about
    expect(read(log(['1,234'])).problems[0]?.reason).toMatch(/ambiguous/);
    expect(read(log(['1,5', '2.5'])).problems.map(({ value }) => value)).toEqual(['1,5']);
  });
});

describe('outcomes', () => {
  const log = (header: string, word: string) =>
    read(`position mm,alpha rad/s²,${header}\n20,5,${word}\n`);

  it.each([
    ['result', 'PASS', 'held'],
    ['result', 'Fail', 'slipped'],
    ['result', 'ok', 'held'],
    ['outcome', 'Slip', 'slipped'],
    ['outcome', 'part lost', 'lost'],
    ['slipped', '1', 'slipped'],
    ['slipped', '0', 'held'],
    ['Slipped?', 'no', 'held'],
    ['held', '1', 'held'],
    ['held', 'false', 'slipped'],
  ])('reads under “%s” the word %s as %s', (header, word, outcome) => {
    expect(log(header, word).rows[0]?.outcome).toBe(outcome);
  });

  it('asks what 1 means when the header does not say', () => {
    const { rows, problems } = log('outcome', '1');
    expect(rows).toEqual([]);
    expect(problems[0]?.reason).toMatch(/“1” may mean held or slipped: say which/);
    const told = read('position mm,alpha rad/s²,outcome\n20,5,1\n', {
      outcomes: { '1': 'slipped' },
    });
    expect(told.rows[0]?.outcome).toBe('slipped');
  });

  it('refuses an unknown or missing word', () => {
    expect(log('outcome', 'so-so').problems[0]?.reason).toMatch(/“so-so” is not an outcome known/);
    expect(log('outcome', '').problems[0]?.reason).toMatch(/is empty: write held, slipped or lost/);
  });
});

describe('positions and configurations', () => {
  const at = (position: string, mapping: LogMappingInput = {}) =>
    read(`position mm,alpha rad/s²,outcome\n${position},5,held\n`, mapping);

  it('matches within 0.05 mm and stores the position of the configuration', () => {
    expect(at('70.05').rows[0]?.positionMm).toBe(70);
    expect(at('70.06').rows).toEqual([]);
  });

  it('proposes a position inside the slide as a new configuration only when asked to', () => {
    expect(at('95').problems[0]?.reason).toMatch(
      /no configuration \(20 mm, 70 mm\): let the import/,
    );
    const asked = at('95', { addConfigurations: true });
    expect(asked.newConfigurations).toEqual([{ label: '95 mm', positionMm: 95 }]);
    expect(asked.rows[0]).toMatchObject({ configuration: '95 mm', configurationId: null });
    expect(at('140', { addConfigurations: true }).problems[0]?.reason).toMatch(
      /is 140 mm, outside the slide \(10 to 130 mm\)/,
    );
  });

  it('proposes nothing for a row that is refused', () => {
    const { newConfigurations } = read('position mm,alpha rad/s²,outcome\n95,5,maybe\n', {
      addConfigurations: true,
    });
    expect(newConfigurations).toEqual([]);
  });

  it('takes a label alone, whatever its blanks and case', () => {
    const { rows, problems } = read(
      'configuration,alpha rad/s²,outcome\n70MM,5,held\nfar,5,held\n,5,held\n',
    );
    expect(rows.map(({ configurationId }) => configurationId)).toEqual([2]);
    expect(problems.map(({ reason }) => reason)).toEqual([
      expect.stringMatching(/“far” is not a configuration of this fixture \(20 mm, 70 mm\)/),
      expect.stringMatching(/is empty: say where the masses stood/),
    ]);
  });

  it('takes the label of a configuration written in the column of positions', () => {
    const { rows, problems } = read(
      'position mm,alpha rad/s²,outcome\n70 mm,5,held\n71 mm,5,held\n',
    );
    expect(rows.map(({ configurationId }) => configurationId)).toEqual([2]);
    expect(problems[0]?.reason).toMatch(/“71 mm” is not a number: .* the unit in the header/);
  });

  it('refuses a label and a position that disagree, and notes a label it does not know', () => {
    const { problems, rows, oddities } = read(
      'configuration,position mm,alpha rad/s²,outcome\n20 mm,70,5,held\nnear,20,5,held\n',
    );
    expect(problems[0]?.reason).toMatch(/disagrees with configuration “20 mm”, which is at 20 mm/);
    expect(rows[0]?.configuration).toBe('20 mm');
    expect(oddities[0]?.reason).toMatch(/“near” is not known; the row was taken by its position/);
  });
});

describe('trouble with the whole file', () => {
  it.each([
    ['a workbook', [0x50, 0x4b, 3, 4]],
    ['a gzip file', [0x1f, 0x8b, 8]],
    ['a PDF', [...utf8.encode('%PDF-1.7')]],
  ])('refuses %s whatever its name: save the sheet as CSV', (_what, bytes) => {
    const { refusal, problems } = read(Uint8Array.from(bytes));
    expect(refusal).toMatchObject({ unsupported: true });
    expect(problems).toEqual([
      {
        row: 0,
        column: null,
        value: null,
        reason: expect.stringMatching(/save the sheet as CSV/) as string,
      },
    ]);
  });

  it('refuses NUL characters, an empty file and an unclosed quotation mark', () => {
    expect(read('position,alpha,outcome\n20,\0,held\n').problems[0]?.reason).toMatch(/NUL/);
    expect(read(' \n').problems[0]?.reason).toMatch(/is empty/);
    expect(read('position,alpha,outcome\n20,"5,held\n').problems[0]?.reason).toMatch(
      /quotation mark is opened and never closed/,
    );
  });

  it('refuses duplicate headers', () => {
    const { problems, rows, refused } = read('position mm,alpha,alpha,outcome\n20,5,6,held\n');
    expect(rows).toEqual([]);
    expect(refused).toBe(1);
    expect(problems[0]).toMatchObject({ row: 0, column: 'alpha' });
    expect(problems[0]?.reason).toMatch(/Two columns are called “alpha”/);
  });

  it('asks which of two columns is the acceleration', () => {
    const log =
      'position mm,commanded acceleration (rad/s²),peak acceleration (rad/s²),outcome\n20,5,6,held\n';
    expect(read(log).problems[0]?.reason).toMatch(/Both .* look like the acceleration: choose one/);
    const chosen = read(log, { columns: { acceleration: 'peak acceleration (rad/s²)' } });
    expect(chosen.rows[0]?.acceleration).toBe(6);
  });

  it('asks for a column it cannot find and still shows headers and first rows', () => {
    const { problems, headers, sample, refused } = read('where,how fast,what\n20,5,held\n');
    expect(headers).toEqual(['where', 'how fast', 'what']);
    expect(sample).toEqual([['20', '5', 'held']]);
    expect(refused).toBe(1);
    expect(problems.map(({ row }) => row)).toEqual([0, 0, 0]);
    const told = read('where,how fast,what\n20,5,held\n', {
      columns: { position: 'where', acceleration: 'how fast', outcome: 'what' },
      units: { acceleration: 'deg/s²' },
    });
    expect(told.rows[0]?.acceleration).toBeCloseTo((5 * Math.PI) / 180, 14);
  });

  it('asks about a unit it does not know, and says which one it assumed', () => {
    expect(read('position (mm),accel (g),outcome\n20,5,held\n').problems[0]?.reason).toMatch(
      /The unit “g” of the acceleration is not known/,
    );
    const { oddities } = read('position,accel,outcome\n20,5,held\n');
    expect(oddities.map(({ row, column }) => [row, column])).toEqual([
      [0, 'position'],
      [0, 'accel'],
    ]);
  });

  it('names a mapped column that the file does not have', () => {
    expect(read(plain, { columns: { outcome: 'verdict' } }).problems[0]?.reason).toMatch(
      /no column “verdict” for the outcome/,
    );
  });

  it('leaves a column out when the mapping gives it an empty name', () => {
    const log = 'position mm,alpha rad/s²,outcome,temp\n20,5,held,warm\n';
    expect(read(log).problems[0]?.reason).toMatch(/temperature “warm” is not a number/);
    expect(read(log, { columns: { temperature: '' } }).rows[0]?.temperature).toBeNull();
  });
});

describe('hostile words', () => {
  it('treats the names of object members as any other word', () => {
    const names = ['__proto__', 'constructor', 'prototype', 'toString'];
    const { rows, headers } = read(
      `position mm,alpha rad/s²,outcome,${names.join(',')}\n20,5,held,a,b,c,d\n`,
    );
    expect(headers.slice(3)).toEqual(names);
    expect(rows).toHaveLength(1);
    for (const name of names) {
      const log = `configuration,alpha rad/s²,outcome\n${name},5,${name}\n`;
      expect(read(log).problems[0]?.reason).toMatch(/is not an outcome known here/);
      const columns = { outcome: name };
      expect(read(plain, { columns }).problems[0]?.reason).toMatch(/has no column/);
    }
    expect(({} as Record<string, unknown>).a).toBeUndefined();
  });

  it('refuses a row that has slipped sideways', () => {
    const { problems } = read('position mm,alpha rad/s²,outcome\n20,12,5,held\n');
    expect(problems[0]).toMatchObject({ row: 2, value: 'held' });
    expect(problems[0]?.reason).toMatch(/more cells than the header: look for a decimal comma/);
  });

  it('stops early at endless lines, columns and quotes', () => {
    const started = performance.now();
    const line = `position mm,alpha rad/s²,outcome\n20,5,${'x'.repeat(10_000_000)}\n`;
    expect(read(line).refusal?.reason).toMatch(/longer than 64 kB/);
    const wide = `${'a,'.repeat(1_000_000)}\n`;
    expect(read(wide).refusal?.reason).toMatch(/longer than 64 kB/);
    const quote = `position mm,alpha rad/s²,outcome\n20,5,"${'x\n'.repeat(5_000_000)}`;
    expect(read(quote).refusal?.reason).toMatch(/longer than 64 kB/);
    const columns = `position mm,alpha rad/s²,outcome,${'c,'.repeat(300)}\n20,5,held\n`;
    expect(read(columns).refusal?.reason).toMatch(/columns, more than 256/);
    expect(performance.now() - started).toBeLessThan(2500);
  });

  it('takes no more rows than it can bear', () => {
    const many = `position mm,alpha rad/s²,outcome\n${'20,5,held\n'.repeat(100_001)}`;
    expect(read(many).refusal?.reason).toMatch(/more than 100000 rows: split it/);
  });
});

describe('oddities', () => {
  const rows = (lines: string[]) =>
    read(`position mm,alpha rad/s²,outcome,seating\n${lines.join('\n')}\n`).oddities;

  it('asks about accelerations beyond the drive', () => {
    expect(rows(['20,90,held,', '20,90.1,held,'])).toMatchObject([
      {
        row: 3,
        reason: expect.stringMatching(/beyond what the drive can do \(90.0 rad/) as string,
      },
    ]);
  });

  it('asks about a hold far above the slips of the same configuration', () => {
    const slips = ['20,10,slipped,', '20,11,slipped,', '20,12,lost,'];
    expect(rows([...slips, '20,13.7,held,', '70,30,held,'])).toEqual([]);
    expect(rows([...slips, '20,14,held,'])[0]?.reason).toMatch(/Held at 14.0 rad\/s², far above/);
  });

  it('asks about a series that looks stepped up without a seating', () => {
    const steps = ['20,5,held', '20,6,held', '20,7,held', '20,8,held', '20,9,slipped'];
    const bare = rows(steps.map((step) => `${step},`));
    expect(bare).toMatchObject([{ row: 6 }]);
    expect(bare[0]?.reason).toMatch(/ends a rising run of holds/);
    expect(rows(steps.map((step) => `${step},4`))).toEqual([]);
    expect(rows([steps[1], steps[0], ...steps.slice(2)].map((step) => `${step},`))).toEqual([]);
  });

  it('stores a row whose time or way of judging it does not understand, without them', () => {
    const { rows: read1, oddities } = read(
      'position mm,alpha rad/s²,outcome,date,judged by\n20,5,held,3/4/2026,gut feeling\n',
      { judgedBy: 'by eye' },
    );
    expect(read1[0]).toMatchObject({ at: null, judgedBy: null });
    expect(oddities.map(({ column }) => column)).toEqual(['date', 'judged by']);
  });
});
