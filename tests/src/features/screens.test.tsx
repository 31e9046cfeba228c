import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import type { ReactElement } from 'react';
import { MemoryRouter } from 'react-router';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Trial } from '../../../shared/schemas/trial.ts';
import type { LogAnswer } from '../../../shared/schemas/trialLog.ts';
import { PositionList } from '../../../src/features/boundary/PositionList.tsx';
import { ColumnControls } from '../../../src/features/trials/ColumnControls.tsx';
import { DropZone } from '../../../src/features/trials/DropZone.tsx';
import { ExcludeDialog } from '../../../src/features/trials/ExcludeDialog.tsx';
import { FileControls } from '../../../src/features/trials/FileControls.tsx';
import { UploadDone } from '../../../src/features/trials/UploadDone.tsx';
import { Segments } from '../../../src/ui/Segments.tsx';
import { configurationResult } from './boundaryFixtures.ts';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function show(element: ReactElement) {
  render(
    <QueryClientProvider client={new QueryClient()}>
      <MemoryRouter>{element}</MemoryRouter>
    </QueryClientProvider>,
  );
}

const answer: LogAnswer = {
  log: { id: null, sha256: 's', accepted: 2, refused: 1 },
  problems: [{ row: 4, column: 'result', value: 'Wobbled', reason: 'say what it means' }],
  oddities: [],
  mapping: {
    encoding: 'utf-8',
    delimiter: ';',
    decimal: ',',
    headerLine: 1,
    columns: { acceleration: 'alpha', outcome: 'result' },
    units: { position: 'mm', acceleration: 'deg/s²', slipAngle: '°' },
    outcomes: { ok: 'held' },
    judgedBy: null,
    addConfigurations: false,
  },
  headers: ['alpha', 'result', 'who'],
  sample: [['3000', 'ok', 'AB']],
  preview: [],
  newConfigurations: [],
  changes: [],
};

describe('the list of positions', () => {
  it('names every verdict in words and marks the chosen position', () => {
    show(
      <PositionList
        configurations={[
          configurationResult(),
          configurationResult({ label: '20 mm', verdict: 'slips early' }),
        ]}
        positions={[
          { label: '45 mm', positionMm: 45, inertia: 1e-3 },
          { label: '20 mm', positionMm: 20, inertia: 5e-4 },
        ]}
        commonTorque50={{ estimate: 0.02, lower: 0.019, upper: 0.021 }}
        chosen="45 mm"
        linkTo={(label) => `?position=${label}`}
      />,
    );
    const [first, second] = screen.getAllByRole('link');
    expect(first?.textContent).toContain('20 mm');
    expect(first?.textContent).toContain('slips early');
    expect(first?.getAttribute('aria-current')).toBeNull();
    expect(second?.getAttribute('aria-current')).toBe('true');
    expect(second?.textContent).toContain('20.0 (19.0–21.0)');
  });
});

describe('the columns of a log', () => {
  it('send the whole answer when one meaning changes', () => {
    const change = vi.fn();
    show(<ColumnControls answer={answer} given={{}} change={change} />);
    fireEvent.change(screen.getByLabelText('Meaning of column who'), {
      target: { value: 'remark' },
    });
    expect(change).toHaveBeenCalledOnce();
    expect(change.mock.calls[0]?.[0]).toMatchObject({
      columns: { acceleration: 'alpha', outcome: 'result', remark: 'who', position: '' },
    });
  });

  it('offer a unit only where a unit matters', () => {
    const change = vi.fn();
    show(<ColumnControls answer={answer} given={{ decimal: ',' }} change={change} />);
    expect(screen.queryByLabelText('Unit of column result')).toBeNull();
    fireEvent.change(screen.getByLabelText('Unit of column alpha'), {
      target: { value: 'rpm/s' },
    });
    expect(change).toHaveBeenCalledWith({ decimal: ',', units: { acceleration: 'rpm/s' } });
  });
});

describe('what the file as a whole means', () => {
  it('asks about an outcome word nobody knows, and passes the answer on', () => {
    const change = vi.fn();
    show(<FileControls answer={answer} given={{}} change={change} />);
    fireEvent.change(screen.getByLabelText('“wobbled”'), { target: { value: 'slipped' } });
    expect(change).toHaveBeenCalledWith({ outcomes: { wobbled: 'slipped' } });
  });

  it('forgets the columns when they are parted differently', () => {
    const change = vi.fn();
    show(
      <FileControls
        answer={answer}
        given={{ columns: { acceleration: 'alpha' } }}
        change={change}
      />,
    );
    fireEvent.change(screen.getByLabelText('Columns are parted by'), { target: { value: ',' } });
    expect(change).toHaveBeenCalledWith({ delimiter: ',', columns: undefined });
  });
});

describe('the drop zone', () => {
  it('takes one file and says why it does not take two', () => {
    const take = vi.fn();
    show(<DropZone take={take} />);
    const zone = screen.getByText('Drop a trial log here');
    const file = new File(['a;b'], 'log.csv');
    fireEvent.drop(zone, { dataTransfer: { files: [file, file] } });
    expect(screen.getByRole('alert').textContent).toContain('one log at a time');
    expect(take).not.toHaveBeenCalled();
    fireEvent.drop(zone, { dataTransfer: { files: [file] } });
    expect(take).toHaveBeenCalledWith(file);
  });

  it('says that an empty file is empty', () => {
    const take = vi.fn();
    show(<DropZone take={take} />);
    fireEvent.change(screen.getByLabelText('Trial log'), {
      target: { files: [new File([], 'nothing.csv')] },
    });
    expect(screen.getByRole('alert').textContent).toBe('“nothing.csv” is empty.');
    expect(take).not.toHaveBeenCalled();
  });
});

describe('excluding a trial', () => {
  const trial = {
    id: 7,
    fixtureId: 1,
    version: 3,
    row: 14,
    configuration: '70 mm',
    acceleration: 9.2,
    outcome: 'slipped',
    part: null,
    excluded: false,
    excludedReason: null,
  } as Trial;

  it('needs a reason, and sends it with the version that was seen', async () => {
    const fetched = vi.fn(() =>
      Promise.resolve(new Response(JSON.stringify(trial), { status: 200 })),
    );
    vi.stubGlobal('fetch', fetched);
    const close = vi.fn();
    show(<ExcludeDialog trial={trial} close={close} />);
    const dialog = screen.getByRole('dialog');
    const press = () => {
      fireEvent.click(within(dialog).getByRole('button', { name: 'Exclude trial' }));
    };
    press();
    expect(within(dialog).getByText(/at least 3 characters/)).toBeDefined();
    expect(fetched).not.toHaveBeenCalled();

    fireEvent.change(within(dialog).getByLabelText('Reason'), { target: { value: 'pad wet' } });
    press();
    await waitFor(() => expect(close).toHaveBeenCalled());
    const [path, init] = fetched.mock.calls[0] as unknown as [string, RequestInit];
    expect(path).toBe('/api/trials/7');
    expect(JSON.parse(init.body as string)).toEqual({
      version: 3,
      excluded: true,
      reason: 'pad wet',
    });
  });
});

describe('after storing', () => {
  it('says what changed, takes the focus and leads to the boundary', () => {
    show(
      <UploadDone
        fixtureId={4}
        fileName="log.csv"
        answer={{
          ...answer,
          log: { id: 9, sha256: 's', accepted: 1, refused: 2 },
          changes: ['70 mm turned from undecided to slips early.'],
        }}
        again={() => undefined}
      />,
    );
    expect(document.activeElement?.textContent).toBe('1 trial stored');
    expect(screen.getByText('70 mm turned from undecided to slips early.')).toBeDefined();
    const link = screen.getByRole('link', { name: 'See the boundary' });
    expect(link.getAttribute('href')).toBe('/fixtures/4/boundary');
  });
});

describe('a switch of few', () => {
  it('shows the choice at once and follows what comes from outside', () => {
    const options = [
      { value: 'a' as const, text: 'A' },
      { value: 'b' as const, text: 'B' },
    ];
    const change = vi.fn();
    const of = (value: 'a' | 'b') => (
      <Segments label="Which" value={value} options={options} onChange={change} />
    );
    const { rerender } = render(of('a'));
    const b = screen.getByRole<HTMLInputElement>('radio', { name: 'B' });
    fireEvent.click(b);
    expect(change).toHaveBeenCalledWith('b');
    expect(b.checked).toBe(true);
    rerender(of('b'));
    rerender(of('a'));
    expect(b.checked).toBe(false);
  });
});
