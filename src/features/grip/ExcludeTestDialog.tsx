import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { FrictionTest } from '../../../shared/schemas/frictionTest.ts';
import { api, ApiError } from '../../lib/api.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { TextArea } from '../../ui/TextArea.tsx';

/** Takes a friction test out of the seat's friction, or back in. The reason stays in the history. */
export function ExcludeTestDialog({ test, close }: { test: FrictionTest; close: () => void }) {
  const client = useQueryClient();
  const [reason, setReason] = useState('');
  const [refusal, setRefusal] = useState<string | null>(null);
  const verb = test.excluded ? 'Restore' : 'Exclude';
  const store = async () => {
    try {
      const body = { version: test.version, excluded: !test.excluded, reason };
      await api(`/api/friction-tests/${test.id}`, { method: 'PATCH', body });
      await client.invalidateQueries();
      close();
    } catch (error) {
      setRefusal(error instanceof ApiError ? error.message : 'Nothing was stored; try again.');
    }
  };
  return (
    <Dialog
      title={`${verb} the ${test.kind} test of ${test.testedOn}`}
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
        <TextArea
          label="Reason"
          value={reason}
          onChange={(event) => setReason(event.target.value)}
        />
        <p role="alert" className="text-lost empty:hidden">
          {refusal}
        </p>
        <div className="flex gap-3">
          <Button type="submit" look="primary">
            {verb} the test
          </Button>
          <Button onClick={close}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
