import { zodResolver } from '@hookform/resolvers/zod';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useFieldArray, useForm, useWatch } from 'react-hook-form';
import {
  buildUpInputSchema,
  type BuildUp,
  type BuildUpInput,
} from '../../../shared/schemas/buildUp.ts';
import { api } from '../../lib/api.ts';
import { showServerErrors, textOrNull } from '../../lib/serverErrors.ts';
import { Button } from '../../ui/Button.tsx';
import { TextField } from '../../ui/TextField.tsx';
import { BodyFields } from './BodyFields.tsx';
import { InertiaPreview } from './InertiaPreview.tsx';
import { newBody } from './shapes.ts';

type BuildUpFormProps = {
  fixtureId: number;
  /** The fixture's version the change is made on. */
  version: number;
  current: BuildUp | null;
  done: () => void;
};

/** Edits the bodies; saving makes the next revision. The inertia follows as one types. */
export function BuildUpForm({ fixtureId, version, current, done }: BuildUpFormProps) {
  const client = useQueryClient();
  const [refusal, setRefusal] = useState<string | null>(null);
  const { register, control, setValue, handleSubmit, setError, formState } = useForm<BuildUpInput>({
    resolver: zodResolver(buildUpInputSchema),
    defaultValues: initialOf(current, version),
  });
  const { fields, append, remove } = useFieldArray({ control, name: 'bodies' });
  const [bodies, slide] = useWatch({ control, name: ['bodies', 'slide'] });
  const { errors } = formState;
  const submit = handleSubmit(
    async (input) => {
      setRefusal(null);
      try {
        const path = `/api/fixtures/${fixtureId}/build-up`;
        await api<BuildUp>(path, { method: 'PUT', body: { ...input, version } });
        await client.invalidateQueries();
        done();
      } catch (error) {
        setRefusal(showServerErrors(error, setError));
      }
    },
    () => setRefusal('Some fields need another look; each says what is wrong.'),
  );
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="space-y-4">
      {fields.map((field, index) => (
        <fieldset key={field.id} className="rounded-md border border-line p-3">
          <legend className="px-1 font-bold">Body {index + 1}</legend>
          <BodyFields
            index={index}
            register={register}
            shape={bodies[index]?.shape ?? { kind: 'point' }}
            setShape={(shape) => setValue(`bodies.${index}.shape`, shape, { shouldDirty: true })}
            errors={errors.bodies?.[index]}
          />
          {fields.length > 1 && (
            <Button className="mt-3" onClick={() => remove(index)}>
              Remove body {index + 1}
            </Button>
          )}
        </fieldset>
      ))}
      <Button onClick={() => append(newBody(fields.length + 1))}>Add a body</Button>
      <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-4">
        <TextField
          label="Slide from"
          unit="mm"
          inputMode="decimal"
          error={errors.slide?.minMm?.message}
          {...register('slide.minMm', { valueAsNumber: true })}
        />
        <TextField
          label="Slide to"
          unit="mm"
          inputMode="decimal"
          error={errors.slide?.maxMm?.message}
          {...register('slide.maxMm', { valueAsNumber: true })}
        />
        <TextField
          label="Uncertainty of the inertia"
          unit="relative"
          hint="1 standard uncertainty; 0.01 = 1 %."
          inputMode="decimal"
          error={errors.relativeUncertainty?.message}
          {...register('relativeUncertainty', { valueAsNumber: true })}
        />
        <TextField
          label="What changed, and why"
          error={errors.remark?.message}
          {...register('remark', { setValueAs: textOrNull })}
        />
      </div>
      <InertiaPreview bodies={bodies} slide={slide} />
      <p role="alert" className="font-bold text-lost empty:hidden">
        {refusal}
      </p>
      <div className="flex gap-3">
        <Button type="submit" look="primary" busy={formState.isSubmitting}>
          Save as revision {(current?.revision ?? 0) + 1}
        </Button>
        {current !== null && <Button onClick={done}>Cancel</Button>}
      </div>
    </form>
  );
}

function initialOf(current: BuildUp | null, version: number): BuildUpInput {
  return {
    version,
    bodies: current?.bodies ?? [
      { ...newBody(1), name: 'part' },
      { ...newBody(2), name: 'sliding mass', placement: 'slide', mass: 0.5 },
    ],
    slide: current?.slide ?? { minMm: 0, maxMm: 150 },
    relativeUncertainty: current?.relativeUncertainty ?? 0.01,
    remark: null,
  };
}
