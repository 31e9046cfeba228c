import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { frictionStatistics, inclineMu } from '../../../shared/physics/frictionTest.ts';
import {
  frictionTestInputSchema,
  type FrictionKind,
} from '../../../shared/schemas/frictionTest.ts';
import { formatQuantity } from '../../../shared/units/formatQuantity.ts';
import { api, ApiError } from '../../lib/api.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { SelectField } from '../../ui/SelectField.tsx';
import { TextArea } from '../../ui/TextArea.tsx';
import { TextField } from '../../ui/TextField.tsx';
import { parseReadings, type ReadingKind } from './parseReadings.ts';

type FrictionTestDialogProps = { fixtureId: number; faces: readonly string[]; close: () => void };

const kinds = [
  { value: 'kinetic', text: 'kinetic: keeps holding after a tap' },
  { value: 'static', text: 'static: breaks away by itself' },
];

/** Enters the incline readings of one friction test; μ follows as they are typed. */
export function FrictionTestDialog({ fixtureId, faces, close }: FrictionTestDialogProps) {
  const client = useQueryClient();
  const [kind, setKind] = useState<FrictionKind>('kinetic');
  const [face, setFace] = useState('');
  const [surfaces, setSurfaces] = useState('');
  const [batch, setBatch] = useState('');
  const [testedOn, setTestedOn] = useState(() => new Date().toISOString().slice(0, 10));
  const [readingKind, setReadingKind] = useState<ReadingKind>('height over base');
  const [text, setText] = useState('');
  const [uncertainty, setUncertainty] = useState('0.002');
  const [refusal, setRefusal] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const parsed = parseReadings(text, readingKind);

  const store = async () => {
    if (!parsed.ok) {
      setRefusal(`Reading ${parsed.line}: ${parsed.reason}.`);
      return;
    }
    const input = frictionTestInputSchema.safeParse({
      ...{ kind, surfaces, testedOn, readings: parsed.readings },
      face: face === '' ? null : face,
      batch: batch.trim() === '' ? null : batch,
      readingUncertainty: Number(uncertainty),
      remark: null,
    });
    if (!input.success) {
      const [issue] = input.error.issues;
      setRefusal(`${issue?.path.join(' ') ?? ''}: ${issue?.message ?? ''}`);
      return;
    }
    setBusy(true);
    try {
      await api(`/api/fixtures/${fixtureId}/friction-tests`, { method: 'POST', body: input.data });
      await client.invalidateQueries();
      close();
    } catch (error) {
      setRefusal(error instanceof ApiError ? error.message : 'Nothing was stored; try again.');
    } finally {
      setBusy(false);
    }
  };

  return (
    <Dialog
      title="Enter a friction test"
      description="Tilt the pad's surface until the part holds no more. Kinetic: the steepest setting at which it stops again after a tap. Static: where it breaks away."
      open
      onOpenChange={(open) => {
        if (!open) close();
      }}
    >
      <form
        noValidate
        className="space-y-3"
        onSubmit={(event) => {
          event.preventDefault();
          void store();
        }}
      >
        <SelectField
          label="Kind"
          options={kinds}
          value={kind}
          onChange={(event) => setKind(event.target.value as FrictionKind)}
        />
        <div className="grid grid-cols-2 gap-3">
          <TextField
            label="Surfaces"
            hint="Such as nitrile on bronze."
            value={surfaces}
            onChange={(event) => setSurfaces(event.target.value)}
          />
          <TextField
            label="Pad batch"
            value={batch}
            onChange={(event) => setBatch(event.target.value)}
          />
          <TextField
            label="Tested on"
            type="date"
            value={testedOn}
            onChange={(event) => setTestedOn(event.target.value)}
          />
          <SelectField
            label="Face"
            options={[{ value: '', text: 'all faces' }, ...faces]}
            value={face}
            onChange={(event) => setFace(event.target.value)}
          />
          <SelectField
            label="Readings are"
            options={['height over base', 'angle']}
            value={readingKind}
            onChange={(event) => setReadingKind(event.target.value as ReadingKind)}
          />
          <TextField
            label="Gauge uncertainty of μ"
            unit="absolute"
            inputMode="decimal"
            value={uncertainty}
            onChange={(event) => setUncertainty(event.target.value)}
          />
        </div>
        <TextArea
          label={
            readingKind === 'angle'
              ? 'Angles, °, one a line'
              : 'Height and base, mm, one pair a line'
          }
          rows={6}
          value={text}
          onChange={(event) => setText(event.target.value)}
          placeholder={readingKind === 'angle' ? '17.1' : '92 300'}
        />
        <p role="status" className="text-sm">
          {parsed.ok ? summaryOf(parsed.readings.map(inclineMu)) : ''}
        </p>
        <p role="alert" className="text-lost empty:hidden">
          {refusal}
        </p>
        <div className="flex gap-3">
          <Button type="submit" look="primary" busy={busy}>
            Store the test
          </Button>
          <Button onClick={close}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}

function summaryOf(mu: number[]): string {
  const { mean, sd, n } = frictionStatistics(mu);
  const scatter = sd === null ? '' : `, s ${formatQuantity(sd, { digits: 2 })}`;
  return `μ ${formatQuantity(mean)}${scatter}, n ${n}`;
}
