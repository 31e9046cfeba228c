import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import {
  configurationInputSchema,
  type Configuration,
  type ConfigurationInput,
} from '../../../shared/schemas/configuration.ts';
import { api } from '../../lib/api.ts';
import { showServerErrors } from '../../lib/serverErrors.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { TextField } from '../../ui/TextField.tsx';

type PositionDialogProps = {
  fixtureId: number;
  /** The position to change; null adds one. */
  position: Configuration | null;
  close: () => void;
};

/** Adds or changes a mass position, with a measured inertia where there is one. */
export function PositionDialog({ fixtureId, position, close }: PositionDialogProps) {
  const client = useQueryClient();
  const [refusal, setRefusal] = useState<string | null>(null);
  const { register, control, setValue, handleSubmit, setError, formState } =
    useForm<ConfigurationInput>({
      resolver: zodResolver(configurationInputSchema),
      defaultValues: {
        label: position?.label ?? '',
        positionMm: position?.positionMm ?? 0,
        measuredInertia: position?.measuredInertia ?? null,
      },
    });
  const measured = useWatch({ control, name: 'measuredInertia' });
  const { errors } = formState;
  const submit = handleSubmit(async (input) => {
    setRefusal(null);
    try {
      if (position === null) {
        await api(`/api/fixtures/${fixtureId}/configurations`, { method: 'POST', body: input });
      } else {
        const body = { version: position.version, ...input };
        await api(`/api/configurations/${position.id}`, { method: 'PATCH', body });
      }
      await client.invalidateQueries();
      close();
    } catch (error) {
      setRefusal(showServerErrors(error, setError));
    }
  });
  return (
    <Dialog
      title={position === null ? 'Add a position' : `Position ${position.label}`}
      open
      onOpenChange={(open) => {
        if (!open) close();
      }}
    >
      <form noValidate onSubmit={(event) => void submit(event)} className="space-y-4">
        <div className="grid grid-cols-2 gap-4">
          <TextField
            label="Position"
            unit="mm"
            inputMode="decimal"
            error={errors.positionMm?.message}
            {...register('positionMm', { valueAsNumber: true })}
          />
          <TextField
            label="Label"
            hint="Such as 70 mm."
            error={errors.label?.message}
            {...register('label')}
          />
        </div>
        <label className="flex min-h-9 items-center gap-2 font-bold">
          <input
            type="checkbox"
            className="size-5 accent-(--color-accent)"
            checked={measured !== null}
            onChange={(event) =>
              setValue(
                'measuredInertia',
                event.target.checked
                  ? { value: Number.NaN, relativeUncertainty: 0.01, method: '' }
                  : null,
              )
            }
          />
          The inertia was measured
        </label>
        {measured !== null && (
          <div className="grid grid-cols-2 gap-4">
            <TextField
              label="Inertia"
              unit="kg·m²"
              inputMode="decimal"
              error={errors.measuredInertia?.value?.message}
              {...register('measuredInertia.value', { valueAsNumber: true })}
            />
            <TextField
              label="Uncertainty"
              unit="relative"
              inputMode="decimal"
              error={errors.measuredInertia?.relativeUncertainty?.message}
              {...register('measuredInertia.relativeUncertainty', { valueAsNumber: true })}
            />
            <TextField
              label="How"
              hint="Such as bifilar pendulum, 10 swings."
              className="col-span-2"
              error={errors.measuredInertia?.method?.message}
              {...register('measuredInertia.method')}
            />
          </div>
        )}
        <p role="alert" className="text-lost empty:hidden">
          {refusal}
        </p>
        <div className="flex gap-3">
          <Button type="submit" look="primary" busy={formState.isSubmitting}>
            {position === null ? 'Add position' : 'Save position'}
          </Button>
          <Button onClick={close}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
